import sqlite3 from 'sqlite3';

/** A connection of its own to a database file, for work that must not hold up the writer or the readers. */
export class SqliteFile {
  private constructor(private readonly database: sqlite3.Database) {}

  static async open(file: string, mode: 'read' | 'write' = 'read'): Promise<SqliteFile> {
    const flags = mode === 'read' ? sqlite3.OPEN_READONLY : sqlite3.OPEN_READWRITE;
    const database = await new Promise<sqlite3.Database>((resolve, reject) => {
      const opened = new sqlite3.Database(file, flags, (error) => (error ? reject(error) : resolve(opened)));
    });
    database.configure('busyTimeout', 10_000);
    return new SqliteFile(database);
  }

  async run(sql: string, bind: Record<string, string | number | null> = {}): Promise<void> {
    await new Promise<void>((resolve, reject) => {
      this.database.run(sql, bind, (error: Error | null) => (error ? reject(error) : resolve()));
    });
  }

  async select<Row extends object>(sql: string): Promise<Row[]> {
    return new Promise((resolve, reject) => {
      this.database.all<Row>(sql, (error, rows) => (error ? reject(error) : resolve(rows)));
    });
  }

  async close(): Promise<void> {
    await new Promise<void>((resolve, reject) => {
      this.database.close((error) => (error ? reject(error) : resolve()));
    });
  }
}
