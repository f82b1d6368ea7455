import { SqliteFile } from '../src/backups/sqlite-file';
import { migrate } from '../src/database/migrate';
import { migrations } from '../src/database/migrations';
import { temporaryFolder } from './support/temporary-folder';

const AT = '2026-01-05T09:00:00.000Z';

/** The least that a review of a part hangs on, as the schema was before the causes of reviews were rebuilt. */
const BEFORE_REVIEW_CAUSES = [
  `INSERT INTO users (id, email, name, password_hash, created_at, updated_at)
    VALUES (1, 'kim@example.com', 'Kim', 'h', '${AT}', '${AT}')`,
  `INSERT INTO manufacturers (id, code, name, country, entered_by, entered_at) VALUES (1, 'NORVIK', 'Norvik', 'X', 1, '${AT}')`,
  `INSERT INTO families (id, manufacturer_id, code, name, technology, entered_by, entered_at)
    VALUES (1, 1, 'SKUA', 'Chip', 'thick-film', 1, '${AT}')`,
  `INSERT INTO sizes (id, family_id, code, position) VALUES (1, 1, '0603', 1)`,
  `INSERT INTO parts (id, family_id, size_id, manufacturer_part_number, resistance_ohm, entered_by, entered_at)
    VALUES (7, 1, 1, 'SKUA-1', 100, 1, '${AT}')`,
  `INSERT INTO reviews (id, part_id, cause, words, state, opened_by, opened_at, closed_by, closed_at, outcome)
    VALUES (3, 7, 'submitted', 'Read twice', 'closed', 1, '${AT}', 1, '${AT}', 'approved')`,
  `INSERT INTO reviews (id, part_id, cause, words, opened_by, opened_at)
    VALUES (9, 7, 'left-active-supply', 'Notice 12', 1, '${AT}')`,
];

describe('a database of an earlier schema', () => {
  const folder = temporaryFolder();
  const file = (): string => folder.path('resistry.sqlite');

  async function openAt(last: string, statements: readonly string[]): Promise<SqliteFile> {
    const until = migrations.findIndex(({ name }) => name === last) + 1;
    await migrate(file(), migrations.slice(0, until));
    const earlier = await SqliteFile.open(file(), 'write');
    for (const statement of statements) await earlier.run(statement);
    await earlier.close();
    const rest = migrations.slice(until).map(({ name }) => name);
    expect(await migrate(file(), migrations)).toEqual(rest);
    return SqliteFile.open(file(), 'write');
  }

  it('keeps its reviews while their table is rebuilt', async () => {
    const database = await openAt('0012-derating-policies', BEFORE_REVIEW_CAUSES);
    expect(await database.select('SELECT * FROM reviews ORDER BY id')).toEqual([
      expect.objectContaining({ id: 3, words: 'Read twice', state: 'closed', outcome: 'approved' }),
      expect.objectContaining({ id: 9, words: 'Notice 12', state: 'open', closed_at: null }),
    ]);
    const open = (cause: string): Promise<unknown> =>
      database.run(
        `INSERT INTO reviews (part_id, cause, words, opened_by, opened_at) VALUES (7, '${cause}', 'w', 1, '${AT}')`,
      );
    await expect(open('left-active-supply')).rejects.toThrow('UNIQUE');
    await expect(open('a whim')).rejects.toThrow('CHECK');
    await open('lost-second-source');
    const [newest] = await database.select<{ id: number }>('SELECT max(id) AS id FROM reviews');
    expect(newest?.id).toBe(10);
    await database.close();
  });
});
