import { evaluateRows, type Evaluation } from '../src/search/engine/evaluation';
import { allocateScratch, type Scratch } from '../src/search/engine/scratch';
import type { CatalogueIndex } from '../src/search/index/catalogue-index';
import type { Policy } from '@resistry/engineering/derating/policy-entry';
import type { Duty } from '@resistry/engineering/duty/duty';
import { approvals, supplyStatuses } from '@resistry/engineering/ratings/technology';
import type { SearchAnswer } from './client';
import type { Statements } from './statements';

const preference = ['preferred', 'approved', 'restricted', 'in-review', 'draft', 'withdrawn'];

/**
 * The best that hand-written SQL does for the same answer. The physics is given to it for nothing: stretches of resistance
 * of every row, with the checks that are unmet and unrated there, computed outside the clock. What is timed is SQLite's
 * own work: joining them to the parts over a clustered index, counting every combination, and sorting the page.
 */
export class SqlPair {
  private constructor(
    private readonly database: Statements,
    private readonly index: CatalogueIndex,
    private readonly scratch: Scratch,
  ) {}

  static async prepare(database: Statements, index: CatalogueIndex): Promise<SqlPair> {
    await database.run('PRAGMA cache_size = -400000');
    await database.run('PRAGMA temp_store = MEMORY');
    await database.run(
      `CREATE TEMP TABLE bench_parts (row INTEGER, resistance REAL, id INTEGER, standing INTEGER, preference INTEGER,
        price INTEGER, PRIMARY KEY (row, resistance, id)) WITHOUT ROWID`,
    );
    const { columns } = index;
    for (const [row, { from, to }] of index.rows.entries()) {
      const values = Array.from({ length: to - from }, (_, offset) => {
        const at = from + offset;
        const approval = columns.approval[at] ?? 0;
        const price = columns.price[at] ?? Infinity;
        return [
          row,
          columns.resistance[at],
          columns.partId[at],
          approval * 4 + (columns.supply[at] ?? 0),
          preference.indexOf(approvals[approval] ?? ''),
          Number.isFinite(price) ? price : null,
        ];
      });
      await database.run(
        `INSERT INTO bench_parts SELECT ${[0, 1, 2, 3, 4, 5].map((place) => `json_extract(value, '$[${String(place)}]')`).join(', ')} FROM json_each($values)`,
        { $values: JSON.stringify(values) },
      );
    }
    return new SqlPair(database, index, allocateScratch(columns.partId.length));
  }

  /** Gives SQL the stretches of one duty; not timed. */
  async give(duty: Duty, policy: Policy): Promise<Evaluation> {
    const evaluation = evaluateRows(this.index, this.index.rows, duty, policy, this.scratch, 'all parts');
    const standingBits = bitsOf(evaluation, 'approval') | bitsOf(evaluation, 'supply');
    await this.database.run('DROP TABLE IF EXISTS stretches');
    await this.database.run(
      'CREATE TEMP TABLE stretches (row INTEGER, low REAL, high REAL, unmet INTEGER, unrated INTEGER)',
    );
    const stretches = stretchesOf(this.index, evaluation, standingBits);
    for (let start = 0; start < stretches.length; start += 5000) {
      await this.database.run(
        `INSERT INTO stretches SELECT ${[0, 1, 2, 3, 4].map((place) => `json_extract(value, '$[${String(place)}]')`).join(', ')} FROM json_each($values)`,
        { $values: JSON.stringify(stretches.slice(start, start + 5000)) },
      );
    }
    await this.database.run('DROP TABLE IF EXISTS standings');
    await this.database.run('CREATE TEMP TABLE standings (standing INTEGER PRIMARY KEY, unmet INTEGER)');
    for (const [approval, name] of approvals.entries()) {
      for (const supply of supplyStatuses.keys()) {
        const unmet =
          (['approved', 'preferred'].includes(name) ? 0 : bitsOf(evaluation, 'approval')) |
          (supply === 0 ? 0 : bitsOf(evaluation, 'supply'));
        await this.database.run('INSERT INTO standings VALUES ($standing, $unmet)', {
          $standing: approval * 4 + supply,
          $unmet: unmet,
        });
      }
    }
    return evaluation;
  }

  /** Runs the pair: counts, then the page. */
  async answer(evaluation: Evaluation): Promise<{ answer: SearchAnswer; milliseconds: number }> {
    const begun = performance.now();
    const counts = await this.database.all<{ unmet: number; unrated: number; parts: number }>(
      `SELECT s.unmet | t.unmet AS unmet, s.unrated <> 0 AS unrated, count(*) AS parts
       FROM stretches s JOIN bench_parts p ON p.row = s.row AND p.resistance BETWEEN s.low AND s.high
       JOIN standings t ON t.standing = p.standing GROUP BY 1, 2`,
    );
    const page = await this.database.all<{ id: number }>(
      `SELECT p.id FROM stretches s JOIN bench_parts p ON p.row = s.row AND p.resistance BETWEEN s.low AND s.high
       JOIN standings t ON t.standing = p.standing WHERE s.unmet = 0 AND s.unrated = 0 AND t.unmet = 0
       ORDER BY p.preference, p.price IS NULL, p.price, p.id LIMIT 50`,
    );
    const milliseconds = performance.now() - begun;
    return { answer: assemble(evaluation, counts, page), milliseconds };
  }
}

function bitsOf(evaluation: Evaluation, name: string): number {
  return evaluation.checks.find(({ definition }) => definition.name === name)?.bit ?? 0;
}

/** Runs of positions in a row that share their masks, with the standing checks left to the join. */
function stretchesOf(index: CatalogueIndex, evaluation: Evaluation, standingBits: number): number[][] {
  const { unmet, unrated } = evaluation.scratch.masks;
  const { resistance } = index.columns;
  const stretches: number[][] = [];
  for (const [row, { from, to }] of index.rows.entries()) {
    let start = from;
    for (let at = from + 1; at <= to; at += 1) {
      const same =
        at < to &&
        ((unmet[at] ?? 0) & ~standingBits) === ((unmet[start] ?? 0) & ~standingBits) &&
        unrated[at] === unrated[start];
      if (same) continue;
      stretches.push([
        row,
        resistance[start] ?? NaN,
        resistance[at - 1] ?? NaN,
        (unmet[start] ?? 0) & ~standingBits,
        unrated[start] ?? 0,
      ]);
      start = at;
    }
  }
  return stretches;
}

function assemble(
  evaluation: Evaluation,
  counts: readonly { unmet: number; unrated: number; parts: number }[],
  page: readonly { id: number }[],
): SearchAnswer {
  const valueBit = bitsOf(evaluation, 'value');
  const sum = (keep: (row: { unmet: number; unrated: number }) => boolean): number =>
    counts.filter(keep).reduce((total, { parts }) => total + parts, 0);
  return {
    total: sum(({ unmet, unrated }) => unmet === 0 && unrated === 0),
    unrated: sum(({ unmet, unrated }) => unmet === 0 && unrated === 1),
    items: page.map(({ id }) => ({ part: { id } })),
    knockouts: evaluation.checks.map(({ definition, bit }) => ({
      check: definition.name,
      removes: sum(({ unmet }) => (unmet & bit) !== 0 && (bit === valueBit || (unmet & valueBit) === 0)),
      removesAlone: sum(({ unmet }) => unmet === bit),
    })),
  };
}
