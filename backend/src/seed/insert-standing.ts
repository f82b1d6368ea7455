import type { Transaction } from 'sequelize';
import type { Writer } from '../database/writer';
import { insertRows } from './insert-rows';
import type { StandingRows } from './standing-rows';

/** Writes the histories and reviews and sets every part to where its history ends. */
export async function insertStanding(
  writer: Writer,
  transaction: Transaction,
  rows: StandingRows,
): Promise<void> {
  await insertRows(writer, transaction, 'approval_history', rows.approvalHistory);
  await insertRows(writer, transaction, 'supply_history', rows.supplyHistory);
  await insertRows(writer, transaction, 'reviews', rows.reviews);
  await writer.run(
    transaction,
    `UPDATE parts SET approval = json_extract(s.value, '$.approval'),
       restriction_words = json_extract(s.value, '$.words'), restriction_scope = json_extract(s.value, '$.scope'),
       version = version + json_extract(s.value, '$.steps')
     FROM json_each($standings) AS s WHERE parts.id = json_extract(s.value, '$.id')`,
    { standings: JSON.stringify(rows.approvals) },
  );
  await writer.run(
    transaction,
    `UPDATE parts SET supply = json_extract(s.value, '$.supply'),
       last_order_on = json_extract(s.value, '$.lastOrderOn'),
       version = version + json_extract(s.value, '$.steps')
     FROM json_each($standings) AS s WHERE parts.id = json_extract(s.value, '$.id')`,
    { standings: JSON.stringify(rows.supplies) },
  );
}
