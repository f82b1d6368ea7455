import { useSyncExternalStore } from 'react';
import type { MongoAbility, RawRuleOf } from '@casl/ability';
import type { PackRule } from '@casl/ability/extra';
import type { Schema } from './schema';

export type SignedInUser = Schema<'SignedInUser'>;

/** What sign-in and refresh answer. The access token lives in memory only, so that no stored copy can be stolen. */
export interface Session {
  accessToken: string;
  user: SignedInUser;
  /** Packed by @casl/ability; see useAbility. */
  rules: PackRule<RawRuleOf<MongoAbility>>[];
}

/**
 * `expired` keeps the user, so that the page stays as it is while the person signs in again over it.
 */
export type SessionState =
  | { status: 'restoring' }
  | { status: 'signed-out' }
  | { status: 'signed-in'; session: Session }
  | { status: 'expired'; session: Session };

let state: SessionState = { status: 'restoring' };
const listeners = new Set<() => void>();

function change(next: SessionState): void {
  state = next;
  for (const listener of [...listeners]) listener();
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

export const sessionState = (): SessionState => state;

/** The token to send, or undefined where nobody is signed in. */
export const accessToken = (): string | undefined =>
  'session' in state ? state.session.accessToken : undefined;

export function startSession(session: Session): void {
  change({ status: 'signed-in', session });
}

export function endSession(): void {
  change({ status: 'signed-out' });
}

/** The sign-in has lapsed: the page stays, a dialog asks to sign in again. */
export function expireSession(): void {
  if ('session' in state) change({ status: 'expired', session: state.session });
  else change({ status: 'signed-out' });
}

/** Resolves with true once somebody is signed in again, with false if they chose to leave instead. */
export function signedInAgain(): Promise<boolean> {
  return new Promise((resolve) => {
    const look = (): void => {
      if (state.status !== 'signed-in' && state.status !== 'signed-out') return;
      unsubscribe();
      resolve(state.status === 'signed-in');
    };
    const unsubscribe = subscribe(look);
    look();
  });
}

export function useSession(): SessionState {
  return useSyncExternalStore(subscribe, sessionState);
}
