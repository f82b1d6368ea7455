import type { RawRuleOf, MongoAbility } from '@casl/ability';
import { packRules } from '@casl/ability/extra';
import type { Session, SignedInUser } from '../api/session';

/** A sign-in of an invented person with these roles and rules. */
export function sessionOf(
  roles: SignedInUser['roles'] = ['designer'],
  rules: RawRuleOf<MongoAbility>[] = [],
  accessToken = 'token',
): Session {
  const user = { id: 1, name: 'I. Tamsin', email: 'designer@brackwater.example.com', roles };
  return { accessToken, user, rules: packRules(rules) };
}
