import type { CatalogueRow } from '../index/catalogue-columns';

/** The row that holds a position of the columns. */
export function rowOfPosition(rows: readonly CatalogueRow[], position: number): CatalogueRow {
  let low = 0;
  let high = rows.length - 1;
  while (low < high) {
    const middle = (low + high + 1) >>> 1;
    if ((rows[middle]?.from ?? Infinity) <= position) low = middle;
    else high = middle - 1;
  }
  const row = rows[low];
  if (row === undefined) throw new Error(`No row of the index holds position ${String(position)}.`);
  return row;
}
