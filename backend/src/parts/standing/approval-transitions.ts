import type { Approval } from '@resistry/engineering/ratings/technology';
import type { Action } from '../../permissions/actions-and-subjects';

/** What a part can be made; no part goes back to being a draft. */
export const approvalTargets = ['in-review', 'approved', 'preferred', 'restricted', 'withdrawn'] as const;
export type ApprovalTarget = (typeof approvalTargets)[number];

/** Which approvals follow on which. Restricted follows on itself: its words can change. */
export const approvalTransitions: Readonly<Record<Approval, readonly ApprovalTarget[]>> = {
  draft: ['in-review', 'approved', 'restricted', 'withdrawn'],
  'in-review': ['approved', 'restricted', 'withdrawn'],
  approved: ['preferred', 'restricted', 'withdrawn'],
  preferred: ['approved', 'restricted', 'withdrawn'],
  restricted: ['approved', 'restricted', 'withdrawn'],
  withdrawn: ['in-review'],
};

/** The deed by which a part becomes this, in the words of the permissions. */
export const approvalActions: Readonly<Record<ApprovalTarget, Action>> = {
  'in-review': 'submit',
  approved: 'approve',
  preferred: 'promote',
  restricted: 'restrict',
  withdrawn: 'withdraw',
};

/** Approvals under which a part is in use: when it leaves active supply, somebody has to look at it. */
export const approvalsInUse: readonly Approval[] = ['approved', 'preferred', 'restricted'];
