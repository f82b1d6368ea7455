import type { NestExpressApplication } from '@nestjs/platform-express';
import { Readers } from '../../src/database/readers';

/** Everything that a change of a part's standing touches, to be compared before and after. */
export async function catalogueState(application: NestExpressApplication): Promise<Record<string, unknown>> {
  const readers = application.get(Readers);
  const tables = ['parts', 'approval_history', 'supply_history', 'reviews', 'audit_entries', 'part_text'];
  const rows = await Promise.all(
    tables.map(
      async (table) => [table, await readers.select(`SELECT * FROM ${table} ORDER BY rowid`)] as const,
    ),
  );
  const messages = await readers.select('SELECT id FROM outbox_messages ORDER BY sequence');
  return { ...Object.fromEntries(rows), messages };
}

/** Rows of a part in a table that refers to it, the oldest first. */
export async function rowsOf<Row extends object>(
  application: NestExpressApplication,
  table: 'approval_history' | 'supply_history' | 'reviews',
  partId: number,
): Promise<Row[]> {
  return application
    .get(Readers)
    .select<Row>(`SELECT * FROM ${table} WHERE part_id = $partId ORDER BY id`, { partId });
}
