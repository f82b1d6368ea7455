import type { Person } from '../permissions/person';
import type { Me, SignedIn } from './dto/signed-in.dto';

export function presentMe(person: Person): Me {
  const { id, email, name, roles } = person;
  return { user: { id, email, name, roles: [...roles] }, rules: person.packedRules() };
}

export function presentSignedIn(person: Person, accessToken: string): SignedIn {
  return { accessToken, user: presentMe(person).user, rules: person.packedRules() };
}
