import type { Transaction } from 'sequelize';
import type { Writer } from '../database/writer';
import { rebuildDerivedColumns } from '../parts/derived-columns';
import { decide } from './decide';
import { familyRows } from './family-rows';
import { IdSequences } from './id-sequences';
import { insertAudit } from './insert-audit';
import { insertCompanyPartNumbers } from './insert-company-part-numbers';
import { insertFamilies } from './insert-families';
import { insertPolicy } from './insert-policy';
import { insertRows } from './insert-rows';
import { insertStanding } from './insert-standing';
import { momentOf } from './moments';
import { offerRows } from './offer-rows';
import { PartIndex } from './reading/read-selection';
import { SeedDataError } from './reading/seed-data-error';
import type { Roster } from './roster';
import type { SeedData } from './seed-data';
import { standingRows } from './standing-rows';

export interface LoadContext {
  readonly writer: Writer;
  readonly roster: Roster;
  /** Day of the load, as 2026-12-01. */
  readonly today: string;
  /** Told before each stage: `families`, `offers` … */
  readonly progress: (stage: string) => void;
}

/** Writes the whole demonstration into an empty catalogue, in the transaction given. The people are there already. */
export async function loadSeedData(
  data: SeedData,
  transaction: Transaction,
  context: LoadContext,
): Promise<void> {
  const { writer, roster, today, progress } = context;
  const ids = await IdSequences.after(writer, transaction);

  progress('manufacturers and families');
  const manufacturerIds = new Map(data.manufacturers.map(({ code }) => [code, ids.next('manufacturers')]));
  const manufacturers = data.manufacturers.map(({ code, name, country, note, entered }) => ({
    id: manufacturerIds.get(code) ?? NaN,
    code,
    name,
    country,
    note,
    entered_by: roster.didAs('librarian', entered),
    entered_at: momentOf(entered.on, 8),
  }));
  await insertRows(writer, transaction, 'manufacturers', manufacturers);
  const families = data.families.map((family) => {
    checkEntry(family.code, () => {
      roster.didAs('librarian', family.entered);
      for (const revision of family.revisions) roster.didAs('librarian', revision.entered);
    });
    return familyRows(family, {
      manufacturerId: manufacturerIds.get(family.manufacturer) ?? NaN,
      personId: roster.idOf,
      ids,
    });
  });
  await insertFamilies(writer, transaction, families);

  progress('company part numbers, approvals and supply');
  const parts = families.flatMap((family) => family.parts);
  const index = new PartIndex(parts);
  await insertCompanyPartNumbers(writer, transaction, data.companyPartNumbers, { index, roster, ids });
  const histories = decide(data, index, roster);
  await insertStanding(writer, transaction, standingRows(histories.values()));

  progress('offers');
  const supplierIds = new Map(data.suppliers.map(({ code }) => [code, ids.next('suppliers')]));
  await insertRows(
    writer,
    transaction,
    'suppliers',
    data.suppliers.map(({ code, name }) => ({ id: supplierIds.get(code) ?? NaN, code, name })),
  );
  const offered = parts.map((part) => {
    const history = histories.get(part.id);
    return {
      part,
      approval: history?.approval.at(-1)?.to ?? ('draft' as const),
      supply: history?.supply.at(-1)?.to ?? ('active' as const),
    };
  });
  const offers = offerRows(offered, {
    rules: data.offerRules,
    suppliers: data.suppliers,
    supplierIds,
    roster,
    ids,
    today,
  });
  await insertRows(writer, transaction, 'offers', offers.offers);
  await insertRows(writer, transaction, 'offer_price_breaks', offers.breaks);

  progress('derating policy and audit trail');
  await insertPolicy(writer, transaction, data.policy, { roster, ids });
  await insertAudit(writer, transaction);

  progress('derived columns and text index');
  await rebuildDerivedColumns(writer, transaction, 'all', today);
}

function checkEntry(familyCode: string, check: () => void): void {
  try {
    check();
  } catch (error) {
    const words = error instanceof Error ? error.message : 'unknown';
    throw new SeedDataError(`families/${familyCode.toLowerCase()}.json`, 'entered', words);
  }
}
