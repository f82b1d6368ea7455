import { type RefObject, useLayoutEffect, useState } from 'react';

/** How far the rows start below the top of what scrolls, in px; measured again whenever something above them grows. */
export function useScrollMargin(
  rowsRef: RefObject<HTMLElement | null>,
  scrollRef: RefObject<HTMLElement | null>,
): number {
  const [margin, setMargin] = useState(0);
  useLayoutEffect(() => {
    const scroller = scrollRef.current;
    if (scroller === null) return undefined;
    const measure = (): void => {
      const rows = rowsRef.current;
      if (rows === null) return;
      const top =
        rows.getBoundingClientRect().top - scroller.getBoundingClientRect().top + scroller.scrollTop;
      setMargin(Math.round(top));
    };
    measure();
    const observer = new ResizeObserver(measure);
    for (const child of scroller.children) observer.observe(child);
    return () => observer.disconnect();
  }, [rowsRef, scrollRef]);
  return margin;
}
