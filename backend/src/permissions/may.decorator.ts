import { applyDecorators, SetMetadata } from '@nestjs/common';
import { ApiBearerAuth, ApiForbiddenResponse, ApiUnauthorizedResponse } from '@nestjs/swagger';
import { ProblemDocument } from '../common/problems/problem-document';
import type { Action, Subject } from './actions-and-subjects';

export const ACCESS = 'resistry:access';

export interface Access {
  /** One of them is enough to be let in. */
  actions: readonly Action[];
  subject: Subject;
}

/**
 * What a person must be allowed to do to call this route. Where a rule has conditions, the route is open to whoever
 * might fulfil them, and the service asks again with the thing itself: `Person.demand`. The same where a route does one
 * of several deeds: it names them all, and the service demands the one.
 */
export function May(action: Action | readonly Action[], subject: Subject): MethodDecorator {
  const access: Access = { actions: typeof action === 'string' ? [action] : action, subject };
  return applyDecorators(
    SetMetadata(ACCESS, access),
    ApiBearerAuth(),
    ApiUnauthorizedResponse({ type: ProblemDocument }),
    ApiForbiddenResponse({ type: ProblemDocument }),
  );
}
