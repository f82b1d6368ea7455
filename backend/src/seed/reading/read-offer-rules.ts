import { Fields } from './fields';
import { readSpan } from './read-companies';

/** How a supplier sells: factors on the family's price at 1000 pieces, by quantity. */
export interface PriceLadder {
  /** Whole packages only: minimum, multiple and breaks count packages. */
  readonly wholePackages: boolean;
  readonly minimumOrder: number;
  readonly orderMultiple: number;
  readonly breaks: readonly (readonly [quantity: number, factor: number])[];
}

/** How many parts of a standing are offered, and how often. */
export interface OfferShare {
  /** Fraction of the parts that have offers at all. */
  readonly share: number;
  readonly offers: readonly [least: number, most: number];
}

export interface FamilyPrices {
  readonly ladders: readonly string[];
  /** Size → EUR apiece at 1000 pieces. */
  readonly sizes: ReadonlyMap<string, number>;
  /** Tolerance as written in the file (fraction) → factor; others 1. */
  readonly toleranceFactors: readonly (readonly [tolerance: number, factor: number])[];
}

export interface OfferRules {
  readonly enteredBy: readonly string[];
  readonly standings: Readonly<Record<'preferred' | 'approved' | 'others', OfferShare>>;
  readonly validity: {
    readonly expiredShare: number;
    readonly futureShare: number;
    readonly daysBefore: readonly [number, number];
    readonly daysAfter: readonly [number, number];
  };
  /** Largest deviation of a supplier's price from the family's, fraction. */
  readonly spread: number;
  readonly ladders: ReadonlyMap<string, PriceLadder>;
  readonly prices: ReadonlyMap<string, FamilyPrices>;
}

export function readOfferRules(file: string, content: unknown): OfferRules {
  return Fields.read(file, '', content, (fields) => {
    const ladders = fields.entries('ladders', (_, inner) => readLadder(inner));
    return {
      enteredBy: fields.texts('enteredBy'),
      standings: fields.one('standings', (inner) => ({
        preferred: inner.one('preferred', readShare),
        approved: inner.one('approved', readShare),
        others: inner.one('others', readShare),
      })),
      validity: fields.one('validity', (inner) => ({
        expiredShare: inner.number('expiredShare', 0, 1),
        futureShare: inner.number('futureShare', 0, 1),
        daysBefore: readSpan(inner, 'daysBefore'),
        daysAfter: readSpan(inner, 'daysAfter'),
      })),
      spread: fields.number('spread', 0, 0.5),
      ladders,
      prices: fields.entries('prices', (_, inner) => readPrices(inner, ladders)),
    };
  });
}

function readShare(fields: Fields): OfferShare {
  return { share: fields.number('share', 0, 1), offers: readSpan(fields, 'offers') };
}

function readLadder(fields: Fields): PriceLadder {
  return {
    wholePackages: fields.boolean('wholePackages'),
    minimumOrder: fields.whole('minimumOrder', 1),
    orderMultiple: fields.whole('orderMultiple', 1),
    breaks: fields.list(
      'breaks',
      (inner) => [inner.whole('from', 1), inner.number('factor', 0.01, 100)] as const,
    ),
  };
}

function readPrices(fields: Fields, ladders: ReadonlyMap<string, PriceLadder>): FamilyPrices {
  const named = fields.texts('ladders');
  const stranger = named.find((name) => !ladders.has(name));
  if (stranger !== undefined) throw fields.refusal('ladders', `“${stranger}” is not described`);
  return {
    ladders: named,
    sizes: fields.one(
      'sizes',
      (inner) => new Map(inner.names().map((size) => [size, inner.number(size, 1e-5, 1e4)])),
    ),
    toleranceFactors:
      fields.optional('toleranceFactors', () =>
        fields.list(
          'toleranceFactors',
          (inner) => [inner.quantity('tolerance', 'tolerance'), inner.number('factor', 0.1, 100)] as const,
        ),
      ) ?? [],
  };
}
