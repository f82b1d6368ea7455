import { createParamDecorator, type ExecutionContext } from '@nestjs/common';
import type { Request } from 'express';
import type {} from 'passport';
import { UnauthenticatedProblem } from '../common/problems/problems';
import { Person } from './person';

/** The person who is signed in, as the authentication guard left it on the request. */
export function personOf(request: Request): Person | undefined {
  return request.user instanceof Person ? request.user : undefined;
}

/** Parameter of a route: the person who calls it. Only for routes with `@May`. */
export const CurrentPerson = createParamDecorator((_data: undefined, context: ExecutionContext): Person => {
  const person = personOf(context.switchToHttp().getRequest<Request>());
  if (!person) throw new UnauthenticatedProblem();
  return person;
});
