import type { Transaction } from 'sequelize';
import type { Writer } from '../database/writer';
import type { Columns } from './family';

/** Rows a statement takes: large enough to cost nothing, small enough for the JSON text to stay in memory. */
const ROWS_AT_ONCE = 4000;

/**
 * Inserts many rows by few statements: they go in as one JSON text, which SQLite takes apart.
 *
 * @param table a name from the code, never from outside
 * @param rows all with the same columns
 * @throws RangeError for a row that lacks a column, which would go in as NULL
 */
export async function insertRows(
  writer: Writer,
  transaction: Transaction,
  table: string,
  rows: readonly Columns[],
): Promise<void> {
  const [first] = rows;
  if (first === undefined) return;
  const columns = Object.keys(first);
  const picks = columns.map((_, place) => `json_extract(value, '$[${place}]')`).join(', ');
  const sql = `INSERT INTO ${table} (${columns.join(', ')}) SELECT ${picks} FROM json_each($rows)`;
  for (let start = 0; start < rows.length; start += ROWS_AT_ONCE) {
    const chunk = rows.slice(start, start + ROWS_AT_ONCE).map((row) => valuesOf(table, columns, row));
    await writer.run(transaction, sql, { rows: JSON.stringify(chunk) });
  }
}

function valuesOf(table: string, columns: readonly string[], row: Columns): unknown[] {
  return columns.map((column) => {
    const value = row[column];
    if (value === undefined) throw new RangeError(`A row for ${table} has no ${column}.`);
    // JSON knows no infinity and would write null.
    if (typeof value === 'number' && !Number.isFinite(value)) {
      throw new RangeError(`${table}.${column} is ${value}, which cannot be kept.`);
    }
    return value;
  });
}
