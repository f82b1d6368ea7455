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

/** Load-life drift after a given time, still open to the temperature of the element. */
export interface DriftOverLife {
  /** Fraction at the temperature of the family's test. */
  atTestTemperature: number;
  /** °C */
  testTemperature: number;
  /** Growth per kelvin, 1/K: ln 2 / doubling; 0 without a law. */
  perKelvin: number;
  /** Hottest element, °C, up to which the whole is known: −Infinity beyond the stated hours without a law. */
  completeUpTo: number;
}

/**
 * Load-life drift |ΔR/R| over `hours`: stated · (t/t₀)^exponent · 2^((T−T₀)/doubling); (t/t₀)^(1/3) and doubling per 30 K
 * for films, common practice. Without a law the stated figure holds up to the stated hours and temperature and the drift
 * is not known beyond them.
 * @param hours h, above 0
 */
export function driftOverLife(technology: Technology, drift: Drift, hours: number): DriftOverLife {
  const law = driftLawOf(technology, drift);
  if (law === undefined) {
    return {
      atTestTemperature: drift.fraction,
      testTemperature: drift.temperature,
      perKelvin: 0,
      completeUpTo: hours <= drift.hours ? drift.temperature : -Infinity,
    };
  }
  return {
    atTestTemperature: drift.fraction * (hours / drift.hours) ** law.exponent,
    testTemperature: drift.temperature,
    perKelvin: Math.LN2 / law.doubling,
    completeUpTo: Infinity,
  };
}

/** The drift with the element at a temperature, °C. */
export function driftAt(drift: DriftOverLife, celsius: number): DriftAmount {
  return { known: knownDriftAt(drift, celsius), complete: celsius <= drift.completeUpTo };
}

/** The part of the drift that is certain with the element at a temperature (°C), fraction. */
export function knownDriftAt(drift: DriftOverLife, celsius: number): number {
  if (drift.perKelvin === 0) return drift.atTestTemperature;
  return drift.atTestTemperature * Math.exp((celsius - drift.testTemperature) * drift.perKelvin);
}
