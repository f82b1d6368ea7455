import { createHash } from 'node:crypto';

/**
 * One step of the schema, never edited once it is merged. Statements are data, so that their checksum shows an edit.
 * Adding a column is fine as a statement; any other change of a table is written out as SQLite's rebuild (new table,
 * copy, drop, rename), because Sequelize's own helpers lose keys and indexes.
 */
export interface Migration {
  /** `NNNN-name`, equal to its file's name; they run in this order. */
  name: string;
  statements: readonly string[];
}

/** SHA-256 of the statements, blank-insensitive so that formatting does not count as a change. */
export function checksumOf(migration: Migration): string {
  const text = migration.statements.map((statement) => statement.replace(/\s+/g, ' ').trim()).join(';\n');
  return createHash('sha256').update(text).digest('hex');
}
