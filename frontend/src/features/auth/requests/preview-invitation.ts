import { queryOptions, useQuery } from '@tanstack/react-query';
import { client } from '../../../api/client';
import type { Schema } from '../../../api/schema';

/** Whom an invitation is for; a POST, so that the token stands in no address. */
export async function previewInvitation(
  token: string,
  signal?: AbortSignal,
): Promise<Schema<'InvitationPreview'>> {
  const { data } = await client.post<Schema<'InvitationPreview'>>(
    '/invitations/preview',
    { token },
    { signal },
  );
  return data;
}

export const invitationPreview = (token: string) =>
  queryOptions({
    queryKey: ['invitations', 'preview', token],
    queryFn: ({ signal }) => previewInvitation(token, signal),
    staleTime: Infinity,
    enabled: token !== '',
  });

export const useInvitationPreview = (token: string) => useQuery(invitationPreview(token));
