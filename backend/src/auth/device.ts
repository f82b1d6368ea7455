import type { Request } from 'express';
import type { Device } from './sessions';

/** Where a request comes from, for the list of sessions and for slowing down guesses. */
export function deviceOf(request: Request): Device {
  return { userAgent: request.get('user-agent') ?? '', address: request.ip ?? '' };
}
