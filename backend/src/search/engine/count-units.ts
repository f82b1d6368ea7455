import type { CatalogueIndex } from '../index/catalogue-index';
import type { Evaluation } from './evaluation';
import type { Scope } from './scope';
import { unmetStanding } from './standing-masks';
import { Tally } from './tally';

/** Counts the parts of an evaluation whose extent is at least the inside of the window. */
export function countParts(index: CatalogueIndex, scope: Scope, evaluation: Evaluation): Tally {
  const { checks, valueBit, standing, outcomes, scratch } = evaluation;
  const { unmet, unrated } = scratch.masks;
  const tally = new Tally(checks);
  for (const { row, from, to, passingOutside } of outcomes) {
    for (let position = from; position < to; position += 1) {
      if (scope.accepts(position)) tally.add(position, unmet[position] ?? 0, unrated[position] ?? 0);
    }
    const outside = scope.countAccepted(row.from, row.to) - scope.countAccepted(from, to);
    if (outside === 0) continue;
    let alone = 0;
    for (let place = 0; place < passingOutside.length; place += 2) {
      const last = passingOutside[place + 1] ?? 0;
      for (let position = passingOutside[place] ?? 0; position < last; position += 1) {
        if (unmetStanding(index.columns, standing, position) === 0 && scope.accepts(position)) alone += 1;
      }
    }
    tally.addRemovedByValue(valueBit, outside, alone);
  }
  return tally;
}

/**
 * Counts company part numbers, each judged by the worst of its sources: its masks are those of all of them together. The
 * evaluation must extend over all parts.
 */
export function countNumbers(scope: Scope, { checks, scratch }: Evaluation): Tally {
  const { unmet, unrated } = scratch.masks;
  const tally = new Tally(checks);
  scope.forEach((number) => {
    let unmetMask = 0;
    let unratedMask = 0;
    for (const position of scope.positionsOf(number)) {
      unmetMask |= unmet[position] ?? 0;
      unratedMask |= unrated[position] ?? 0;
    }
    tally.add(number, unmetMask, unratedMask);
  });
  return tally;
}
