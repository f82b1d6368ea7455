import type { Transaction } from 'sequelize';
import type { Writer } from '../database/writer';
import type { Columns } from './family';
import type { IdSequences } from './id-sequences';
import { insertRows } from './insert-rows';
import { momentOf } from './moments';
import type { SeedCompanyPartNumber } from './reading/read-company-part-numbers';
import type { PartIndex } from './reading/read-selection';
import type { Roster } from './roster';

/** Writes the company part numbers with the parts that may be bought under each. */
export async function insertCompanyPartNumbers(
  writer: Writer,
  transaction: Transaction,
  numbers: readonly SeedCompanyPartNumber[],
  { index, roster, ids }: { index: PartIndex; roster: Roster; ids: IdSequences },
): Promise<void> {
  const rows: Columns[] = [];
  const sources: Columns[] = [];
  for (const entry of numbers) {
    const id = ids.next('company_part_numbers');
    const enteredBy = roster.didAs('component-engineer', { by: entry.enteredBy, on: entry.enteredOn });
    const enteredAt = momentOf(entry.enteredOn, 15);
    rows.push({
      id,
      number: entry.number,
      description: entry.description,
      entered_by: enteredBy,
      entered_at: enteredAt,
    });
    for (const [place, source] of entry.sources.entries()) {
      sources.push({
        company_part_number_id: id,
        part_id: index.get(source).id,
        position: place + 1,
        added_by: enteredBy,
        added_at: enteredAt,
      });
    }
  }
  await insertRows(writer, transaction, 'company_part_numbers', rows);
  await insertRows(writer, transaction, 'approved_sources', sources);
}
