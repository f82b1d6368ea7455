import type { SearchItem } from '../requests/search-parts';

/** A row of the list as it is shown: an answered item, or one of the sources beneath it. */
export interface ShownRow {
  /** Place of the item in the answer, from 0. */
  item: number;
  /** Place of the source beneath it, from 0; absent for the item itself. */
  source?: number;
}

/** How many sources are unfolded, by the item's place in the answer. */
export type Unfolded = ReadonlyMap<number, number>;

export const countOfRows = (items: number, unfolded: Unfolded): number =>
  [...unfolded.values()].reduce((sum, sources) => sum + sources, items);

/** What stands at a place of the list once the sources of some items are unfolded. */
export function rowAtPlace(place: number, unfolded: Unfolded): ShownRow {
  let before = 0;
  for (const [item, sources] of [...unfolded].sort(([first], [second]) => first - second)) {
    const at = item + before;
    if (place <= at) break;
    if (place <= at + sources) return { item, source: place - at - 1 };
    before += sources;
  }
  return { item: place - before };
}

/** A source as a row of its own. What there is too much of is named for the number as a whole only. */
export function rowOfSource(item: SearchItem, source: number): SearchItem | undefined {
  const found = item.sources?.[source];
  return found && { ...found, overSpecification: [], beneath: true };
}
