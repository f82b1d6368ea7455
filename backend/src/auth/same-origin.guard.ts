import { type CanActivate, type ExecutionContext, Injectable } from '@nestjs/common';
import type { Request } from 'express';
import { ForbiddenProblem } from '../common/problems/problems';
import { Environment } from '../config/environment';

/**
 * Keeps other sites' pages from using the refresh cookie, also in browsers that do not know SameSite. Programs that
 * are no browser send neither header and carry no other person's cookie.
 */
@Injectable()
export class SameOriginGuard implements CanActivate {
  constructor(private readonly environment: Environment) {}

  canActivate(context: ExecutionContext): boolean {
    const request = context.switchToHttp().getRequest<Request>();
    const site = request.get('sec-fetch-site');
    const origin = request.get('origin');
    const foreignSite = site !== undefined && !['same-origin', 'none'].includes(site);
    if (foreignSite || (origin !== undefined && !this.isOurs(origin, request))) {
      throw new ForbiddenProblem(
        'same-origin',
        'Signing in and out works from the pages of this application only.',
      );
    }
    return true;
  }

  private isOurs(origin: string, request: Request): boolean {
    if (origin === this.environment.givenAppUrl) return true;
    return URL.canParse(origin) && new URL(origin).host === request.get('host');
  }
}
