import { type CanActivate, type ExecutionContext, Injectable } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import type { Request } from 'express';
import { ForbiddenProblem, UnauthenticatedProblem } from '../common/problems/problems';
import { personOf } from './current-person.decorator';
import { refusalOf } from './refusal';
import { routeAccessOf } from './route-access';

/** Applies the rules to every route. It runs after the authentication guard has put the person on the request. */
@Injectable()
export class PermissionGuard implements CanActivate {
  constructor(private readonly reflector: Reflector) {}

  canActivate(context: ExecutionContext): boolean {
    const access = routeAccessOf(this.reflector, context.getHandler());
    if (access.kind === 'public') return true;
    if (access.kind === 'closed') {
      const route = `${context.getClass().name}.${context.getHandler().name}`;
      throw new ForbiddenProblem(
        `closed ${route}`,
        'This address has no rule yet, so it is closed to everybody.',
      );
    }
    const person = personOf(context.switchToHttp().getRequest<Request>());
    if (!person) throw new UnauthenticatedProblem();
    const { actions, subject } = access;
    if (!actions.some((action) => person.mightDo(action, subject))) throw refusalOf(actions, subject);
    return true;
  }
}
