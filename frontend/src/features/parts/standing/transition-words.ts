import type { Approval, SupplyStatus } from '@resistry/engineering/ratings/technology';
import { supplyWords } from '../../../wording/standing-words';
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

export const supplyDeed = (to: SupplyStatus): string =>
  to === 'last-time-buy' ? 'Announce a last-time buy' : `Set to ${supplyWords[to].toLowerCase()}`;

/** A transition as the page offers it. */
export type Offered =
  | { door: 'approval'; deed: string; transition: ApprovalTransition }
  | { door: 'supply'; deed: string; transition: SupplyTransition };
