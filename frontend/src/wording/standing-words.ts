import type { Schema } from '../api/schema';
import type { Approval, SupplyStatus } from '@resistry/engineering/ratings/technology';

export const approvalWords: Record<Approval, string> = {
  draft: 'Draft',
  'in-review': 'In review',
  approved: 'Approved',
  preferred: 'Preferred',
  restricted: 'Restricted',
  withdrawn: 'Withdrawn',
};

export const supplyWords: Record<SupplyStatus, string> = {
  active: 'Active',
  'not-recommended': 'Not for new designs',
  'last-time-buy': 'Last-time buy',
  discontinued: 'Discontinued',
};

/** Why a part is looked at. */
export const reviewWords: Record<Schema<'OpenReviewDto'>['cause'], string> = {
  submitted: 'Submitted',
  'left-active-supply': 'Left active supply',
  'lost-second-source': 'Lost its second source',
};
