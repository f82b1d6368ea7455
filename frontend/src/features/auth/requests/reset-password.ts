import { useMutation } from '@tanstack/react-query';
import { client } from '../../../api/client';

export interface NewPassword {
  /** From the link in the mail. */
  token: string;
  password: string;
}

export async function resetPassword({ token, password }: NewPassword): Promise<void> {
  await client.post('/auth/password-resets/redeem', { token, password });
}

export function useResetPassword() {
  return useMutation({ mutationFn: resetPassword });
}
