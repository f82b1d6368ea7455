import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import type { Family } from './family';
import {
  readManufacturers,
  readSuppliers,
  type SeedManufacturer,
  type SeedSupplier,
} from './reading/read-companies';
import { readCompanyPartNumbers, type SeedCompanyPartNumber } from './reading/read-company-part-numbers';
import {
  type ApprovalRule,
  readApprovalRules,
  readSupplyRules,
  type SupplyRule,
} from './reading/read-decisions';
import { readFamily } from './reading/read-family';
import { readJson } from './reading/read-json';
import { type OfferRules, readOfferRules } from './reading/read-offer-rules';
import { readPeople, type SeedPeople } from './reading/read-people';
import { readPolicy, type SeedPolicy } from './reading/read-policy';
import { SeedDataError } from './reading/seed-data-error';

/** Everything in the folder of the seed data, read and checked. */
export interface SeedData {
  readonly people: SeedPeople;
  readonly manufacturers: readonly SeedManufacturer[];
  readonly families: readonly Family[];
  readonly companyPartNumbers: readonly SeedCompanyPartNumber[];
  readonly approvalRules: readonly ApprovalRule[];
  readonly suppliers: readonly SeedSupplier[];
  readonly supplyRules: readonly SupplyRule[];
  readonly offerRules: OfferRules;
  readonly policy: SeedPolicy;
}

/**
 * @param directory folder with manufacturers.json, families/ and the rest
 * @throws SeedDataError naming the file and the field that cannot be used
 */
export function readSeedData(directory: string): SeedData {
  const from = <Result>(file: string, read: (file: string, content: unknown) => Result): Result =>
    read(file, readJson(directory, file));
  const manufacturers = from('manufacturers.json', readManufacturers);
  const families = readdirSync(join(directory, 'families'))
    .filter((name) => name.endsWith('.json'))
    .sort()
    .map((name) => {
      const file = `families/${name}`;
      const family = from(file, readFamily);
      if (!manufacturers.some(({ code }) => code === family.manufacturer)) {
        throw new SeedDataError(
          file,
          'manufacturer',
          `“${family.manufacturer}” is not in manufacturers.json`,
        );
      }
      return family;
    });
  return {
    people: from('people.json', readPeople),
    manufacturers,
    families,
    companyPartNumbers: readCompanyPartNumbers(directory, 'company-part-numbers.csv'),
    approvalRules: from('approvals.json', readApprovalRules),
    suppliers: from('suppliers.json', readSuppliers),
    supplyRules: from('supply.json', readSupplyRules),
    offerRules: from('offers.json', readOfferRules),
    policy: from('derating-policy.json', readPolicy),
  };
}
