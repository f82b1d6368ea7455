import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { client } from '../../../api/client';
import type { Schema } from '../../../api/schema';

export type OwnSession = Schema<'OwnSession'>;

async function listOwnSessions(signal: AbortSignal): Promise<OwnSession[]> {
  const { data } = await client.get<Schema<'OwnSessions'>>('/account/sessions', { signal });
  return data.items;
}

const ownSessions = queryOptions({
  queryKey: ['account', 'sessions'],
  queryFn: ({ signal }) => listOwnSessions(signal),
});

export const useOwnSessions = () => useQuery(ownSessions);

async function endOwnSession(id: string): Promise<void> {
  await client.delete(`/account/sessions/${encodeURIComponent(id)}`);
}

/** Signs one of the own browsers out. */
export function useEndOwnSession() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: endOwnSession,
    onSettled: () => queryClient.invalidateQueries({ queryKey: ownSessions.queryKey }),
  });
}
