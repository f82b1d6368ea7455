import type { SupplyStatus } from '@resistry/engineering/ratings/technology';

/** Which supply statuses follow on which. A vendor may take a word back; last-time buy follows on itself with another date. */
export const supplyTransitions: Readonly<Record<SupplyStatus, readonly SupplyStatus[]>> = {
  active: ['not-recommended', 'last-time-buy', 'discontinued'],
  'not-recommended': ['active', 'last-time-buy', 'discontinued'],
  'last-time-buy': ['active', 'not-recommended', 'last-time-buy', 'discontinued'],
  discontinued: ['active', 'not-recommended', 'last-time-buy'],
};
