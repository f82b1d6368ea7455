import { DutyConflict } from '@resistry/engineering/duty/duty-conflict';
import type { Duty } from '@resistry/engineering/duty/duty';
import { requirementOf, type Requirement } from '@resistry/engineering/duty/requirement';
import { ClashProblem } from '../common/problems/problems';

/**
 * The requirement of a duty that came in as a field of a request.
 * @throws ClashProblem (422) naming every field that clashes
 */
export function requirementOfDuty(duty: Duty): Requirement {
  try {
    return requirementOf(duty);
  } catch (error) {
    if (!(error instanceof DutyConflict)) throw error;
    throw new ClashProblem(
      error.message,
      error.conflicts.flatMap(({ pointers, message }) =>
        pointers.map((pointer) => ({ pointer: `/duty${pointer}`, message })),
      ),
    );
  }
}
