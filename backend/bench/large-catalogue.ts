import { existsSync, mkdirSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { startServer } from './server';
import { Statements } from './statements';

const partGoal = 1_000_000;

/** Tables whose rows stand for a copy of a family, with the columns that refer to other copied rows. */
const copied: readonly { table: string; columns: Readonly<Record<string, string>>; where?: string }[] = [
  {
    table: 'families',
    columns: { id: 'families', code: "code || '-' || $copy", current_revision_id: 'NULL' },
  },
  {
    table: 'datasheets',
    columns: { id: 'datasheets', family_id: 'families', document_number: "document_number || '-' || $copy" },
  },
  {
    table: 'family_revisions',
    columns: {
      id: 'family_revisions',
      family_id: 'families',
      datasheet_id: 'datasheets',
      state: "'draft'",
      published_at: 'NULL',
      published_by: 'NULL',
    },
    where: 'id IN (SELECT current_revision_id FROM families)',
  },
  { table: 'sizes', columns: { id: 'sizes', family_id: 'families' } },
  {
    table: 'size_ratings',
    columns: {
      id: 'size_ratings',
      revision_id: 'family_revisions',
      size_id: 'sizes',
      limiting_element_voltage_volt: `limiting_element_voltage_volt * ${vary('id')}`,
    },
    where: 'revision_id IN (SELECT current_revision_id FROM families)',
  },
  {
    table: 'operating_modes',
    columns: {
      id: 'operating_modes',
      size_ratings_id: 'size_ratings',
      rated_dissipation_watt: `rated_dissipation_watt * ${vary('size_ratings_id + 3')}`,
    },
    where:
      'size_ratings_id IN (SELECT s.id FROM size_ratings s JOIN families f ON f.current_revision_id = s.revision_id)',
  },
  {
    table: 'ranges',
    columns: { id: 'ranges', revision_id: 'family_revisions', size_id: 'sizes' },
    where: 'revision_id IN (SELECT current_revision_id FROM families)',
  },
  {
    table: 'parts',
    columns: {
      id: 'parts',
      family_id: 'families',
      size_id: 'sizes',
      derived_range_id: 'ranges',
      manufacturer_part_number: "manufacturer_part_number || '-' || $copy",
    },
  },
];

/** A rating of a copy lies between 0.7 and 1.3 times the original's, the same at every run. */
function vary(seed: string): string {
  return `(0.7 + 0.006 * (((${seed}) * 37 + $copy * 61) % 101))`;
}

/**
 * A data directory with a catalogue of a million parts in about two thousand sizes, over all technologies: the
 * demonstration, and copies of its families with other dissipations and voltages. Built once and kept.
 */
export async function largeCatalogue(folder: string): Promise<string> {
  const done = join(folder, 'complete');
  if (existsSync(done)) return folder;
  rmSync(folder, { recursive: true, force: true });
  mkdirSync(folder, { recursive: true });
  process.stdout.write('Building the large catalogue (once): demonstration …\n');
  const server = await startServer(folder);
  await server.stop();
  const database = await Statements.open(join(folder, 'resistry.sqlite'));
  await multiply(database);
  await database.close();
  writeFileSync(done, '');
  return folder;
}

async function multiply(database: Statements): Promise<void> {
  const [count] = await database.all<{ parts: number }>('SELECT count(*) AS parts FROM parts');
  const originals = count?.parts ?? 0;
  const offsets = await idOffsets(database);
  for (const pragma of [
    'journal_mode = WAL',
    'synchronous = OFF',
    'foreign_keys = OFF',
    'cache_size = -200000',
  ])
    await database.run(`PRAGMA ${pragma}`);
  await database.run('BEGIN');
  await keepOriginals(database);
  const copies = Math.ceil(partGoal / originals) - 1;
  for (let copy = 1; copy <= copies; copy += 1) {
    process.stdout.write(`  copy ${String(copy)} of ${String(copies)}\n`);
    for (const step of copied) await copyTable(database, step, copy, offsets);
    await database.run(
      `UPDATE families SET current_revision_id = (SELECT r.id FROM family_revisions r WHERE r.family_id = families.id)
       WHERE current_revision_id IS NULL`,
    );
  }
  await database.run(
    "UPDATE family_revisions SET state = 'published', published_by = entered_by, published_at = entered_at WHERE state = 'draft'",
  );
  await priceEverything(database);
  await database.run('COMMIT');
  await database.run('ANALYZE');
}

async function keepOriginals(database: Statements): Promise<void> {
  for (const { table, where } of copied) {
    await database.run(
      `CREATE TEMP TABLE original_${table} AS SELECT * FROM ${table} ${where === undefined ? '' : `WHERE ${where}`}`,
    );
  }
}

async function idOffsets(database: Statements): Promise<Map<string, number>> {
  const offsets = new Map<string, number>();
  for (const { table } of copied) {
    const [row] = await database.all<{ largest: number }>(`SELECT max(id) AS largest FROM ${table}`);
    offsets.set(table, row?.largest ?? 0);
  }
  return offsets;
}

async function copyTable(
  database: Statements,
  step: (typeof copied)[number],
  copy: number,
  offsets: ReadonlyMap<string, number>,
): Promise<void> {
  const info = await database.all<{ name: string }>(`SELECT name FROM pragma_table_info('${step.table}')`);
  const names = info.map(({ name }) => name);
  const values = names.map((name) => {
    const rule = step.columns[name];
    if (rule === undefined) return name;
    const offset = offsets.get(rule);
    return offset === undefined
      ? rule.replaceAll('$copy', String(copy))
      : `${name} + ${String(offset * copy)}`;
  });
  await database.run(
    `INSERT INTO ${step.table} (${names.join(', ')}) SELECT ${values.join(', ')} FROM original_${step.table}`,
  );
}

/**
 * One offer for every approved and preferred part, each at a price of its own (a multiple of its number modulo a prime), so
 * that price alone orders a page: SQL has nothing to work out an excess with.
 */
async function priceEverything(database: Statements): Promise<void> {
  await database.run('DELETE FROM offer_price_breaks');
  await database.run('DELETE FROM offers');
  await database.run(
    `UPDATE parts SET derived_unit_price_micro =
       CASE WHEN approval IN ('approved', 'preferred') THEN 1000 + id * 7919 % 15485863 END`,
  );
  await database.run(
    `INSERT INTO offers (id, part_id, supplier_id, packaging_code, minimum_order, order_multiple, lead_time_days, valid_from, valid_until, entered_by, entered_at)
     SELECT id, id, (SELECT min(id) FROM suppliers), 'R', 1, 1, 30, '2020-01-01', '2099-12-31', entered_by, entered_at
     FROM parts WHERE derived_unit_price_micro IS NOT NULL`,
  );
  await database.run(
    `INSERT INTO offer_price_breaks (offer_id, quantity, unit_price_micro)
     SELECT id, 1, derived_unit_price_micro FROM parts WHERE derived_unit_price_micro IS NOT NULL`,
  );
}
