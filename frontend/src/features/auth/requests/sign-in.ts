import { useMutation } from '@tanstack/react-query';
import { client } from '../../../api/client';
import { type Session, startSession } from '../../../api/session';

export interface Credentials {
  email: string;
  password: string;
}

export async function signIn(credentials: Credentials): Promise<Session> {
  const { data } = await client.post<Session>('/auth/sign-in', credentials);
  return data;
}

export function useSignIn() {
  return useMutation({ mutationFn: signIn, onSuccess: startSession });
}
