import { useMutation, useQueryClient } from '@tanstack/react-query';
import { client } from '../../../api/client';
import { endSession } from '../../../api/session';

export type SignOutScope = 'here' | 'everywhere';

export async function signOut(scope: SignOutScope): Promise<void> {
  await client.post(scope === 'here' ? '/auth/sign-out' : '/auth/sign-out-everywhere', {});
}

/** Ends the sign-in in this browser or in all of them, and forgets what was read under it. */
export function useSignOut() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: signOut,
    onSuccess: () => {
      endSession();
      queryClient.clear();
    },
  });
}
