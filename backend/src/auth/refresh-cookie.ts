import type { CookieOptions, Request, Response } from 'express';
import type { Environment } from '../config/environment';
import { REFRESH_TOKEN_SECONDS } from './sessions';

const NAME = 'resistry_refresh';

/** Scripts cannot read it, other sites cannot send it, and only the sign-in's own addresses get it. */
function options(environment: Environment): CookieOptions {
  return { httpOnly: true, sameSite: 'strict', secure: environment.servedOverTls, path: '/api/auth' };
}

export function setRefreshCookie(response: Response, environment: Environment, token: string): void {
  response.cookie(NAME, token, { ...options(environment), maxAge: REFRESH_TOKEN_SECONDS * 1000 });
}

export function clearRefreshCookie(response: Response, environment: Environment): void {
  response.clearCookie(NAME, options(environment));
}

export function refreshTokenOf(request: Request): string | undefined {
  const cookies: unknown = request.cookies;
  if (typeof cookies !== 'object' || cookies === null || !(NAME in cookies)) return undefined;
  const token = cookies[NAME];
  return typeof token === 'string' ? token : undefined;
}
