import type { Response } from 'express';

/** Aborted when the connection is closed before the answer was sent: nobody waits for it any more. */
export function closedSignal(response: Response): AbortSignal {
  const controller = new AbortController();
  response.once('close', () => {
    if (!response.writableFinished) controller.abort();
  });
  return controller.signal;
}
