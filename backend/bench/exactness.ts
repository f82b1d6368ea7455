import assert from 'node:assert/strict';
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { DutyConflict } from '@resistry/engineering/duty/duty-conflict';
import type { Duty } from '@resistry/engineering/duty/duty';
import { requirementOf } from '@resistry/engineering/duty/requirement';
import * as fc from 'fast-check';
import { arbitraryDuty, arbitraryPolicy } from '../engineering/src/test-support/arbitrary-duties';
import { allocateScratch } from '../src/search/engine/scratch';
import { searchCatalogue } from '../src/search/engine/search-catalogue';
import { countOneByOne } from '../test/search/brute-force';
import { openIndex } from './open-index';
import { startServer } from './server';

const duties = 200;
/** The same duties at every run, and others than the tests take. */
const seed = 1201;

/**
 * Holds the search to assessing every part of the demonstration alone, for 200 random duties and policies: identical
 * totals, identical parts, identical knock-outs, or the run fails.
 */
export async function exactness(): Promise<void> {
  const folder = await mkdtemp(join(tmpdir(), 'resistry-bench-'));
  try {
    await (await startServer(folder)).stop();
    const { index, close } = await openIndex(folder);
    const scratch = allocateScratch(index.columns.partId.length);
    const positions = Array.from(index.columns.partId.keys());
    let judged = 0;
    for (const [duty, policy] of samples()) {
      const requirement = requirementOf(duty);
      const found = searchCatalogue(
        index,
        {
          duty,
          policy,
          filters: {},
          showUnrated: true,
          byCompanyNumber: false,
          sort: { by: 'preference', descending: false },
          offset: 0,
          limit: positions.length,
          relaxations: false,
        },
        scratch,
      );
      const alone = countOneByOne(index, positions, requirement, policy);
      const ids = found.items.map(({ partId }) => partId);
      const ascending = (list: number[]): number[] => list.sort((first, second) => first - second);
      assert.deepEqual(
        {
          met: ascending(ids.slice(0, found.total)),
          unrated: ascending(ids.slice(found.total)),
          knockouts: found.knockouts.filter(({ removes, removesAlone }) => removes > 0 || removesAlone > 0),
        },
        { met: alone.met, unrated: alone.unrated, knockouts: alone.knockouts },
        `The search differs from assessing each part alone for ${JSON.stringify({ duty, policy })}`,
      );
      judged += positions.length;
    }
    await close();
    process.stdout.write(
      `\nExactness: ${String(duties)} random duties, every one of ${String(positions.length)} parts assessed alone: ` +
        `${String(judged)} parts, no difference.\n`,
    );
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
}

function samples(): [Duty, Parameters<typeof countOneByOne>[3]][] {
  return fc
    .sample(fc.tuple(arbitraryDuty, arbitraryPolicy), { seed, numRuns: 2 * duties })
    .filter(([duty]) => isPossible(duty))
    .slice(0, duties);
}

function isPossible(duty: Duty): boolean {
  try {
    requirementOf(duty);
    return true;
  } catch (error) {
    if (error instanceof DutyConflict) return false;
    throw error;
  }
}
