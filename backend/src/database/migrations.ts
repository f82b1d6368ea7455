import type { Migration } from './migration';
import { people } from './migrations/0001-people';
import { auditAndOutbox } from './migrations/0002-audit-and-outbox';
import { catalogue } from './migrations/0010-catalogue';
import { parts } from './migrations/0011-parts';
import { deratingPolicies } from './migrations/0012-derating-policies';
import { reviewCauses } from './migrations/0013-review-causes';
import { offerChanges } from './migrations/0014-offer-changes';

/** Every migration, in order; a new one goes at the end. */
export const migrations: readonly Migration[] = [
  people,
  auditAndOutbox,
  catalogue,
  parts,
  deratingPolicies,
  reviewCauses,
  offerChanges,
];
