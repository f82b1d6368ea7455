import { approvals, type Approval } from '@resistry/engineering/ratings/technology';

/** Numbers of parts by approval, from one row an approval; what has no row has no part. */
export function approvalCounts(
  rows: readonly { approval: Approval; parts: number }[],
): Record<Approval, number> {
  const counts = Object.fromEntries(approvals.map((approval) => [approval, 0])) as Record<Approval, number>;
  for (const { approval, parts } of rows) counts[approval] += parts;
  return counts;
}
