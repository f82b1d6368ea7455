import type { Approval } from '@resistry/engineering/ratings/technology';
import { supplyWords } from '../parts/standing/standing-words';
import type { Columns } from './family';
import { momentOf } from './moments';
import type { ApprovalStep, SupplyStep } from './standing';

/** What histories amount to: their rows in the order of time, the reviews they opened, where each part stands. */
export interface StandingRows {
  readonly approvalHistory: Columns[];
  readonly supplyHistory: Columns[];
  readonly reviews: Columns[];
  readonly approvals: {
    id: number;
    approval: Approval;
    words: string | null;
    scope: string | null;
    steps: number;
  }[];
  readonly supplies: { id: number; supply: string; lastOrderOn: string | null; steps: number }[];
}

/** Approvals whose part is looked at again when it leaves active supply. */
const inUse: readonly Approval[] = ['approved', 'preferred', 'restricted'];

/** @param histories one entry a part with a history; each in the order of time */
export function standingRows(
  histories: Iterable<{ readonly approval: readonly ApprovalStep[]; readonly supply: readonly SupplyStep[] }>,
): StandingRows {
  const rows: StandingRows = {
    approvalHistory: [],
    supplyHistory: [],
    reviews: [],
    approvals: [],
    supplies: [],
  };
  for (const { approval, supply } of histories) {
    for (const step of approval) rows.approvalHistory.push(approvalRow(step));
    for (const step of supply) rows.supplyHistory.push(supplyRow(step));
    rows.reviews.push(...submittedReviews(approval), ...supplyReviews(approval, supply));
    const last = approval.at(-1);
    if (last) {
      rows.approvals.push({
        id: last.part.id,
        approval: last.to,
        words: last.words,
        scope: last.scope,
        steps: approval.length,
      });
    }
    const lastSupply = supply.at(-1);
    if (lastSupply) {
      rows.supplies.push({
        id: lastSupply.part.id,
        supply: lastSupply.to,
        lastOrderOn: lastSupply.lastOrderOn,
        steps: supply.length,
      });
    }
  }
  byTime(rows.approvalHistory, 'changed_at');
  byTime(rows.supplyHistory, 'changed_at');
  byTime(rows.reviews, 'opened_at');
  return rows;
}

function momentOfStep(step: ApprovalStep): string {
  return momentOf(step.decided.on, step.to === 'in-review' ? 10 : 15);
}

function approvalRow(step: ApprovalStep): Columns {
  return {
    part_id: step.part.id,
    from_approval: step.from,
    to_approval: step.to,
    words: step.words,
    scope: step.scope,
    exception: step.exception,
    reason: step.reason,
    changed_by: step.changedBy,
    changed_at: momentOfStep(step),
  };
}

function supplyRow(step: SupplyStep): Columns {
  return {
    part_id: step.part.id,
    from_supply: step.from,
    to_supply: step.to,
    last_order_on: step.lastOrderOn,
    reason: step.reason,
    changed_by: step.changedBy,
    changed_at: momentOf(step.decided.on, 11),
  };
}

/** Each submission opened a review, which the next decision closed. */
function submittedReviews(approval: readonly ApprovalStep[]): Columns[] {
  return approval.flatMap((step, place) => {
    if (step.to !== 'in-review') return [];
    return [reviewRow('submitted', step.reason, step, momentOfStep(step), approval[place + 1])];
  });
}

/** Leaving active supply opened a review of a part in use, which the next decision on its approval closed. */
function supplyReviews(approval: readonly ApprovalStep[], supply: readonly SupplyStep[]): Columns[] {
  const [leaving] = supply.filter((step) => step.from === 'active');
  if (!leaving) return [];
  const before = approval.findLast((step) => step.decided.on <= leaving.decided.on);
  if (!before || !inUse.includes(before.to)) return [];
  const after = approval.find((step) => step.decided.on > leaving.decided.on);
  const words = `Its supply is now ${supplyWords[leaving.to]}: ${leaving.reason}`;
  return [reviewRow('left-active-supply', words, leaving, momentOf(leaving.decided.on, 11), after)];
}

function reviewRow(
  cause: 'submitted' | 'left-active-supply',
  words: string,
  opened: { part: { id: number }; changedBy: number },
  openedAt: string,
  closing: ApprovalStep | undefined,
): Columns {
  return {
    part_id: opened.part.id,
    cause,
    words,
    state: closing ? 'closed' : 'open',
    opened_by: opened.changedBy,
    opened_at: openedAt,
    closed_by: closing?.changedBy ?? null,
    closed_at: closing ? momentOfStep(closing) : null,
    outcome: closing?.to ?? null,
  };
}

function byTime(rows: Columns[], column: string): void {
  rows.sort((one, other) => {
    const [earlier, later] = [String(one[column]), String(other[column])];
    return earlier < later ? -1 : Number(earlier > later);
  });
}
