import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { client } from '../../../api/client';
import type { Schema } from '../../../api/schema';

export type UndeliveredMessage = Schema<'UndeliveredMessage'>;

async function listUndelivered(signal: AbortSignal): Promise<UndeliveredMessage[]> {
  const { data } = await client.get<Schema<'UndeliveredMessages'>>('/outbox', { signal });
  return data.items;
}

const undelivered = queryOptions({
  queryKey: ['outbox'],
  queryFn: ({ signal }) => listUndelivered(signal),
  staleTime: 0,
});

export const useUndelivered = () => useQuery(undelivered);

async function retryMessage(id: string): Promise<void> {
  await client.post(`/outbox/${encodeURIComponent(id)}/retry`, {});
}

/** Tries a message once more that had been given up. */
export function useRetryMessage() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: retryMessage,
    onSettled: () => queryClient.invalidateQueries({ queryKey: undelivered.queryKey }),
  });
}
