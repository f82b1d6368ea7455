import { decadePosition } from './decade-position';
import type { SeriesName } from './series';

/**
 * Whether a value belongs to a series of IEC 60063 in any decade. Rounding noise is forgiven: nine significant digits count.
 *
 * @param value above 0 and finite
 * @throws RangeError otherwise
 */
export function isMember(value: number, series: SeriesName): boolean {
  return decadePosition(value, series).member;
}
