import type { Approval, SupplyStatus } from '@resistry/engineering/ratings/technology';
import { draw, drawWeighted, drawWhole } from './draw';
import { currentRevision, type Columns } from './family';
import type { PlacedPart } from './family-rows';
import type { IdSequences } from './id-sequences';
import { dayAfter, momentOf } from './moments';
import type { SeedSupplier } from './reading/read-companies';
import type { FamilyPrices, OfferRules, OfferShare, PriceLadder } from './reading/read-offer-rules';
import type { Roster } from './roster';

export interface OfferedPart {
  readonly part: PlacedPart;
  readonly approval: Approval;
  readonly supply: SupplyStatus;
}

export interface OfferContext {
  readonly rules: OfferRules;
  readonly suppliers: readonly SeedSupplier[];
  readonly supplierIds: ReadonlyMap<string, number>;
  readonly roster: Roster;
  readonly ids: IdSequences;
  /** Day of the load: validity counts from it, so that the demonstration works on any day. */
  readonly today: string;
}

export interface OfferRows {
  readonly offers: Columns[];
  readonly breaks: Columns[];
}

type Validity = 'in force' | 'expired' | 'future';

/** The offers of suppliers for the parts, drawn by the rules; a preferred part always has one in force that sells 1000. */
export function offerRows(parts: readonly OfferedPart[], context: OfferContext): OfferRows {
  const rows: OfferRows = { offers: [], breaks: [] };
  for (const offered of parts) {
    const share = shareOf(context.rules, offered.approval);
    const key = offered.part.manufacturerPartNumber;
    if (draw(`${key}/offered`) >= share.share) continue;
    const count = drawWhole(`${key}/offers`, ...share.offers);
    const suppliers = suppliersFor(key, count, context.suppliers);
    for (const [place, supplier] of suppliers.entries()) {
      const safe = offered.approval === 'preferred' && place === 0;
      addOffer(rows, offered, supplier, safe, context);
    }
  }
  return rows;
}

function shareOf(rules: OfferRules, approval: Approval): OfferShare {
  if (approval === 'preferred') return rules.standings.preferred;
  return approval === 'approved' || approval === 'restricted'
    ? rules.standings.approved
    : rules.standings.others;
}

function suppliersFor(key: string, count: number, suppliers: readonly SeedSupplier[]): SeedSupplier[] {
  const chosen: SeedSupplier[] = [];
  while (chosen.length < Math.min(count, suppliers.length)) {
    const left = suppliers.filter((supplier) => !chosen.includes(supplier));
    chosen.push(drawWeighted(`${key}/supplier ${chosen.length}`, left, (supplier) => supplier.share));
  }
  return chosen;
}

function addOffer(
  rows: OfferRows,
  { part, supply }: OfferedPart,
  supplier: SeedSupplier,
  safe: boolean,
  context: OfferContext,
): void {
  const { rules, ids, roster, today } = context;
  const key = `${part.manufacturerPartNumber}/${supplier.code}`;
  const prices = rules.prices.get(part.family.code);
  if (!prices) throw new RangeError(`offers.json has no prices for ${part.family.code}`);
  const packagings = currentRevision(part.family).packagings.filter(({ sizes }) => sizes.includes(part.size));
  const packaging = packagings[drawWhole(`${key}/packaging`, 0, packagings.length - 1)];
  if (!packaging) throw new RangeError(`${part.family.code} ${part.size} has no packaging`);
  const ladder = ladderFor(key, prices, rules, safe);
  const unit = ladder.wholePackages ? packaging.quantity : 1;
  const id = ids.next('offers');
  const [from, until] = validityOf(
    key,
    supply === 'discontinued' ? 'expired' : stateOf(key, rules, safe),
    context,
  );
  rows.offers.push({
    id,
    part_id: part.id,
    supplier_id: context.supplierIds.get(supplier.code) ?? NaN,
    packaging_code: packaging.code,
    minimum_order: ladder.minimumOrder * unit,
    order_multiple: ladder.orderMultiple * unit,
    lead_time_days: drawWhole(`${key}/lead time`, ...supplier.leadTimeDays),
    valid_from: from,
    valid_until: until,
    entered_by: roster.idOf(rules.enteredBy[drawWhole(`${key}/by`, 0, rules.enteredBy.length - 1)] ?? ''),
    entered_at: momentOf(from < today ? from : today, 8),
  });
  const price = priceAtThousand(part, prices) * (1 + rules.spread * (2 * draw(`${key}/price`) - 1));
  for (const [quantity, factor] of ladder.breaks) {
    rows.breaks.push({
      offer_id: id,
      quantity: quantity * unit,
      unit_price_micro: Math.max(1, Math.round(price * factor * 1e6)),
    });
  }
}

/** A preferred part's first offer sells pieces, so that there is a price at 1000 whatever the package holds. */
function ladderFor(key: string, prices: FamilyPrices, rules: OfferRules, safe: boolean): PriceLadder {
  const ladders = prices.ladders.flatMap((name) => rules.ladders.get(name) ?? []);
  const possible = safe ? ladders.filter((ladder) => !ladder.wholePackages) : ladders;
  const ladder = possible[drawWhole(`${key}/ladder`, 0, possible.length - 1)];
  if (!ladder) throw new RangeError('offers.json: a family needs a ladder that sells pieces');
  return ladder;
}

function priceAtThousand(part: PlacedPart, prices: FamilyPrices): number {
  const price = prices.sizes.get(part.size);
  if (price === undefined)
    throw new RangeError(`offers.json has no price for ${part.family.code} ${part.size}`);
  const factor = prices.toleranceFactors.find(([tolerance]) => tolerance === part.tolerance)?.[1] ?? 1;
  return price * factor;
}

function stateOf(key: string, rules: OfferRules, safe: boolean): Validity {
  if (safe) return 'in force';
  const lot = draw(`${key}/validity`);
  if (lot < rules.validity.expiredShare) return 'expired';
  return lot < rules.validity.expiredShare + rules.validity.futureShare ? 'future' : 'in force';
}

function validityOf(
  key: string,
  state: Validity,
  { rules, today }: OfferContext,
): [from: string, until: string] {
  const before = drawWhole(`${key}/before`, ...rules.validity.daysBefore);
  const after = drawWhole(`${key}/after`, ...rules.validity.daysAfter);
  if (state === 'expired') return [dayAfter(today, -before - after), dayAfter(today, -before)];
  if (state === 'future') return [dayAfter(today, before), dayAfter(today, before + after)];
  return [dayAfter(today, -before), dayAfter(today, after)];
}
