import { type MongoAbility, type RawRuleOf, createMongoAbility } from '@casl/ability';
import { unpackRules } from '@casl/ability/extra';
import { useMemo } from 'react';
import { type SignedInUser, useSession } from './session';

/** What the signed-in person may do, by the rules that came with the sign-in. Nobody signed in: nothing. */
export function useAbility(): MongoAbility {
  const state = useSession();
  const rules = 'session' in state ? state.session.rules : undefined;
  return useMemo(() => createMongoAbility(unpackRules<RawRuleOf<MongoAbility>>(rules ?? [])), [rules]);
}

export function useUser(): SignedInUser | undefined {
  const state = useSession();
  return 'session' in state ? state.session.user : undefined;
}
