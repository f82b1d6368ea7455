import { QueryClient } from '@tanstack/react-query';
import { Problem } from './problem';

/** One more try helps against a lost connection, never against an answer. */
const retry = (failures: number, error: Error): boolean =>
  failures < 1 && error instanceof Problem && error.kind === 'unreachable';

/**
 * Whatever the browser believes of the network, a request is sent: the server may stand on this very machine, and what
 * waits in silence for a network looks like what is being done.
 */
const networkMode = 'always';

export function createQueryClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: { networkMode, retry, staleTime: 30_000, refetchOnWindowFocus: false },
      mutations: { networkMode, retry: false },
    },
  });
}
