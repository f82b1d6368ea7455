import { ForbiddenProblem } from '../common/problems/problems';
import type { Action, Subject } from './actions-and-subjects';
import { rules } from './rules';

/** The 403 for deeds none of which a rule allows this person: names them and says who may do them. */
export function refusalOf(deeds: Action | readonly Action[], subject: Subject): ForbiddenProblem {
  const refused = typeof deeds === 'string' ? [deeds] : deeds;
  const sentences = rules
    .filter(
      ({ actions, subjects }) =>
        subjects.includes(subject) &&
        (actions.includes('manage') || refused.some((action) => actions.includes(action))),
    )
    .map(({ sentence }) => sentence);
  return new ForbiddenProblem(
    `${refused.join(' or ')} ${subject}`,
    sentences.join(' ') || 'No rule allows anybody to do this.',
  );
}
