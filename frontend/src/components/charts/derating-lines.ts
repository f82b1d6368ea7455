import { fractionAt, zeroOf } from '@resistry/engineering/derating/curve';
import type { PolicyEntry } from '@resistry/engineering/derating/policy-entry';
import { allowedFraction, lineOf } from '@resistry/engineering/derating/policy-line';
import type { DeratingCurve } from '@resistry/engineering/ratings/ratings';
import type { Point } from './line-chart';

export interface DeratingLines {
  /** °C */
  temperatures: readonly [number, number];
  /** °C up to which the manufacturer's curve is level. */
  levelTo: number;
  /** Points of (°C, W). */
  manufacturer: Point[];
  /** Absent where the manufacturer's ratings hold as they are. */
  policy?: Point[];
}

/** Both readings of a policy are straight between corners, so its corners and a point beside each step say it all. */
function corners(curve: DeratingCurve, entry: PolicyEntry, low: number, high: number): number[] {
  const line = lineOf(entry, curve);
  const ends = [line.from, line.zero, ...(entry.maxTemperature === undefined ? [] : [entry.maxTemperature])];
  const step = (high - low) / 1e6;
  const steps = ends.flatMap((celsius) => [celsius, celsius + step]);
  // Where the policy's line crosses the manufacturer's curve is no corner of either: a fine grid finds it well enough to draw.
  const grid = Array.from({ length: 101 }, (_, index) => low + ((high - low) * index) / 100);
  return [...curve.points.map(([celsius]) => celsius), ...steps, ...grid]
    .filter((celsius) => celsius >= low && celsius <= high)
    .sort((first, second) => first - second);
}

/**
 * The derating curve of the manufacturer and the policy's line, for drawing.
 * @param ratedWatt W at the full fraction
 * @param coldest °C where the drawing starts
 */
export function deratingLines(
  ratedWatt: number,
  curve: DeratingCurve,
  entry: PolicyEntry | undefined,
  coldest: number,
): DeratingLines {
  const zero = zeroOf(curve);
  const first = Math.min(coldest, curve.points[0]?.[0] ?? coldest);
  const watt = (fraction: number): number => fraction * ratedWatt;
  const manufacturer: Point[] = [
    [first, watt(fractionAt(curve, first))],
    ...curve.points.map(([celsius, fraction]): Point => [celsius, watt(fraction)]),
  ];
  const policy =
    entry &&
    corners(curve, entry, first, zero).map((celsius): Point => [
      celsius,
      watt(allowedFraction(curve, entry, celsius)),
    ]);
  const [[, level] = [first, 0]] = manufacturer;
  const falling = manufacturer.findIndex(([, each]) => Math.abs(each - level) > level * 1e-9);
  const [levelTo] = manufacturer[(falling === -1 ? manufacturer.length : falling) - 1] ?? [first];
  return { temperatures: [first, zero], levelTo, manufacturer, ...(policy && { policy }) };
}
