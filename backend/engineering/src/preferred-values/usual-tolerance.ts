import type { SeriesName } from './series';

const tolerances: Readonly<Record<SeriesName, number | null>> = {
  E3: null,
  E6: 0.2,
  E12: 0.1,
  E24: 0.05,
  E48: 0.02,
  E96: 0.01,
  E192: 0.005,
};

/**
 * The tolerance that usually goes with a series of IEC 60063, as a fraction. E192 goes with 0.5 % and tighter.
 * A habit of the trade, no rule: 1 % parts of E24 values are common.
 *
 * @returns null for E3, which has no usual tolerance
 */
export function usualTolerance(series: SeriesName): number | null {
  return tolerances[series];
}
