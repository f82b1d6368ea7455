import { useMutation } from '@tanstack/react-query';
import { client } from '../../../api/client';

/** Asks for a mail with a link. The answer is the same whether the address is known or not. */
export async function requestPasswordReset(email: string): Promise<void> {
  await client.post('/auth/password-resets', { email });
}

export function useRequestPasswordReset() {
  return useMutation({ mutationFn: requestPasswordReset });
}
