import type { Approval, SupplyStatus } from '@resistry/engineering/ratings/technology';
import type { ApprovalTransition, SupplyTransition } from '../requests/get-transitions';

const approvalDeeds: Record<ApprovalTransition['to'], string> = {
  draft: 'Send back to draft',
  'in-review': 'Submit for review',
  approved: 'Approve',
  preferred: 'Promote to preferred',
  restricted: 'Restrict',
  withdrawn: 'Withdraw',
};

/** What a change is called where the same end is reached from elsewhere. */
const fromElsewhere: Partial<Record<`${Approval} ${ApprovalTransition['to']}`, string>> = {
  'preferred preferred': 'Keep as preferred',
  'preferred approved': 'Back to approved',
  'approved approved': 'Keep as approved',
  'restricted approved': 'Lift the restriction',
  'restricted restricted': 'Change the restriction',
  'withdrawn in-review': 'Submit for review again',
};

export const approvalDeed = (from: Approval, to: ApprovalTransition['to']): string =>
  fromElsewhere[`${from} ${to}`] ?? approvalDeeds[to];

const supplyDeeds: Record<SupplyStatus, string> = {
  active: 'Set to active',
  'not-recommended': 'Advise against new designs',
  'last-time-buy': 'Announce a last-time buy',
  discontinued: 'Set to discontinued',
};

export const supplyDeed = (from: SupplyStatus, to: SupplyStatus): string =>
  from === 'last-time-buy' && to === from ? 'Change the last order date' : supplyDeeds[to];

/** A transition as the page offers it. */
export type Offered =
  | { door: 'approval'; deed: string; transition: ApprovalTransition }
  | { door: 'supply'; deed: string; transition: SupplyTransition };
