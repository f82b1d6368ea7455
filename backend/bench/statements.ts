import sqlite3 from 'sqlite3';

/** A plain connection for building and querying the benchmark's database: no layer of ours in between. */
export class Statements {
  private constructor(private readonly database: sqlite3.Database) {}

  static open(file: string): Promise<Statements> {
    return new Promise((resolve, reject) => {
      const database = new sqlite3.Database(file, (error) => {
        if (error) reject(error);
        else resolve(new Statements(database));
      });
    });
  }

  run(sql: string, bind: Record<string, string | number | null> = {}): Promise<void> {
    return new Promise((resolve, reject) => {
      this.database.run(sql, bind, (error) => (error ? reject(error) : resolve()));
    });
  }

  all<Row>(sql: string, bind: Record<string, string | number | null> = {}): Promise<Row[]> {
    return new Promise((resolve, reject) => {
      this.database.all<Row>(sql, bind, (error, rows) => (error ? reject(error) : resolve(rows)));
    });
  }

  close(): Promise<void> {
    return new Promise((resolve, reject) =>
      this.database.close((error) => (error ? reject(error) : resolve())),
    );
  }
}
