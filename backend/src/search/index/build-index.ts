import { approvals, supplyStatuses } from '@resistry/engineering/ratings/technology';
import type { Readers } from '../../database/readers';
import { modesOfPart, type SizeRatings } from '../../parts/ratings/size-ratings';
import {
  allocateColumns,
  standingKey,
  type CatalogueColumns,
  type CatalogueRow,
  type CompanyNumbers,
} from './catalogue-columns';
import type { CatalogueIndex } from './catalogue-index';
import { inOneShape } from './one-shape';
import { companyNumbersSql, sizesSql, type PartColumnsRow, type SizeRow } from './part-columns-row';
import { countParts, readNumberRanks, readParts } from './read-parts';
import { seriesBits } from './series-bits';

/**
 * Reads the whole catalogue into columns. Parts of a size without ratings in its family's current revision are left out:
 * there is nothing to hold them against.
 */
export async function buildIndex(
  readers: Readers,
  ratings: ReadonlyMap<number, SizeRatings>,
): Promise<CatalogueIndex> {
  const sizes = await readers.select<SizeRow>(sizesSql);
  const numbers = await readers.select<{ id: number }>(companyNumbersSql);
  const companyPosition = new Map(numbers.map(({ id }, position) => [id, position]));
  const counts = await countParts(readers, (sizeId) => ratings.has(sizeId));
  const lastId = counts.reduce((last, { last_id }) => Math.max(last, last_id), 0);
  const ranks = await readNumberRanks(readers, lastId);
  const columns = allocateColumns(
    counts.reduce((sum, { parts }) => sum + parts, 0),
    lastId,
  );
  const bitsOf = remembered(seriesBits);
  const rows: CatalogueRow[] = [];
  let position = 0;
  for await (const parts of readParts(readers, counts)) {
    for (const part of parts) {
      fill(columns, position, part, companyPosition);
      columns.series[position] = bitsOf(part.resistance_ohm);
      columns.numberRank[position] = ranks[part.id] ?? 0;
      extendRows(rows, position, part, ratings);
      position += 1;
    }
  }
  if (position !== columns.partId.length)
    throw new Error('Parts came or went while the catalogue was read; it is read again at the next search.');
  return {
    columns,
    rows,
    ratings,
    sizes: new Map(
      sizes.map((size) => [
        size.id,
        {
          sizeId: size.id,
          code: size.code,
          familyId: size.family_id,
          familyRank: size.family_rank,
          manufacturerId: size.manufacturer_id,
          manufacturerRank: size.manufacturer_rank,
          technology: size.technology,
          bodyStyle: size.body_style,
        },
      ]),
    ),
    companyNumbers: companyNumbersOf(numbers, columns.company),
  };
}

/** Writes one part's standing, which can change, at its position. */
export function fillStanding(
  columns: CatalogueColumns,
  position: number,
  part: Pick<PartColumnsRow, 'approval' | 'supply' | 'derived_second_source' | 'derived_unit_price_micro'>,
): void {
  const approval = approvals.indexOf(part.approval);
  const supply = supplyStatuses.indexOf(part.supply);
  columns.approval[position] = approval;
  columns.supply[position] = supply;
  columns.secondSource[position] = part.derived_second_source;
  columns.standing[position] = standingKey(approval, supply, part.derived_second_source);
  columns.price[position] = part.derived_unit_price_micro ?? Infinity;
}

function fill(
  columns: CatalogueColumns,
  position: number,
  part: PartColumnsRow,
  companyPosition: ReadonlyMap<number, number>,
): void {
  columns.partId[position] = part.id;
  columns.resistance[position] = part.resistance_ohm;
  columns.company[position] =
    part.company_part_number_id === null ? -1 : (companyPosition.get(part.company_part_number_id) ?? -1);
  columns.positionOfId[part.id] = position;
  fillStanding(columns, position, part);
}

/** A function of a resistance that a catalogue asks for the same few thousand values again and again. */
function remembered(compute: (resistance: number) => number): (resistance: number) => number {
  const known = new Map<number, number>();
  return (resistance) => {
    let value = known.get(resistance);
    if (value === undefined) {
      value = compute(resistance);
      known.set(resistance, value);
    }
    return value;
  };
}

function extendRows(
  rows: CatalogueRow[],
  position: number,
  part: PartColumnsRow,
  ratings: ReadonlyMap<number, SizeRatings>,
): void {
  const last = rows.at(-1);
  const isLink = part.resistance_ohm === 0;
  if (
    last !== undefined &&
    last.sizeId === part.size_id &&
    last.tolerance === part.tolerance_fraction &&
    last.tcr === part.tcr_per_kelvin &&
    last.isLink === isLink
  ) {
    last.to = position + 1;
    return;
  }
  const size = ratings.get(part.size_id);
  if (size === undefined) throw new Error(`Size ${String(part.size_id)} of the index has no ratings.`);
  rows.push({
    number: rows.length,
    from: position,
    to: position + 1,
    sizeId: part.size_id,
    tolerance: part.tolerance_fraction,
    tcr: part.tcr_per_kelvin,
    isLink,
    modes: modesOfPart(size, {
      // One resistance stands for the whole row: what differs between its parts is asked for separately.
      resistance: isLink ? 0 : 1,
      tolerance: part.tolerance_fraction,
      tcr: part.tcr_per_kelvin,
    }).map((mode) => inOneShape(mode.ratings)),
  });
}

function companyNumbersOf(numbers: readonly { id: number }[], company: Int32Array): CompanyNumbers {
  const counts = new Int32Array(numbers.length + 1);
  for (const position of company) if (position >= 0) counts[position + 1] = (counts[position + 1] ?? 0) + 1;
  for (let position = 1; position < counts.length; position += 1)
    counts[position] = (counts[position] ?? 0) + (counts[position - 1] ?? 0);
  const source = new Int32Array(counts.at(-1) ?? 0);
  const next = counts.slice();
  for (const [part, position] of company.entries()) {
    if (position < 0) continue;
    const slot = next[position] ?? 0;
    source[slot] = part;
    next[position] = slot + 1;
  }
  return { id: Int32Array.from(numbers, ({ id }) => id), sourceFrom: counts, source };
}
