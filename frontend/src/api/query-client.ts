import { QueryClient } from '@tanstack/react-query';
import { Problem } from './problem';

/** One more try helps against a lost connection, never against an answer. */
const retry = (failures: number, error: Error): boolean =>
  failures < 1 && error instanceof Problem && error.kind === 'unreachable';

export function createQueryClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: { retry, staleTime: 30_000, refetchOnWindowFocus: false },
      mutations: { retry: false },
    },
  });
}
