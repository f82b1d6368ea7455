import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { client } from '../../../api/client';
import type { Schema } from '../../../api/schema';

export type Invitation = Schema<'InvitationDetails'>;

async function listInvitations(signal: AbortSignal): Promise<Invitation[]> {
  const { data } = await client.get<Schema<'InvitationList'>>('/invitations', { signal });
  return data.items;
}

const invitationList = queryOptions({
  queryKey: ['invitations'],
  queryFn: ({ signal }) => listInvitations(signal),
});

export const useInvitations = () => useQuery(invitationList);

async function invite(invitation: Schema<'NewInvitation'>): Promise<void> {
  await client.post('/invitations', invitation);
}

async function withdrawInvitation(id: string): Promise<void> {
  await client.delete(`/invitations/${encodeURIComponent(id)}`);
}

/** Sends somebody a way in by mail. */
export function useInvite() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: invite,
    onSuccess: () => queryClient.invalidateQueries({ queryKey: invitationList.queryKey }),
  });
}

/** Takes an invitation back; its link leads nowhere from then on. */
export function useWithdrawInvitation() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: withdrawInvitation,
    onSettled: () => queryClient.invalidateQueries({ queryKey: invitationList.queryKey }),
  });
}
