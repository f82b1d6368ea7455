import sqlite3 from 'sqlite3';

type Opened = (error: Error | null) => void;

/** The SQLite driver, with every connection running these pragmas before anybody gets to use it. */
export function dialectModule(pragmas: readonly string[]): object {
  class PreparedDatabase extends sqlite3.Database {
    constructor(file: string, mode: number, opened: Opened) {
      super(file, mode, (error) => {
        if (error) opened(error);
        else this.exec(pragmas.join(';'), opened);
      });
    }
  }
  return { ...sqlite3, Database: PreparedDatabase };
}
