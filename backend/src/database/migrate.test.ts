import { temporaryFolder } from '../../test/support/temporary-folder';
import { SqliteFile } from '../backups/sqlite-file';
import { migrate } from './migrate';
import type { Migration } from './migration';
import { migrations } from './migrations';

const first: Migration = {
  name: '0001-boards',
  statements: ['CREATE TABLE boards (id INTEGER PRIMARY KEY) STRICT'],
};
const second: Migration = {
  name: '0002-lines',
  statements: [
    'CREATE TABLE lines (id INTEGER PRIMARY KEY, board_id INTEGER NOT NULL REFERENCES boards (id)) STRICT',
    'INSERT INTO boards (id) VALUES (1)',
  ],
};

async function tablesOf(file: string): Promise<string[]> {
  const database = await SqliteFile.open(file);
  const rows = await database.select<{ name: string }>(
    "SELECT name FROM sqlite_schema WHERE type = 'table' ORDER BY name",
  );
  await database.close();
  return rows.map(({ name }) => name);
}

describe('migrate', () => {
  const folder = temporaryFolder();
  const file = (): string => folder.path('resistry.sqlite');

  it('creates the schema, once', async () => {
    expect(await migrate(file(), [first])).toEqual(['0001-boards']);
    expect(await migrate(file(), [first])).toEqual([]);
    expect(await migrate(file(), [first, second])).toEqual(['0002-lines']);
    expect(await tablesOf(file())).toEqual(['boards', 'lines', 'schema_migrations']);
  });

  it('leaves nothing of a migration that fails, so that it can run again', async () => {
    const broken: Migration = {
      name: second.name,
      statements: [...second.statements, 'INSERT INTO nowhere VALUES (1)'],
    };
    await expect(migrate(file(), [first, broken])).rejects.toThrow('nowhere');
    expect(await tablesOf(file())).toEqual(['boards', 'schema_migrations']);
    expect(await migrate(file(), [first, second])).toEqual(['0002-lines']);
  });

  it('refuses a migration that leaves rows referring to nothing', async () => {
    const orphaning: Migration = {
      name: second.name,
      statements: [second.statements[0] ?? '', 'INSERT INTO lines VALUES (1, 7)'],
    };
    await expect(migrate(file(), [first, orphaning])).rejects.toThrow('leaves 1 rows that refer to nothing');
  });

  it('refuses a database of a newer version', async () => {
    await migrate(file(), [first, second]);
    await expect(migrate(file(), [first])).rejects.toThrow('"0002-lines", which this version does not know');
  });

  it('refuses a database whose migration has been edited since, but not for its layout', async () => {
    await migrate(file(), [first]);
    const laidOut = { ...first, statements: ['CREATE TABLE boards\n    (id INTEGER PRIMARY KEY) STRICT'] };
    await expect(migrate(file(), [laidOut])).resolves.toEqual([]);
    const edited = {
      ...first,
      statements: ['CREATE TABLE boards (id INTEGER PRIMARY KEY, name TEXT) STRICT'],
    };
    await expect(migrate(file(), [edited])).rejects.toThrow(
      'is not the one that the database has been through',
    );
  });

  it("refuses another program's database", async () => {
    await migrate(file(), [first]);
    const database = await SqliteFile.open(file(), 'write');
    await database.run('DROP TABLE schema_migrations');
    await database.close();
    await expect(migrate(file(), [first])).rejects.toThrow('none of this application');
  });
});

describe('the list of migrations', () => {
  it('goes up by name, since that is the order in which a database remembers them', () => {
    const names = migrations.map(({ name }) => name);
    expect(names).toEqual([...names].sort());
    expect(new Set(names).size).toBe(names.length);
    expect(names.filter((name) => !/^\d{4}(-[a-z]+)+$/.test(name))).toEqual([]);
  });
});
