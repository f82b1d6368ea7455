import type { Duty } from '@resistry/engineering/duty/duty';
import type { Relaxation } from '../search-plan';
import { numberAt, roundedOutward, withValueAt, type RelaxableField } from './relaxable-fields';
import type { Retrial, Unit } from './retrial';

/** Halvings of a bisection: a thousandth of the way from the stated value to the loosest. */
const halvings = 12;

/**
 * The smallest change of one number that brings a unit back, and how many units come back with it. Among many units the
 * ones that come back first are found by halving the way for all of them together.
 */
export function relaxNumber(
  duty: Duty,
  field: RelaxableField,
  units: readonly Unit[],
  retrial: Retrial,
): Relaxation | undefined {
  const loosest = field.loosest(duty);
  if (loosest === undefined || units.length === 0) return undefined;
  const stated = numberAt(duty, field.pointer);
  if (stated === loosest) return undefined;
  const at = (value: number): Duty => withValueAt(duty, field.pointer, value);
  let held = units.filter((unit) => unit.length > 0);
  if (retrial.count(at(loosest), held) === 0) return undefined;
  let tight = stated;
  let loose = loosest;
  for (let step = 0; step < halvings; step += 1) {
    const middle = between(field, tight, loose);
    if (middle === tight || middle === loose) break;
    if (retrial.count(at(middle), held) > 0) {
      loose = middle;
      if (held.length > 16) held = held.filter((unit) => retrial.meets(at(middle), unit));
    } else tight = middle;
  }
  const rounded = roundedOutward(field, loose, loosest);
  const to = retrial.count(at(rounded), held) > 0 ? rounded : loose;
  return { field: field.pointer, to, gains: retrial.count(at(to), units) };
}

/** Halfway: in degrees between the two, else their geometric mean where both are above 0. */
function between(field: RelaxableField, tight: number, loose: number): number {
  if (field.scale === 'degrees') return (tight + loose) / 2;
  return tight > 0 && loose > 0 ? Math.sqrt(tight * loose) : (tight + loose) / 2;
}
