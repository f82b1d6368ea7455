import { significantDecimal } from '../notation/significant-decimal';
import { seriesMantissas } from './series-mantissas';
import type { SeriesName } from './series';

/** Where a value stands in a series: at or above the entry `index` of the decade 10^`decade`. */
export interface DecadePosition {
  readonly decade: number;
  readonly index: number;
  /** Whether the value is that entry, within rounding noise (nine significant digits). */
  readonly member: boolean;
}

/**
 * Finds the last value of a series that is not above a value.
 *
 * @param value above 0 and finite
 * @throws RangeError otherwise
 */
export function decadePosition(value: number, series: SeriesName): DecadePosition {
  if (!Number.isFinite(value) || value <= 0)
    throw new RangeError(`value must be above 0 and finite, not ${value}`);
  const { digits, exponent } = significantDecimal(value, 9);
  const mantissa = Number(`${digits.charAt(0)}.${digits.slice(1)}e2`);
  const values = seriesMantissas(series);
  // The first entry is 100 and the mantissa at least 100, so that an entry is always found.
  const index = values.findLastIndex((entry) => entry <= mantissa);
  return { decade: exponent, index, member: values[index] === mantissa };
}
