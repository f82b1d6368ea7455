import { decadePosition } from './decade-position';
import type { SeriesName } from './series';
import { valueAt } from './value-at';

export interface Neighbours {
  /** The next value below, never the value itself. */
  readonly below: number;
  /** The value itself where it belongs to the series, else null. */
  readonly member: number | null;
  /** The next value above, never the value itself. */
  readonly above: number;
}

/**
 * The values of a series on both sides of a value.
 *
 * @param value above 0 and finite, in any unit
 * @throws RangeError otherwise
 */
export function neighbours(value: number, series: SeriesName): Neighbours {
  const { decade, index, member } = decadePosition(value, series);
  return {
    below: valueAt(decade, member ? index - 1 : index, series),
    member: member ? valueAt(decade, index, series) : null,
    above: valueAt(decade, index + 1, series),
  };
}
