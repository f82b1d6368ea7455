import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import sqlite3 from 'sqlite3';

/**
 * Keeps a second server, or a restore, away from a data directory in use. It is a lock of the operating system (held
 * through a small SQLite file), so it goes with the process however that ends and no stale lock is ever left.
 */
export class DataDirectoryLock {
  private constructor(private readonly database: sqlite3.Database) {}

  /** @throws Error when another process holds the directory */
  static async take(dataDirectory: string): Promise<DataDirectoryLock> {
    mkdirSync(dataDirectory, { recursive: true });
    const database = await open(join(dataDirectory, 'running.lock'));
    try {
      await execute(database, 'PRAGMA busy_timeout = 0; PRAGMA journal_mode = MEMORY; BEGIN EXCLUSIVE');
    } catch (error) {
      await close(database);
      throw new Error(`The data directory ${dataDirectory} is in use by a running server: stop it first.`, {
        cause: error,
      });
    }
    return new DataDirectoryLock(database);
  }

  async release(): Promise<void> {
    await close(this.database);
  }
}

function open(file: string): Promise<sqlite3.Database> {
  return new Promise((resolve, reject) => {
    const database = new sqlite3.Database(file, (error) => (error ? reject(error) : resolve(database)));
  });
}

function execute(database: sqlite3.Database, sql: string): Promise<void> {
  return new Promise((resolve, reject) => {
    database.exec(sql, (error) => (error ? reject(error) : resolve()));
  });
}

function close(database: sqlite3.Database): Promise<void> {
  return new Promise((resolve, reject) => {
    database.close((error) => (error ? reject(error) : resolve()));
  });
}
