import type { Mounting, Technology } from '../ratings/technology';
import type { Ratings } from '../ratings/ratings';

export const policyReadings = ['parallel', 'multiplied'] as const;
export type PolicyReading = (typeof policyReadings)[number];

/** Which parts an entry of a derating policy is for; an absent field matches every part. */
export interface PolicyMatch {
  technology?: Technology | readonly Technology[];
  mounting?: Mounting;
  /** Style of the failure-rate handbook or the agency's table, e.g. RM. */
  style?: string;
  /** Largest tolerance (fraction) that the entry covers. */
  tolerance?: number;
}

/** One entry of a derating policy: stress ratios as fractions, temperatures in °C, reserve in K, altitude in m. */
export interface PolicyEntry {
  match: PolicyMatch;
  powerRatio: number;
  reading: PolicyReading;
  /** °C; default the knee of the manufacturer's curve. */
  from?: number;
  /** °C; default powerRatio × (zero of the curve − from) + from. */
  zero?: number;
  voltageRatio: number;
  pulseRatio?: number;
  /** °C on the axis of the curve, never passed even unloaded. */
  maxTemperature?: number;
  /** K kept below the maximum element temperature. */
  reserve?: number;
  altitude?: readonly (readonly [metre: number, factor: number])[];
}

/** The policy an assessment is made under: a list of entries, or the manufacturer's ratings as they are. */
export type Policy = 'none' | { entries: readonly PolicyEntry[] };

/** The entry in force for a part: the first that matches; undefined where none does. */
export function entryFor(entries: readonly PolicyEntry[], ratings: Ratings): PolicyEntry | undefined {
  return entries.find((entry) => matches(entry.match, ratings));
}

function matches(match: PolicyMatch, ratings: Ratings): boolean {
  if (match.technology !== undefined) {
    const wanted = typeof match.technology === 'string' ? [match.technology] : match.technology;
    if (!wanted.includes(ratings.technology)) return false;
  }
  if (match.mounting !== undefined && match.mounting !== ratings.mounting) return false;
  if (match.style !== undefined && match.style !== ratings.failureRateStyle) return false;
  if (match.tolerance === undefined) return true;
  return ratings.tolerance !== undefined && ratings.tolerance <= match.tolerance * (1 + 1e-9);
}
