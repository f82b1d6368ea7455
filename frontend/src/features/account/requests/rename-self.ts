import { useMutation } from '@tanstack/react-query';
import { client } from '../../../api/client';
import { sessionState, startSession } from '../../../api/session';

async function renameSelf(name: string): Promise<void> {
  await client.put('/account/name', { name });
}

/** Changes the own name; the bar at the top shows it at once. */
export function useRenameSelf() {
  return useMutation({
    mutationFn: renameSelf,
    onSuccess: (_nothing, name) => {
      const state = sessionState();
      if (state.status !== 'signed-in') return;
      startSession({ ...state.session, user: { ...state.session.user, name } });
    },
  });
}
