import { useMutation } from '@tanstack/react-query';
import { client } from '../../../api/client';

export interface Acceptance {
  /** From the link in the mail. */
  token: string;
  name: string;
  password: string;
}

export async function acceptInvitation(acceptance: Acceptance): Promise<void> {
  await client.post('/invitations/accept', acceptance);
}

export function useAcceptInvitation() {
  return useMutation({ mutationFn: acceptInvitation });
}
