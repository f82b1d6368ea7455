import type { Conditions } from '../operating/conditions';

/** What a part could bear here at its nominal resistance: W, V, A; null where data are missing. */
export interface Permitted {
  dissipation: number | null;
  voltage: number | null;
  current: number | null;
}

/**
 * Dissipation P_allowed; voltage the lower of the voltage allowance and √(P_allowed·R); current √(P_allowed/R)
 * (IEC 60115-1, rated voltage; NASA EEE-INST-002 section R2 takes the lower of both the same way).
 */
export function permittedOf(conditions: Conditions): Permitted {
  const resistance = conditions.ratings.resistance;
  if (resistance === 0) {
    return { dissipation: null, voltage: null, current: conditions.ratings.link?.ratedCurrent ?? null };
  }
  const { allowedDissipation, allowedVoltage } = conditions;
  const watt = allowedDissipation.known ? allowedDissipation.value : null;
  return {
    dissipation: watt,
    voltage:
      watt === null || !allowedVoltage.known
        ? null
        : Math.min(allowedVoltage.value, Math.sqrt(watt * resistance)),
    current: watt === null ? null : Math.sqrt(watt / resistance),
  };
}
