import type { Drift } from '../ratings/ratings';
import { scalingDriftTechnologies, type Technology } from '../ratings/technology';

/**
 * Load-life drift at one temperature of the element. `known` is the amount that is certain (a floor where the whole is
 * not known); `complete` tells whether the whole is known.
 */
export interface DriftAmount {
  known: number;
  complete: boolean;
}

/** The drift law a part follows; metal and thin films by common practice, others only where the family gives one. */
export function driftLawOf(
  technology: Technology,
  drift: Drift,
): { exponent: number; doubling: number } | undefined {
  return (
    drift.law ?? (scalingDriftTechnologies.has(technology) ? { exponent: 1 / 3, doubling: 30 } : undefined)
  );
}

/**
 * Load-life drift |ΔR/R| after `hours` with the element at `celsius`:
 * stated · (t/t₀)^exponent · 2^((T−T₀)/doubling); (t/t₀)^(1/3) and doubling per 30 K for films, common practice.
 * Without a law the stated figure holds up to the stated hours and temperature and the drift is not known beyond them.
 * @param hours h, above 0
 * @param celsius temperature of the element, °C
 */
export function driftAt(technology: Technology, drift: Drift, hours: number, celsius: number): DriftAmount {
  const law = driftLawOf(technology, drift);
  if (law !== undefined) {
    const scaled =
      drift.fraction *
      (hours / drift.hours) ** law.exponent *
      2 ** ((celsius - drift.temperature) / law.doubling);
    return { known: scaled, complete: true };
  }
  return { known: drift.fraction, complete: hours <= drift.hours && celsius <= drift.temperature };
}
