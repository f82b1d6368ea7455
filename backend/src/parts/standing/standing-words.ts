import type { Approval, SupplyStatus } from '@resistry/engineering/ratings/technology';

/** As they stand within a sentence of a letter, a review or a refusal. */
export const approvalWords: Readonly<Record<Approval, string>> = {
  draft: 'a draft',
  'in-review': 'in review',
  approved: 'approved',
  preferred: 'preferred',
  restricted: 'restricted',
  withdrawn: 'withdrawn',
};

export const supplyWords: Readonly<Record<SupplyStatus, string>> = {
  active: 'active',
  'not-recommended': 'not recommended for new designs',
  'last-time-buy': 'a last-time buy',
  discontinued: 'discontinued',
};
