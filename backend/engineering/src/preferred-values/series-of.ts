import { isMember } from './is-member';
import { seriesNames, type SeriesName } from './series';

/**
 * The series to which a value belongs, coarse to fine; empty where it is no preferred value.
 * E24 values are mostly in neither E96 nor E192.
 *
 * @param value above 0 and finite
 * @throws RangeError otherwise
 */
export function seriesOf(value: number): SeriesName[] {
  return seriesNames.filter((series) => isMember(value, series));
}
