import { ForbiddenProblem } from '../common/problems/problems';
import type { Action, Subject } from './actions-and-subjects';
import { rules } from './rules';

/** The 403 for a deed that no rule allows this person: names the deed and says who may do it. */
export function refusalOf(action: Action, subject: Subject): ForbiddenProblem {
  const sentences = rules
    .filter(
      ({ actions, subjects }) =>
        subjects.includes(subject) && (actions.includes(action) || actions.includes('manage')),
    )
    .map(({ sentence }) => sentence);
  return new ForbiddenProblem(
    `${action} ${subject}`,
    sentences.join(' ') || 'No rule allows anybody to do this.',
  );
}
