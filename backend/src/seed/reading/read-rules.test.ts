import { join } from 'node:path';
import { REPOSITORY_ROOT } from '../../config/environment';
import { readManufacturers, readSuppliers } from './read-companies';
import { readJson } from './read-json';
import { readOfferRules } from './read-offer-rules';
import { readPeople } from './read-people';
import { readPolicy } from './read-policy';

type Plain = Record<string, unknown>;
const directory = join(REPOSITORY_ROOT, 'seed-data');

/** A file of the demonstration with one value changed. */
function changed(file: string, path: string, value: unknown): unknown {
  const content = readJson(directory, file) as Plain;
  const names = path.split('/');
  const last = names.pop() ?? '';
  let inner = content;
  for (const name of names) inner = inner[name] as Plain;
  inner[last] = value;
  return content;
}

describe('the other files of the seed data', () => {
  it.each([
    [
      readPeople,
      'people.json',
      'people/0/roles',
      ['cook'],
      'people[0].roles: “cook” is not one of administrator',
    ],
    [readPeople, 'people.json', 'people/0/joined', 'once', 'people[0].joined: must be a day'],
    [readPeople, 'people.json', 'people/0/signsIn', 'yes', 'people[0].signsIn: must be true or false'],
    [
      readManufacturers,
      'manufacturers.json',
      'manufacturers/0/code',
      7,
      'manufacturers[0].code: must be a text',
    ],
    [
      readSuppliers,
      'suppliers.json',
      'suppliers/1/leadTimeDays',
      [9, 3],
      'suppliers[1].leadTimeDays: must be two',
    ],
    [readSuppliers, 'suppliers.json', 'suppliers/1/share', 0, 'suppliers[1].share: must be a whole number'],
    [
      readOfferRules,
      'offers.json',
      'prices/BRIM/ladders',
      ['rope'],
      'prices.BRIM.ladders: “rope” is not described',
    ],
    [
      readOfferRules,
      'offers.json',
      'prices/BRIM/sizes/0603',
      0,
      'prices.BRIM.sizes.0603: must be a number from',
    ],
    [readOfferRules, 'offers.json', 'spread', 2, 'offers.json, spread: must be a number from 0 to 0.5'],
    [
      readPolicy,
      'derating-policy.json',
      'versions/0/entries/0/powerRatio',
      2,
      'entries[0].powerRatio: must be a',
    ],
    [
      readPolicy,
      'derating-policy.json',
      'versions/0/entries/0/reading',
      'both',
      'entries[0].reading: must be one',
    ],
    [
      readPolicy,
      'derating-policy.json',
      'versions/0/published/by',
      'engineer',
      'versions[0].published.by: nobody',
    ],
    [
      readPolicy,
      'derating-policy.json',
      'versions/0/entries/0/match/colour',
      'red',
      'match.colour: is not a known',
    ],
  ] as [(file: string, content: unknown) => unknown, string, string, unknown, string][])(
    '%p refuses %s with %s = %j',
    (read, file, path, value, words) => {
      expect(() => read(file, changed(file, path, value))).toThrow(words);
      expect(() => read(file, changed(file, path, value))).toThrow(file);
    },
  );

  it('says which file is missing', () => {
    expect(() => readJson(directory, 'families/none.json')).toThrow(
      'families/none.json, the whole file: cannot be read',
    );
  });
});
