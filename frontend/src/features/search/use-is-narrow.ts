import { type RefObject, useEffect, useState } from 'react';

/** Windows below this leave the results too little room; the guess before the browser has laid the page out. */
const narrowWindow = 880;

/**
 * Whether there is less room than this inside an element.
 * @param below px
 */
export function useIsNarrow(ref: RefObject<HTMLElement | null>, below: number): boolean {
  const [narrow, setNarrow] = useState(() => window.innerWidth < narrowWindow);
  useEffect(() => {
    if (ref.current === null) return undefined;
    // Told after each layout; to ask for the width would cause one.
    const observer = new ResizeObserver((entries) => {
      const room = entries[entries.length - 1]?.contentRect.width;
      if (room !== undefined) setNarrow(room < below);
    });
    observer.observe(ref.current);
    return () => observer.disconnect();
  }, [ref, below]);
  return narrow;
}
