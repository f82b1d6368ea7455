import { type RefObject, useEffect, useState } from 'react';

/**
 * How far the rows start below the top of what scrolls, in px; 0 until the browser has laid them out, and measured again
 * whenever something above them grows.
 */
export function useScrollMargin(
  rowsRef: RefObject<HTMLElement | null>,
  scrollRef: RefObject<HTMLElement | null>,
): number {
  const [margin, setMargin] = useState(0);
  useEffect(() => {
    const scroller = scrollRef.current;
    if (scroller === null) return undefined;
    // Called after a layout, so that measuring costs none of its own.
    const observer = new ResizeObserver(() => {
      const rows = rowsRef.current;
      if (rows === null) return;
      const top =
        rows.getBoundingClientRect().top - scroller.getBoundingClientRect().top + scroller.scrollTop;
      setMargin(Math.round(top));
    });
    for (const child of scroller.children) observer.observe(child);
    return () => observer.disconnect();
  }, [rowsRef, scrollRef]);
  return margin;
}
