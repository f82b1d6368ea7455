import type { Transaction } from 'sequelize';
import type { Writer } from '../database/writer';
import type { FilledFamily } from './family-rows';
import { familyTables } from './family-tables';
import { insertRows } from './insert-rows';

/** Writes families with their parts, publishes their revisions and makes the last one current. */
export async function insertFamilies(
  writer: Writer,
  transaction: Transaction,
  families: readonly FilledFamily[],
): Promise<void> {
  for (const table of familyTables) {
    await insertRows(
      writer,
      transaction,
      table,
      families.flatMap((family) => family.rows[table]),
    );
  }
  await writer.run(
    transaction,
    `UPDATE family_revisions SET state = 'published', published_by = json_extract(p.value, '$.published_by'),
        published_at = json_extract(p.value, '$.published_at')
     FROM json_each($publications) AS p WHERE family_revisions.id = json_extract(p.value, '$.id')`,
    { publications: JSON.stringify(families.flatMap((family) => family.publications)) },
  );
  await writer.run(
    transaction,
    `UPDATE families SET current_revision_id = json_extract(c.value, '$[1]')
     FROM json_each($current) AS c WHERE families.id = json_extract(c.value, '$[0]')`,
    { current: JSON.stringify(families.map((family) => [family.familyId, family.currentRevisionId])) },
  );
}
