import { randomUUID } from 'node:crypto';
import type { IncomingMessage } from 'node:http';
import type { RequestHandler } from 'express';

/** Gives a request its id, which also leaves in the answer's `X-Request-Id`. What a client sends is not believed. */
export const giveRequestId: RequestHandler = (request, response, next) => {
  request.id = randomUUID();
  response.setHeader('X-Request-Id', request.id);
  next();
};

/** The id of a request, as the log and the problem documents show it. */
export function requestIdOf(request: IncomingMessage): string {
  return typeof request.id === 'string' ? request.id : '';
}
