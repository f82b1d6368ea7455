import type { Policy } from '@resistry/engineering/derating/policy-entry';

/** The policy of a computation, and how the answer names it. */
export interface ResolvedPolicy {
  policy: Policy;
  used: { id: number; version: number; name: string } | 'none' | 'inline';
}
