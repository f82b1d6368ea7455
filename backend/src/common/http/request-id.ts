import { randomUUID } from 'node:crypto';
import type { IncomingMessage, ServerResponse } from 'node:http';

/** Gives a request its id, which also leaves in the answer's `X-Request-Id`. What a client sends is not believed. */
export function giveRequestId(request: IncomingMessage, response: ServerResponse): string {
  const id = randomUUID();
  request.id = id;
  response.setHeader('X-Request-Id', id);
  return id;
}

/** The id of a request, as the log and the problem documents show it. */
export function requestIdOf(request: IncomingMessage): string {
  return typeof request.id === 'string' ? request.id : '';
}
