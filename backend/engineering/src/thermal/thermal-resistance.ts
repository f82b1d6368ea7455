import type { Ratings } from '../ratings/ratings';

/** Thermal resistance in K/W and where it comes from. */
export interface ThermalResistance {
  value: number;
  from: 'datasheet' | 'derating curve';
}

/**
 * Thermal resistance from the element to the axis of the derating curve: the datasheet's, else the curve's slope,
 * R_th = ΔT / (P_rated · Δfraction) (IEC 60115-1: the curve falls as the element reaches its maximum temperature).
 * Of several falling stretches the one with the largest thermal resistance counts, the safe side.
 * @returns undefined where neither the datasheet nor a falling curve gives it
 */
export function thermalResistanceOf(ratings: Ratings): ThermalResistance | undefined {
  if (ratings.thermalResistance !== undefined) return { value: ratings.thermalResistance, from: 'datasheet' };
  const { derating, ratedDissipation } = ratings;
  if (derating === undefined || ratedDissipation === undefined || ratedDissipation <= 0) return undefined;
  let largest: number | undefined;
  for (const [index, [celsius, fraction]] of derating.points.entries()) {
    const before = derating.points[index - 1];
    if (before === undefined || fraction >= before[1]) continue;
    const slope = (celsius - before[0]) / (ratedDissipation * (before[1] - fraction));
    largest = Math.max(largest ?? 0, slope);
  }
  return largest === undefined ? undefined : { value: largest, from: 'derating curve' };
}
