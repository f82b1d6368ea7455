import type { Duty } from '@resistry/engineering/duty/duty';
import type { Relaxation } from '../search-plan';
import { numberAt, roundedOutward, withValueAt, type RelaxableField } from './relaxable-fields';
import type { Retrial } from './retrial';
import type { Units } from './units';

/** Halvings of a bisection: a thousandth of the way from the stated value to the loosest. */
const halvings = 12;

/** Units that are tried for the smallest change: those that come nearest to being met. */
const tried = 24;

/**
 * The smallest change of one number that brings a unit back, and how many units come back with it. The nearest misses are
 * halved towards together; the gains are counted over all.
 * @param nearness larger the nearer a unit comes to being met; Infinity for one that has no unmet check but lacks data
 */
export function relaxNumber(
  duty: Duty,
  field: RelaxableField,
  units: Units,
  nearness: (unit: number) => number,
  retrial: Retrial,
): Relaxation | undefined {
  const loosest = field.loosest(duty);
  if (loosest === undefined || units.size === 0) return undefined;
  const stated = numberAt(duty, field.pointer);
  if (stated === loosest) return undefined;
  const at = (value: number): Duty => withValueAt(duty, field.pointer, value);
  let held = retrial.met(at(loosest), nearestOf(units, nearness));
  if (held.length === 0) return undefined;
  let tight = stated;
  let loose = loosest;
  for (let step = 0; step < halvings; step += 1) {
    const middle = between(field, tight, loose);
    const met = retrial.met(at(middle), held);
    if (met.length > 0) {
      loose = middle;
      held = met;
    } else tight = middle;
  }
  const rounded = roundedOutward(field, loose, loosest);
  const to = retrial.met(at(rounded), held).length > 0 ? rounded : loose;
  return { field: field.pointer, to, gains: retrial.countMet(at(to), units) };
}

/** Of very many misses an even sample is looked at: the smallest change among them stands for all. */
const sampled = 300;

/** The units nearest to being met; beside those with an unmet check some that only lack data, which a change can spare. */
function nearestOf(units: Units, nearness: (unit: number) => number): number[] {
  const sample = units.sample(units.size <= tried ? tried : sampled);
  if (sample.length <= tried) return sample;
  const byNearness = sample
    .map((unit) => ({ unit, near: nearness(unit) }))
    .sort((first, second) => second.near - first.near || first.unit - second.unit);
  const lacking = byNearness.filter(({ near }) => near === Infinity).slice(0, tried / 3);
  const unmet = byNearness.filter(({ near }) => near < Infinity).slice(0, tried - lacking.length);
  return [...unmet, ...lacking].map(({ unit }) => unit);
}

/** Halfway: in degrees between the two, else their geometric mean where both are above 0. */
function between(field: RelaxableField, tight: number, loose: number): number {
  if (field.scale === 'degrees') return (tight + loose) / 2;
  return tight > 0 && loose > 0 ? Math.sqrt(tight * loose) : (tight + loose) / 2;
}
