import { useMutation, useQueryClient } from '@tanstack/react-query';
import { client } from '../../../api/client';
import type { Schema } from '../../../api/schema';

async function changePassword(passwords: Schema<'OwnPassword'>): Promise<void> {
  await client.post('/account/password', passwords);
}

/** Changes the own password; every other sign-in of the person ends with it. */
export function useChangePassword() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: changePassword,
    onSuccess: () => queryClient.invalidateQueries({ queryKey: ['account', 'sessions'] }),
  });
}
