import type { Approval } from '@resistry/engineering/ratings/technology';
import type { Action } from '../../permissions/actions-and-subjects';

/** Which approvals follow on which. Restricted follows on itself: its words can change. */
const approvalTransitions: Readonly<Record<Approval, readonly Approval[]>> = {
  draft: ['in-review', 'approved', 'restricted', 'withdrawn'],
  'in-review': ['approved', 'restricted', 'withdrawn', 'draft'],
  approved: ['preferred', 'restricted', 'withdrawn'],
  preferred: ['approved', 'restricted', 'withdrawn'],
  restricted: ['approved', 'restricted', 'withdrawn'],
  withdrawn: ['in-review'],
};

/** What the part can be made from where it stands. While a review of it is open, that it stays what it is is a decision too. */
export function reachableApprovals(part: { approval: Approval; open_reviews: number }): readonly Approval[] {
  const { approval, open_reviews: openReviews } = part;
  const confirmed = openReviews > 0 && (approval === 'approved' || approval === 'preferred');
  return [...(confirmed ? [approval] : []), ...approvalTransitions[approval]];
}

/** The deed by which a part becomes this, in the words of the permissions. */
export const approvalActions: Readonly<Record<Approval, Action>> = {
  draft: 'return',
  'in-review': 'submit',
  approved: 'approve',
  preferred: 'promote',
  restricted: 'restrict',
  withdrawn: 'withdraw',
};

/** Approvals under which a part is in use: when it leaves active supply, somebody has to look at it. */
export const approvalsInUse: readonly Approval[] = ['approved', 'preferred', 'restricted'];
