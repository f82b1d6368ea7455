import type { DeratingCurve } from '../ratings/ratings';
import { fractionAt, kneeOf, zeroOf } from './curve';
import type { PolicyEntry } from './policy-entry';

/** The corners of a parallel policy line, °C: full ratio up to `from`, nothing from `zero` on. */
export function lineOf(entry: PolicyEntry, curve: DeratingCurve): { from: number; zero: number } {
  const from = entry.from ?? kneeOf(curve);
  return { from, zero: entry.zero ?? entry.powerRatio * (zeroOf(curve) - from) + from };
}

/**
 * Fraction of the rated dissipation that is allowed at a temperature of the curve's axis: the policy's line, never above
 * the manufacturer's own curve, and nothing past the policy's maximum temperature.
 * Two readings of a stress ratio exist and differ: *parallel* draws a line of its own (NASA EEE-INST-002, section R2:
 * T2 = factor·(T3 − T1) + T1), *multiplied* takes the ratio of whatever the manufacturer's curve leaves.
 * @param entry the policy entry in force; undefined = manufacturer's ratings as they are
 * @param celsius °C on the curve's axis
 */
export function allowedFraction(
  curve: DeratingCurve,
  entry: PolicyEntry | undefined,
  celsius: number,
): number {
  const manufacturer = fractionAt(curve, celsius);
  if (entry === undefined) return manufacturer;
  if (entry.maxTemperature !== undefined && celsius > entry.maxTemperature) return 0;
  if (entry.reading === 'multiplied') return Math.min(manufacturer, entry.powerRatio * manufacturer);
  const { from, zero } = lineOf(entry, curve);
  let line = entry.powerRatio;
  if (celsius > from) line = celsius >= zero ? 0 : (entry.powerRatio * (zero - celsius)) / (zero - from);
  return Math.min(manufacturer, line);
}
