import type { Readers } from '../../database/readers';
import { partColumnsSql, partCountsSql, partNumbersSql, type PartColumnsRow } from './part-columns-row';

/** Rows that are read at a time: a million at once would take half a gigabyte. */
const atOnce = 20_000;

interface SizeCount {
  size_id: number;
  parts: number;
  last_id: number;
}

/** How many parts each size has that is wanted, in the order in which they are read. */
export async function countParts(
  readers: Readers,
  isWanted: (sizeId: number) => boolean,
): Promise<readonly SizeCount[]> {
  const counts = await readers.select<SizeCount>(partCountsSql);
  return counts.filter(({ size_id }) => isWanted(size_id));
}

/** Reads the parts of the counted sizes in pieces, by size, tolerance, TCR and resistance. */
export async function* readParts(
  readers: Readers,
  counts: readonly SizeCount[],
): AsyncGenerator<readonly PartColumnsRow[]> {
  const wanted = new Set(counts.map(({ size_id }) => size_id));
  for (let place = 0; place < counts.length;) {
    const first = counts[place]?.size_id ?? 0;
    let last = first;
    for (let parts = 0; place < counts.length && parts < atOnce; place += 1) {
      last = counts[place]?.size_id ?? last;
      parts += counts[place]?.parts ?? 0;
    }
    const rows = await readers.select<PartColumnsRow>(partColumnsSql, { first, last });
    yield rows.filter(({ size_id }) => wanted.has(size_id));
  }
}

/** The rank of every part number in alphabetical order, by the id of the part. */
export async function readNumberRanks(readers: Readers, lastId: number): Promise<Int32Array> {
  const ranks = new Int32Array(lastId + 1);
  let rank = 0;
  let after = '';
  for (;;) {
    const rows = await readers.select<{ id: number; number: string }>(partNumbersSql, {
      after,
      limit: atOnce,
    });
    for (const { id } of rows) {
      rank += 1;
      ranks[id] = rank;
    }
    const last = rows.at(-1);
    if (last === undefined) return ranks;
    after = last.number;
  }
}
