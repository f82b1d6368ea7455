import { stretchOf } from './fail-zone';
import { assessAlone, type Row } from './evaluate-row';
import type { RowAnswer } from './row-answers';

/**
 * The stretches of a row in which no check but `value` is unmet. Exact, like `evaluateRow`, and without a look at single
 * parts that bounds decide.
 * @param among stretches to look at: pairs of first position and position after the last, rising
 * @returns the same kind of pairs
 */
export function passingStretches(row: Row, among: readonly number[]): readonly number[] {
  let stretches = among;
  for (const answer of row.answers) {
    const from = stretches[0];
    const to = stretches.at(-1);
    if (from === undefined || to === undefined) return stretches;
    if (answer.definition.name === 'value') continue;
    if (answer.unloaded === 'unmet') return [];
    const zone = stretchOf(answer.zone, row.resistances, from, to);
    stretches = without(stretches, zone.certainFrom, zone.certainTo);
    stretches = withoutFailing(stretches, row, answer, zone.possibleFrom, zone.certainFrom);
    stretches = withoutFailing(stretches, row, answer, zone.certainTo, zone.possibleTo);
  }
  return stretches;
}

/** Stretches without those positions of [from, to) that a check removes, each assessed alone. */
function withoutFailing(
  among: readonly number[],
  row: Row,
  answer: RowAnswer,
  from: number,
  to: number,
): readonly number[] {
  let stretches = among;
  for (let position = from; position < to; position += 1) {
    if (holds(among, position) && assessAlone(row, answer, position) === 'unmet')
      stretches = without(stretches, position, position + 1);
  }
  return stretches;
}

function holds(stretches: readonly number[], position: number): boolean {
  for (let place = 0; place < stretches.length; place += 2) {
    if (position >= (stretches[place] ?? 0) && position < (stretches[place + 1] ?? 0)) return true;
  }
  return false;
}

/** Stretches without the positions of [from, to). */
function without(stretches: readonly number[], from: number, to: number): readonly number[] {
  if (from >= to) return stretches;
  const kept: number[] = [];
  for (let place = 0; place < stretches.length; place += 2) {
    const first = stretches[place] ?? 0;
    const last = stretches[place + 1] ?? 0;
    if (first < Math.min(last, from)) kept.push(first, Math.min(last, from));
    if (Math.max(first, to) < last) kept.push(Math.max(first, to), last);
  }
  return kept;
}
