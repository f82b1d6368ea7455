import type { Conditions } from '../operating/conditions';
import { settle } from '../operating/settle';
import { classifyValue } from './classify-value';
import { stretchOf } from './fail-zone';
import type { RowAnswer } from './row-answers';
import { clearBit, firstAbove, firstNotBelow, setBit, setStatus, type RowMasks } from './row-masks';

/** Outside the window a part fails whatever its deviation; the guard keeps rounding out of it. */
const guard = 1e-6;

/** A row of parts: same ratings, one operating mode, resistances (Ω) rising. */
export interface Row {
  conditions: Conditions;
  answers: readonly RowAnswer[];
  resistances: Float64Array;
}

/**
 * Sets, for each part of [from, to) of a row, the bits of the checks that are unmet and unrated. Checks of the part's
 * standing are left out. Exact: every status equals that of assessing the part alone.
 */
export function evaluateRow(row: Row, from: number, to: number, masks: RowMasks): void {
  masks.unmet.fill(0, from, to);
  masks.unrated.fill(0, from, to);
  const isLink = row.conditions.ratings.resistance === 0;
  for (const answer of row.answers) {
    if (answer.definition.name === 'value' && !isLink && !row.conditions.requirement.link)
      evaluateValue(row, answer, from, to, masks);
    else evaluateByZone(row, answer, from, to, masks);
  }
}

/**
 * The positions of [from, to) that the window leaves to be judged: every other part fails it by its nominal resistance and
 * its tolerance at delivery alone. `to` is not below `from`; where they are equal none is left.
 * @param tolerance fraction
 */
export function insideWindow(
  window: { lower: number; upper: number },
  tolerance: number,
  resistances: Float64Array,
  from: number,
  to: number,
): [from: number, to: number] {
  const lowest = tolerance < 1 ? window.lower / (1 - tolerance) : Infinity;
  const highest = window.upper / (1 + tolerance);
  const first = firstNotBelow(resistances, from, to, lowest * (1 - guard));
  return [first, firstAbove(resistances, first, to, highest * (1 + guard))];
}

function evaluateValue(
  { conditions, resistances }: Row,
  { bit, unloaded }: RowAnswer,
  from: number,
  to: number,
  masks: RowMasks,
): void {
  const window = conditions.requirement.window;
  if (window === undefined) return;
  const tolerance = conditions.ratings.tolerance ?? 0;
  const [first, last] = insideWindow(window, tolerance, resistances, from, to);
  setBit(masks.unmet, from, first, bit);
  setBit(masks.unmet, last, to, bit);
  if (first < last)
    classifyValue({ conditions, window, resistances, masks, bit, atRest: unloaded }, first, last);
}

function evaluateByZone(row: Row, answer: RowAnswer, from: number, to: number, masks: RowMasks): void {
  const { bit, unloaded, zone } = answer;
  setStatus(masks, from, to, bit, unloaded);
  if (unloaded === 'unmet') return;
  const stretch = stretchOf(zone, row.resistances, from, to);
  setBit(masks.unmet, stretch.certainFrom, stretch.certainTo, bit);
  clearBit(masks.unrated, stretch.certainFrom, stretch.certainTo, bit);
  assessEach(row, answer, stretch.possibleFrom, stretch.certainFrom, masks);
  assessEach(row, answer, stretch.certainTo, stretch.possibleTo, masks);
}

function assessEach(row: Row, answer: RowAnswer, from: number, to: number, masks: RowMasks): void {
  const { bit } = answer;
  for (let index = from; index < to; index += 1) {
    masks.exact += 1;
    clearBit(masks.unrated, index, index + 1, bit);
    setStatus(masks, index, index + 1, bit, assessAlone(row, answer, index));
  }
}

/** What one check answers for the part at a position. */
export function assessAlone(
  { conditions, resistances }: Row,
  { definition }: RowAnswer,
  position: number,
): 'met' | 'unmet' | 'unrated' {
  const resistance = resistances[position] ?? NaN;
  return definition.find({ conditions, state: settle(conditions, resistance, resistance) }).status;
}
