import { type ExecutionContext, Injectable } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { AuthGuard } from '@nestjs/passport';
import { UnauthenticatedProblem } from '../common/problems/problems';
import { routeAccessOf } from '../permissions/route-access';

/** Finds out who asks, on every route that has a rule. What that person may do is the permission guard's question. */
@Injectable()
export class AuthenticationGuard extends AuthGuard('access-token') {
  constructor(private readonly reflector: Reflector) {
    super();
  }

  override async canActivate(context: ExecutionContext): Promise<boolean> {
    if (routeAccessOf(this.reflector, context.getHandler()).kind !== 'ruled') return true;
    return (await super.canActivate(context)) === true;
  }

  override handleRequest<Found>(error: unknown, found: Found | false): Found {
    if (error instanceof Error) throw error;
    if (!found) throw new UnauthenticatedProblem();
    return found;
  }
}
