import { judge } from '@resistry/engineering/assessment/judge';
import { settle } from '@resistry/engineering/operating/settle';
import type { CatalogueIndex } from '../../index/catalogue-index';
import { candidateAt } from '../candidate-at';
import { conditionsOfRow, type Evaluation } from '../evaluation';
import { rowOfPosition } from '../row-of-position';
import type { Scope } from '../scope';
import type { Relaxation } from '../search-plan';
import { bitsDependingOn, NearMisses } from './near-misses';
import { choicesOf, relaxChoice } from './relax-choice';
import { relaxNumber } from './relax-number';
import { relaxWindow, type Reach } from './relax-window';
import { relaxableFields } from './relaxable-fields';
import { Retrial } from './retrial';
import { NumbersOutside, PartsOutside } from './window-misses';

/**
 * For each demand that keeps units out by itself, the smallest change that brings some back and how many: searching
 * again with it gives the total and these.
 */
export function relaxationsOf(index: CatalogueIndex, scope: Scope, evaluation: Evaluation): Relaxation[] {
  const { checks, requirement } = evaluation;
  const { duty } = requirement;
  const retrial = new Retrial(index, scope, evaluation);
  const { valueBit } = evaluation;
  // Only a change of the window itself, or of the limits it follows from, brings back what lies outside it.
  const everywhere =
    valueBit === 0 || !(scope.byCompanyNumber || duty.limits !== undefined)
      ? undefined
      : new NearMisses(scope, evaluation, 'everywhere');
  const inWindow = new NearMisses(scope, evaluation, 'inside the window');
  const nearness = nearnessOf(index, scope, evaluation);
  const found: (Relaxation | undefined)[] = [];
  if (duty.window !== undefined && !requirement.link) {
    const outside =
      everywhere === undefined
        ? new PartsOutside(index, scope, evaluation)
        : new NumbersOutside(everywhere, valueBit);
    const reach = reachOf(index, scope, evaluation);
    found.push(
      relaxWindow(duty, 'lower', outside, reach, retrial),
      relaxWindow(duty, 'upper', outside, reach, retrial),
    );
  }
  for (const field of relaxableFields) {
    if (field.loosest(duty) === undefined) continue;
    const misses = field.pointer.startsWith('/limits') && everywhere !== undefined ? everywhere : inWindow;
    found.push(
      relaxNumber(duty, field, misses.within(bitsDependingOn(checks, field.pointer)), nearness, retrial),
    );
  }
  for (const choice of choicesOf(requirement)) {
    found.push(
      relaxChoice(requirement, choice, inWindow.within(bitsDependingOn(checks, choice.pointer)), retrial),
    );
  }
  return found.filter(
    (relaxation): relaxation is Relaxation => relaxation !== undefined && relaxation.gains > 0,
  );
}

/** The least margin among the unmet checks of a unit: the larger, the nearer it comes to being met. */
function nearnessOf(
  index: CatalogueIndex,
  scope: Scope,
  { requirement, policy }: Evaluation,
): (unit: number) => number {
  const known = new Map<number, number>();
  return (unit) => {
    let least = known.get(unit);
    if (least !== undefined) return least;
    least = Infinity;
    for (const position of scope.positionsOf(unit)) {
      for (const { finding } of judge(candidateAt(index, position), requirement, policy).findings) {
        if (finding.status === 'unmet') least = Math.min(least, finding.margin ?? -1);
      }
    }
    known.set(unit, least);
    return least;
  };
}

/** How far units reach, each position in the operating mode that reaches least: no narrower window can hold the unit. */
function reachOf(index: CatalogueIndex, scope: Scope, { requirement, policy }: Evaluation): Reach {
  const conditions = new Map<number, ReturnType<typeof conditionsOfRow>>();
  const { resistance } = index.columns;
  return {
    nominal(unit) {
      const ohms = scope.positionsOf(unit).map((position) => resistance[position] ?? NaN);
      return { low: Math.min(...ohms), high: Math.max(...ohms) };
    },
    life(unit) {
      let low = Infinity;
      let high = 0;
      for (const position of scope.positionsOf(unit)) {
        const row = rowOfPosition(index.rows, position);
        if (row.isLink) return { low: 0, high: Infinity };
        const modes = conditions.get(row.from) ?? conditionsOfRow(row, requirement, policy);
        conditions.set(row.from, modes);
        const ohm = resistance[position] ?? NaN;
        const states = modes.map((mode) => settle(mode, ohm, ohm)).filter(({ settled }) => settled);
        low = Math.min(low, Math.max(0, ...states.map((state) => state.low)));
        high = Math.max(high, Math.min(Infinity, ...states.map((state) => state.high)));
      }
      return { low, high };
    },
  };
}
