import { useMutation, useQueryClient } from '@tanstack/react-query';
import { client } from '../../../api/client';
import type { Schema } from '../../../api/schema';

/** A change of an account; `version` is the one that was seen, so that nobody overwrites what he or she did not see. */
export type UserChange =
  | { id: number; change: 'roles'; body: Schema<'NewRoles'> }
  | { id: number; change: 'deactivate' | 'reactivate'; body: Schema<'ReasonedChange'> };

async function changeUser({ id, change, body }: UserChange): Promise<void> {
  if (change === 'roles') await client.put(`/users/${id}/roles`, body);
  else await client.post(`/users/${id}/${change}`, body);
}

/** Roles, keeping out and letting back in; the list is read again whatever came of it. */
export function useChangeUser() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: changeUser,
    onSettled: () => queryClient.invalidateQueries({ queryKey: ['users'] }),
  });
}
