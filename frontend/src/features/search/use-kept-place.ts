import { type RefObject, useEffect } from 'react';
import { useLocation } from 'react-router-dom';

/** How far each step of the history was scrolled, px, as long as the application is open. */
const places = new Map<string, number>();

/**
 * Brings whoever comes back to a list to where they left it.
 * @param drawn whether there is something to scroll yet
 */
export function useKeptPlace(scrollRef: RefObject<HTMLElement | null>, drawn: boolean): void {
  const { key } = useLocation();
  useEffect(() => {
    const scroller = scrollRef.current;
    if (scroller === null || !drawn) return undefined;
    const keep = (): void => {
      places.set(key, scroller.scrollTop);
    };
    const kept = places.get(key);
    if (kept === undefined) keep();
    else scroller.scrollTop = kept;
    scroller.addEventListener('scroll', keep, { passive: true });
    return () => scroller.removeEventListener('scroll', keep);
  }, [scrollRef, drawn, key]);
}
