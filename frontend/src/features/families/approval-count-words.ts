import type { Approval } from '@resistry/engineering/ratings/technology';
import { approvalWords } from '../../wording/standing-words';

/** As they matter to somebody who chooses: what may be used first. */
const order: readonly Approval[] = ['preferred', 'approved', 'in-review', 'restricted', 'draft', 'withdrawn'];

/** `1 preferred, 8 approved, 73 draft`: numbers of parts by approval, without those there are none of. */
export function approvalCountWords(approvals: Record<string, number>): string {
  const counted = order.flatMap((approval) => {
    const count = approvals[approval] ?? 0;
    return count === 0 ? [] : [`${count.toLocaleString('en')} ${approvalWords[approval].toLowerCase()}`];
  });
  return counted.length === 0 ? 'no parts' : counted.join(', ');
}
