import type { Rect, Virtualizer } from '@tanstack/react-virtual';

type Scroller = Virtualizer<HTMLElement, HTMLTableRowElement>;

/**
 * Tells the size of what scrolls whenever the browser has laid it out. Asking for it while React is still changing the
 * page would make the browser lay the page out once more, which for a long table costs more than drawing it.
 */
export function watchSize(scroller: Scroller, tell: (rect: Rect) => void): (() => void) | undefined {
  const element = scroller.scrollElement;
  if (element === null) return undefined;
  const observer = new ResizeObserver((entries) => {
    const box = entries[entries.length - 1]?.borderBoxSize[0];
    if (box !== undefined) tell({ width: Math.round(box.inlineSize), height: Math.round(box.blockSize) });
  });
  observer.observe(element, { box: 'border-box' });
  return () => observer.disconnect();
}

/** Scrolls, unless it is there already: that, too, would ask for a layout. */
export function scrollUnlessThere(
  offset: number,
  { behavior, adjustments = 0 }: { behavior?: ScrollBehavior; adjustments?: number },
  scroller: Scroller,
): void {
  const top = offset + adjustments;
  if (top !== scroller.scrollOffset) scroller.scrollElement?.scrollTo({ top, behavior });
}
