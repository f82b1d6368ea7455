import { readFileSync } from 'node:fs';
import { join } from 'node:path';

export const ROLES = ['administrator', 'librarian', 'component-engineer', 'designer', 'purchasing'] as const;
export type Role = (typeof ROLES)[number];

interface SeedPeople {
  domain: string;
  knownPassword: string;
  people: { address: string; name: string; roles: Role[]; signsIn?: boolean }[];
}

const seed = JSON.parse(readFileSync(join(__dirname, '../../seed-data/people.json'), 'utf8')) as SeedPeople;

export interface DemonstrationPerson {
  email: string;
  password: string;
  name: string;
}

/** The demonstration's account whose first role this is. @throws Error when there is none */
export function personWith(role: Role): DemonstrationPerson {
  const person = seed.people.find(({ roles, signsIn }) => signsIn === true && roles[0] === role);
  if (person === undefined) throw new Error(`The demonstration has nobody to sign in as ${role}.`);
  return { email: `${person.address}@${seed.domain}`, password: seed.knownPassword, name: person.name };
}
