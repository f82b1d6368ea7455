import { settle } from '@resistry/engineering/operating/settle';
import type { Duty } from '@resistry/engineering/duty/duty';
import type { CatalogueIndex } from '../../index/catalogue-index';
import type { Evaluation, Scratch } from '../evaluation';
import { conditionsOfRow } from '../evaluation';
import { rowOfPosition } from '../row-of-position';
import type { Relaxation } from '../search-plan';
import { bitsDependingOn, missesDependingOn, type Miss } from './near-misses';
import { choicesOf, relaxChoice } from './relax-choice';
import { relaxNumber } from './relax-number';
import { relaxWindow, type LifeInterval } from './relax-window';
import { relaxableFields } from './relaxable-fields';
import { Retrial, type Unit } from './retrial';

/**
 * For each demand that keeps parts out by itself, the smallest change that brings some back and how many: searching
 * again with it gives the total and these.
 */
export function relaxationsOf(
  index: CatalogueIndex,
  evaluation: Evaluation,
  duty: Duty,
  misses: readonly Miss[],
  scratch: Scratch,
): Relaxation[] {
  const retrial = new Retrial(index, evaluation, scratch);
  const { checks, requirement } = evaluation;
  const valueBit = checks.find(({ definition }) => definition.name === 'value')?.bit ?? 0;
  const inWindow = misses.filter(({ unit }) =>
    unit.every((position) => isInside(requirement.window, index.columns.resistance[position] ?? NaN)),
  );
  const unitsFor = (pointer: string): Unit[] =>
    missesDependingOn(pointer.startsWith('/limits') ? misses : inWindow, bitsDependingOn(checks, pointer));
  const found: (Relaxation | undefined)[] = [];
  if (valueBit !== 0 && !requirement.link) {
    const kept = misses
      .filter(({ unmet }) => unmet !== 0 && (unmet & ~valueBit) === 0)
      .map(({ unit }) => unit);
    const lifeOf = lifeIntervals(index, evaluation);
    found.push(
      relaxWindow(duty, 'lower', kept, lifeOf, retrial),
      relaxWindow(duty, 'upper', kept, lifeOf, retrial),
    );
  }
  for (const field of relaxableFields) {
    if (field.loosest(duty) !== undefined)
      found.push(relaxNumber(duty, field, unitsFor(field.pointer), retrial));
  }
  for (const choice of choicesOf(requirement))
    found.push(relaxChoice(duty, choice, unitsFor(choice.pointer), retrial));
  return found.filter(
    (relaxation): relaxation is Relaxation => relaxation !== undefined && relaxation.gains > 0,
  );
}

function isInside(window: { lower: number; upper: number } | undefined, resistance: number): boolean {
  return window === undefined || (resistance >= window.lower && resistance <= window.upper);
}

/**
 * The narrowest interval over life that each position of a unit has in any operating mode, all positions together: no
 * narrower window can hold the unit.
 */
function lifeIntervals(index: CatalogueIndex, { requirement, policy }: Evaluation): LifeInterval {
  const conditions = new Map<number, ReturnType<typeof conditionsOfRow>>();
  return (unit) => {
    let low = Infinity;
    let high = 0;
    for (const position of unit) {
      const row = rowOfPosition(index.rows, position);
      if (row.isLink) return { low: 0, high: Infinity };
      const modes = conditions.get(row.from) ?? conditionsOfRow(index, row, requirement, policy);
      conditions.set(row.from, modes);
      const resistance = index.columns.resistance[position] ?? NaN;
      const states = modes
        .map((mode) => settle(mode, resistance, resistance))
        .filter(({ settled }) => settled);
      low = Math.min(low, Math.max(0, ...states.map((state) => state.low)));
      high = Math.max(high, Math.min(Infinity, ...states.map((state) => state.high)));
    }
    return { low, high };
  };
}
