import { readFileSync } from 'node:fs';
import { inRepository } from './repository.mjs';

/** The demonstration's accounts one may sign in with, as lines to print: read from the seed data that makes them. */
export function accountLines() {
  const { domain, knownPassword, people } = JSON.parse(
    readFileSync(inRepository('seed-data/people.json'), 'utf8'),
  );
  const accounts = people.filter((person) => person.signsIn);
  const lines = accounts.map(
    ({ address, roles }) => `  ${`${address}@${domain}`.padEnd(40)} ${roles.join(', ')}`,
  );
  return ['Demonstration accounts:', ...lines, `Password of each: ${knownPassword}`];
}
