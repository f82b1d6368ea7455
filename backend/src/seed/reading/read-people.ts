import { type Role, ROLES } from '../../permissions/roles';
import { Fields } from './fields';

export interface SeedPerson {
  /** Local part of the address. */
  readonly address: string;
  readonly name: string;
  readonly roles: readonly Role[];
  /** First day at the company. */
  readonly joined: string;
  /** Last day, of somebody who left. */
  readonly left: string | null;
  /** Whether the demonstration's password opens the account; others have one that nobody knows. */
  readonly signsIn: boolean;
}

export interface SeedPeople {
  readonly domain: string;
  readonly knownPassword: string;
  readonly people: readonly SeedPerson[];
}

export function readPeople(file: string, content: unknown): SeedPeople {
  return Fields.read(file, '', content, (fields) => ({
    domain: fields.text('domain'),
    knownPassword: fields.text('knownPassword'),
    people: fields.list('people', (inner) => ({
      address: inner.text('address'),
      name: inner.text('name'),
      roles: inner.texts('roles').map((text) => {
        const role = ROLES.find((candidate) => candidate === text);
        if (role === undefined) throw inner.refusal('roles', `“${text}” is not one of ${ROLES.join(', ')}`);
        return role;
      }),
      joined: inner.day('joined'),
      left: inner.optional('left', () => inner.day('left')) ?? null,
      signsIn: inner.optional('signsIn', () => inner.boolean('signsIn')) ?? false,
    })),
  }));
}
