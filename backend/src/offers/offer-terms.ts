import type { FieldError } from '../common/problems/problem';

/** Money is kept in millionths of the currency. */
const MICRO = 1e6;

export interface PriceBreak {
  /** From so many pieces */
  quantity: number;
  /** EUR a piece */
  unitPrice: number;
}

/** What a supplier offers: pieces, days (ISO 8601) and EUR. */
export interface OfferTerms {
  supplierId: number;
  packaging: string;
  minimumOrder: number;
  orderMultiple: number;
  leadTimeDays: number;
  validFrom: string;
  validUntil: string;
  priceBreaks: readonly PriceBreak[];
}

/** A price in millionths, or undefined where it is no whole number of them. */
export function microOf(unitPrice: number): number | undefined {
  const micro = Math.round(unitPrice * MICRO);
  return Math.abs(unitPrice * MICRO - micro) < 1e-3 ? micro : undefined;
}

/** Terms that contradict each other, field by field. */
export function clashesOfTerms(terms: OfferTerms): FieldError[] {
  return [...clashesOfDays(terms), ...clashesOfOrder(terms), ...clashesOfPrices(terms)];
}

function clashesOfDays({ validFrom, validUntil }: OfferTerms): FieldError[] {
  if (validFrom <= validUntil) return [];
  return [
    { pointer: '/validFrom', message: `The first day ${validFrom} comes after the last, ${validUntil}.` },
    { pointer: '/validUntil', message: `The last day ${validUntil} comes before the first, ${validFrom}.` },
  ];
}

function clashesOfOrder({ minimumOrder, orderMultiple, priceBreaks }: OfferTerms): FieldError[] {
  const lowest = Math.min(...priceBreaks.map(({ quantity }) => quantity));
  const multiple = `The minimum order of ${minimumOrder} is no multiple of ${orderMultiple}.`;
  return [
    ...(minimumOrder % orderMultiple === 0
      ? []
      : [
          { pointer: '/minimumOrder', message: multiple },
          { pointer: '/orderMultiple', message: multiple },
        ]),
    ...(lowest <= minimumOrder
      ? []
      : [
          {
            pointer: '/priceBreaks',
            message: `The prices begin at ${lowest} pieces, so that the minimum order of ${minimumOrder} has none.`,
          },
        ]),
  ];
}

function clashesOfPrices({ priceBreaks }: OfferTerms): FieldError[] {
  return priceBreaks.flatMap(({ quantity, unitPrice }, at) => [
    ...(priceBreaks.findIndex((other) => other.quantity === quantity) < at
      ? [
          {
            pointer: `/priceBreaks/${at}/quantity`,
            message: `There is a price from ${quantity} pieces already.`,
          },
        ]
      : []),
    ...(microOf(unitPrice) === undefined
      ? [{ pointer: `/priceBreaks/${at}/unitPrice`, message: 'A price has at most six decimals.' }]
      : []),
  ]);
}
