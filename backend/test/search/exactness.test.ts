import { DutyConflict } from '@resistry/engineering/duty/duty-conflict';
import type { Duty } from '@resistry/engineering/duty/duty';
import { requirementOf } from '@resistry/engineering/duty/requirement';
import { arbitraryDuty, arbitraryPolicy } from '@resistry/engineering/test-support/arbitrary-duties';
import * as fc from 'fast-check';
import { allocateScratch, type Scratch } from '../../src/search/engine/scratch';
import { searchCatalogue } from '../../src/search/engine/search-catalogue';
import type { SearchPlan } from '../../src/search/engine/search-plan';
import type { CatalogueIndex } from '../../src/search/index/catalogue-index';
import { Readers } from '../../src/database/readers';
import { SizeRatingsReader } from '../../src/parts/ratings/size-ratings-reader';
import { buildIndex } from '../../src/search/index/build-index';
import { startApplication, type StartedApplication } from '../support/application';
import { countOneByOne } from './brute-force';

/** The same duties at every run: a seed of the generator, not a choice of values. */
const seed = 115;
const duties = fc
  .sample(fc.tuple(arbitraryDuty, arbitraryPolicy), { seed, numRuns: 400 })
  .filter(([duty]) => isPossible(duty))
  .slice(0, 200);

let application: StartedApplication;
let index: CatalogueIndex;
let scratch: Scratch;
let stratified: number[];

beforeAll(async () => {
  application = await startApplication({ seed: 'demo' });
  const readers = application.nest.get(Readers);
  index = await buildIndex(readers, await new SizeRatingsReader(readers, application.clock).all());
  scratch = allocateScratch(index.columns.partId.length);
  stratified = stratify(index, 4000);
}, 120_000);

afterAll(() => application.stop());

function isPossible(duty: Duty): boolean {
  try {
    requirementOf(duty);
    return true;
  } catch (error) {
    if (error instanceof DutyConflict) return false;
    throw error;
  }
}

/** Positions that include the ends of every row of the catalogue, and otherwise spread evenly. */
function stratify({ rows, columns }: CatalogueIndex, count: number): number[] {
  const positions = new Set(rows.flatMap(({ from, to }) => [from, (from + to) >>> 1, to - 1]));
  const step = Math.max(1, Math.floor(columns.partId.length / count));
  for (let position = 0; positions.size < count && position < columns.partId.length; position += step)
    positions.add(position);
  return [...positions].sort((a, b) => a - b);
}

const planOf = (
  duty: Duty,
  policy: SearchPlan['policy'],
  partIds: readonly number[] | undefined,
  changes: Partial<SearchPlan> = {},
): SearchPlan => ({
  duty,
  policy,
  filters: partIds === undefined ? {} : { partIds },
  showUnrated: true,
  byCompanyNumber: false,
  sort: { by: 'preference', descending: false },
  offset: 0,
  limit: 1_000_000,
  relaxations: false,
  ...changes,
});

function expectEqual(
  duty: Duty,
  policy: SearchPlan['policy'],
  positions: readonly number[],
  partIds: readonly number[] | undefined,
): void {
  const found = searchCatalogue(index, planOf(duty, policy, partIds), scratch);
  const alone = countOneByOne(index, positions, requirementOf(duty), policy);
  const ids = found.items.map(({ partId }) => partId);
  expect({
    duty,
    total: found.total,
    unrated: found.unrated,
    knockouts: found.knockouts.filter(({ removes, removesAlone }) => removes > 0 || removesAlone > 0),
    met: ids.slice(0, found.total).sort((a, b) => a - b),
    unratedIds: ids.slice(found.total).sort((a, b) => a - b),
  }).toEqual({
    duty,
    total: alone.met.length,
    unrated: alone.unrated.length,
    knockouts: alone.knockouts,
    met: alone.met,
    unratedIds: alone.unrated,
  });
}

it('covers every row of the catalogue', () => {
  expect(duties).toHaveLength(200);
  expect(stratified.length).toBeGreaterThanOrEqual(Math.min(4000, index.columns.partId.length));
  for (const { from, to } of index.rows)
    expect(stratified.some((position) => position >= from && position < to)).toBe(true);
});

it('a search equals assessing each of 4000 parts alone, for 200 duties', () => {
  const partIds = stratified.map((position) => index.columns.partId[position]!);
  for (const [duty, policy] of duties) {
    // Half the duties look at parts of every approval and supply status, so that the other checks decide.
    const open: Duty =
      duties.findIndex(([other]) => other === duty) % 2 === 0
        ? duty
        : {
            ...duty,
            approvals: ['draft', 'in-review', 'approved', 'preferred', 'restricted', 'withdrawn'],
            supply: ['active', 'not-recommended', 'last-time-buy', 'discontinued'],
          };
    expectEqual(open, policy, stratified, partIds);
  }
}, 240_000);

it('a search equals assessing every part alone, for 5 duties', () => {
  const all = Array.from(index.columns.partId.keys());
  for (const [duty, policy] of duties.slice(0, 5)) expectEqual(duty, policy, all, undefined);
}, 240_000);

it('searching again with a relaxation gives the total and its gains, by part and by company part number', () => {
  let tried = 0;
  for (const [duty, policy] of duties.slice(0, 30)) {
    for (const byCompanyNumber of [false, true]) {
      const plan = planOf(duty, policy, undefined, { relaxations: true, byCompanyNumber, limit: 10 });
      const before = searchCatalogue(index, plan, scratch);
      for (const { field, to, gains } of before.relaxations) {
        const after = searchCatalogue(
          index,
          { ...plan, relaxations: false, duty: changed(duty, field, to) },
          scratch,
        );
        expect({ duty, policy, field, to, total: after.total }).toEqual({
          duty,
          policy,
          field,
          to,
          total: before.total + gains,
        });
        expect(gains).toBeGreaterThan(0);
        tried += 1;
      }
    }
  }
  expect(tried).toBeGreaterThan(20);
}, 240_000);

it('pages are stable: pages of 7 give the same order as one page', () => {
  const [duty, policy] = duties.find(
    ([candidate, under]) => searchCatalogue(index, planOf(candidate, under, undefined), scratch).total > 100,
  )!;
  const whole = searchCatalogue(index, planOf(duty, policy, undefined, { limit: 70 }), scratch).items;
  const paged = Array.from(
    { length: 10 },
    (_, page) =>
      searchCatalogue(index, planOf(duty, policy, undefined, { offset: page * 7, limit: 7 }), scratch).items,
  ).flat();
  expect(paged).toEqual(whole);
});

function changed(duty: Duty, pointer: string, to: unknown): Duty {
  const copy = structuredClone(duty) as Record<string, unknown>;
  const names = pointer.slice(1).split('/');
  let holder = copy;
  for (const name of names.slice(0, -1)) holder = holder[name] as Record<string, unknown>;
  holder[names.at(-1)!] = to;
  return copy;
}
