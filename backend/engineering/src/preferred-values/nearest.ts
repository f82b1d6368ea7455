import { neighbours } from './neighbours';
import type { SeriesName } from './series';

/**
 * The value of a series nearest to a value by ratio; of two equally near the lower.
 *
 * @param value above 0 and finite, in any unit
 * @throws RangeError otherwise
 */
export function nearest(value: number, series: SeriesName): number {
  const { below, member, above } = neighbours(value, series);
  if (member !== null) return member;
  return value / below <= above / value ? below : above;
}
