import { clashesOfTerms, microOf, type OfferTerms } from './offer-terms';

const terms: OfferTerms = {
  supplierId: 1,
  packaging: 'T5',
  minimumOrder: 100,
  orderMultiple: 50,
  leadTimeDays: 14,
  validFrom: '2026-12-01',
  validUntil: '2027-05-31',
  priceBreaks: [
    { quantity: 100, unitPrice: 0.0092 },
    { quantity: 1000, unitPrice: 0.0069 },
  ],
};
const pointersOf = (change: Partial<OfferTerms>): string[] =>
  clashesOfTerms({ ...terms, ...change }).map(({ pointer }) => pointer);

describe('the terms of an offer', () => {
  it('hold together', () => {
    expect(pointersOf({})).toEqual([]);
    expect(pointersOf({ validUntil: terms.validFrom })).toEqual([]);
  });

  it.each<[string, Partial<OfferTerms>, string[]]>([
    ['end before they begin', { validUntil: '2026-11-30' }, ['/validFrom', '/validUntil']],
    ['have a minimum order off the multiple', { orderMultiple: 30 }, ['/minimumOrder', '/orderMultiple']],
    ['have no price at the minimum order', { minimumOrder: 50 }, ['/priceBreaks']],
    [
      'have two prices from the same quantity',
      { priceBreaks: [1, 2, 1].map((price) => ({ quantity: 100, unitPrice: price })) },
      ['/priceBreaks/1/quantity', '/priceBreaks/2/quantity'],
    ],
    [
      'have a price finer than a millionth',
      { priceBreaks: [{ quantity: 1, unitPrice: 0.0000015 }] },
      ['/priceBreaks/0/unitPrice'],
    ],
  ])('clash where they %s', (_how, change, pointers) => {
    expect(pointersOf(change)).toEqual(pointers);
  });

  it.each([
    [0.006923, 6923],
    [0.000001, 1],
    // 0.29 · 10⁶ is 290000.00000000006 in binary floating point.
    [0.29, 290_000],
    [999_999.999999, 999_999_999_999],
    [0.0069235, undefined],
  ])('price %p comes to %p millionths', (price, micro) => {
    expect(microOf(price)).toBe(micro);
  });
});
