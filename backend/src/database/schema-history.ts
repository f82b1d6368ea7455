import type { UmzugStorage } from 'umzug';
import { QueryTypes } from 'sequelize';
import type { Sequelize } from 'sequelize-typescript';
import { checksumOf, type Migration } from './migration';

interface HistoryRow {
  name: string;
  checksum: string;
}

/** Thrown where a database file is not one that this version of the application knows. */
export class UnknownSchemaError extends Error {
  override readonly name = 'UnknownSchemaError';
}

/** The table of the migrations that a database has been through. */
export class SchemaHistory implements UmzugStorage {
  constructor(private readonly sequelize: Sequelize) {}

  /** Does nothing: the migration itself writes its row, inside its own transaction. */
  logMigration(): Promise<void> {
    return Promise.resolve();
  }

  unlogMigration(): Promise<void> {
    return Promise.reject(new Error('Migrations only go forward; restore a backup to go back.'));
  }

  async executed(): Promise<string[]> {
    return (await this.rows()).map((row) => row.name);
  }

  /**
   * @throws UnknownSchemaError when the file is another program's, was migrated by a newer version, or by a migration
   *   that has been edited since
   */
  async refuseUnknown(migrations: readonly Migration[]): Promise<void> {
    const executed = await this.rows();
    if (executed.length === 0 && (await this.hasTables())) {
      throw new UnknownSchemaError('The database file holds tables, but none of this application.');
    }
    executed.forEach((row, index) => {
      const known = migrations[index];
      if (known?.name !== row.name) {
        throw new UnknownSchemaError(
          `The database has been through "${row.name}", which this version does not know.`,
        );
      }
      if (checksumOf(known) !== row.checksum) {
        throw new UnknownSchemaError(
          `The migration "${row.name}" is not the one that the database has been through.`,
        );
      }
    });
  }

  private async rows(): Promise<HistoryRow[]> {
    if (!(await this.exists())) return [];
    return this.sequelize.query<HistoryRow>('SELECT name, checksum FROM schema_migrations ORDER BY name', {
      type: QueryTypes.SELECT,
    });
  }

  private async exists(): Promise<boolean> {
    return (await this.tables("name = 'schema_migrations'")).length > 0;
  }

  private async hasTables(): Promise<boolean> {
    return (await this.tables("name <> 'schema_migrations' AND name NOT LIKE 'sqlite_%'")).length > 0;
  }

  private async tables(condition: string): Promise<object[]> {
    return this.sequelize.query(`SELECT name FROM sqlite_schema WHERE type = 'table' AND ${condition}`, {
      type: QueryTypes.SELECT,
      raw: true,
    });
  }
}
