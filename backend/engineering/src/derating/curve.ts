import type { DeratingCurve } from '../ratings/ratings';

/** Why a derating curve cannot be used, or undefined where it can. */
export function faultOfCurve(curve: DeratingCurve): string | undefined {
  if (curve.points.length === 0) return 'the derating curve has no point';
  let previous = -Infinity;
  for (const [celsius, fraction] of curve.points) {
    if (!Number.isFinite(celsius) || !Number.isFinite(fraction))
      return 'a point of the derating curve is not finite';
    if (celsius <= previous) return 'the points of the derating curve must rise in temperature';
    if (fraction < 0 || fraction > 1) return 'a fraction of the derating curve lies outside 0 to 1';
    previous = celsius;
  }
  return undefined;
}

/**
 * Fraction of the rated dissipation that the manufacturer's curve leaves at a temperature of its own axis.
 * Piecewise linear; 1 below its first point, its last value at its end, 0 beyond ("outside its temperature range").
 * @param celsius °C on the curve's axis
 */
export function fractionAt(curve: DeratingCurve, celsius: number): number {
  const points = curve.points;
  const first = points[0];
  const last = points[points.length - 1];
  if (first === undefined || last === undefined) throw new RangeError('The derating curve has no point.');
  if (celsius < first[0]) return 1;
  if (celsius > last[0]) return 0;
  let before = first;
  for (const point of points) {
    if (celsius <= point[0]) {
      if (point[0] === before[0]) return point[1];
      return before[1] + ((point[1] - before[1]) * (celsius - before[0])) / (point[0] - before[0]);
    }
    before = point;
  }
  return last[1];
}

/** Temperature (°C) up to which the curve leaves its full fraction: its last point before it falls. */
export function kneeOf(curve: DeratingCurve): number {
  const points = curve.points;
  let knee = points[0]?.[0] ?? NaN;
  for (const [index, point] of points.entries()) {
    const before = points[index - 1];
    if (before !== undefined && point[1] < before[1]) break;
    knee = point[0];
  }
  return knee;
}

/** Temperature (°C) at which nothing is left: the first point of fraction 0, else the curve's end, beyond which it is 0. */
export function zeroOf(curve: DeratingCurve): number {
  const atZero = curve.points.find(([, fraction]) => fraction === 0);
  return (atZero ?? curve.points[curve.points.length - 1])?.[0] ?? NaN;
}
