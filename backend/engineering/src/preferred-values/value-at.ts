import { decimalValue } from '../notation/decimal-value';
import { seriesMantissas } from './series-mantissas';
import type { SeriesName } from './series';

/**
 * The value of a series at a place, exactly the double nearest to its decimal: E24, decade 3, index 16 is 4700.
 *
 * @param decade power of ten of the decade: 3 for 1000 to below 10 000
 * @param index place in the decade; below 0 and beyond the last it runs on into the neighbouring decades
 */
export function valueAt(decade: number, index: number, series: SeriesName): number {
  const values = seriesMantissas(series);
  const shift = Math.floor(index / values.length);
  const mantissa = values[index - shift * values.length] ?? NaN;
  return decimalValue(mantissa, decade + shift - 2);
}
