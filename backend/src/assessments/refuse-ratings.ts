import { faultOfCurve } from '@resistry/engineering/derating/curve';
import type { Ratings } from '@resistry/engineering/ratings/ratings';
import { ClashProblem } from '../common/problems/problems';
import type { FieldError } from '../common/problems/problem';

/**
 * Refuses ratings that contradict themselves.
 * @throws ClashProblem (422) naming the fields
 */
export function refuseRatings(ratings: Ratings): void {
  const errors: FieldError[] = [];
  if (ratings.derating !== undefined) {
    const fault = faultOfCurve(ratings.derating);
    if (fault !== undefined) errors.push({ pointer: '/ratings/derating/points', message: fault });
  }
  if (ratings.category !== undefined && ratings.category.min >= ratings.category.max) {
    const message = 'the lower category temperature is not below the upper';
    errors.push({ pointer: '/ratings/category/min', message }, { pointer: '/ratings/category/max', message });
  }
  if (ratings.link !== undefined && ratings.resistance !== 0) {
    const message = 'only a zero-ohm link, of resistance 0, has link ratings';
    errors.push({ pointer: '/ratings/resistance', message }, { pointer: '/ratings/link', message });
  }
  if (errors.length > 0) throw new ClashProblem('The ratings contradict themselves.', errors);
}
