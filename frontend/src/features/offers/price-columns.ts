import type { Offer } from './requests/change-offer';

const fewestDecimals = 4;
const mostDecimals = 6;

export interface PriceColumns {
  /** Every quantity at which some offer changes its price, so that offers stand below each other. */
  quantities: number[];
  /** € a piece with the decimals that the finest price needs; empty where the offer's price does not change there. */
  words: (offer: Offer, quantity: number) => string;
}

export function priceColumns(offers: readonly Offer[]): PriceColumns {
  const breaks = offers.flatMap((offer) => offer.priceBreaks);
  const decimals = Math.max(fewestDecimals, ...breaks.map(({ unitPrice }) => decimalsOf(unitPrice)));
  return {
    quantities: [...new Set(breaks.map(({ quantity }) => quantity))].sort((first, second) => first - second),
    words: (offer, quantity) =>
      offer.priceBreaks.find((each) => each.quantity === quantity)?.unitPrice.toFixed(decimals) ?? '',
  };
}

const decimalsOf = (price: number): number =>
  price.toFixed(mostDecimals).replace(/0+$/, '').split('.')[1]?.length ?? 0;
