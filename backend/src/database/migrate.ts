import { QueryTypes, Transaction } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import { Umzug } from 'umzug';
import { dialectModule } from './dialect-module';
import { checksumOf, type Migration } from './migration';
import { MIGRATION_PRAGMAS } from './pragmas';
import { SchemaHistory } from './schema-history';

const HISTORY_TABLE = `CREATE TABLE IF NOT EXISTS schema_migrations (
  name TEXT PRIMARY KEY, checksum TEXT NOT NULL, applied_at TEXT NOT NULL) STRICT`;

/**
 * Brings a database file to the newest schema, creating it where there is none.
 *
 * @returns the names of the migrations that ran
 * @throws UnknownSchemaError for a file that this version must not touch
 */
export async function migrate(file: string, migrations: readonly Migration[]): Promise<string[]> {
  const sequelize = new Sequelize({
    dialect: 'sqlite',
    storage: file,
    logging: false,
    dialectModule: dialectModule(MIGRATION_PRAGMAS),
    // Else Sequelize would turn foreign keys back on, and a table could not be rebuilt.
    ...{ foreignKeys: false },
  });
  try {
    const history = new SchemaHistory(sequelize);
    await history.refuseUnknown(migrations);
    const umzug = new Umzug({
      migrations: migrations.map((migration) => ({
        name: migration.name,
        up: () => apply(sequelize, migration),
      })),
      storage: history,
      logger: undefined,
    });
    return (await umzug.up()).map((applied) => applied.name);
  } finally {
    await sequelize.close();
  }
}

/** One migration and its row in the history, together or not at all. */
async function apply(sequelize: Sequelize, migration: Migration): Promise<void> {
  await sequelize.transaction({ type: Transaction.TYPES.IMMEDIATE }, async (transaction) => {
    await sequelize.query(HISTORY_TABLE, { transaction });
    for (const statement of migration.statements) await sequelize.query(statement, { transaction });
    const orphans = await sequelize.query('PRAGMA foreign_key_check', {
      transaction,
      type: QueryTypes.SELECT,
    });
    if (orphans.length > 0)
      throw new Error(`${migration.name} leaves ${orphans.length} rows that refer to nothing`);
    await sequelize.query(
      'INSERT INTO schema_migrations (name, checksum, applied_at) VALUES ($name, $checksum, $appliedAt)',
      {
        transaction,
        bind: { name: migration.name, checksum: checksumOf(migration), appliedAt: new Date().toISOString() },
      },
    );
  });
}
