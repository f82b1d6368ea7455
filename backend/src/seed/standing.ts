import type { Approval, SupplyStatus } from '@resistry/engineering/ratings/technology';
import type { Deed } from './family';
import type { PlacedPart } from './family-rows';
import type { Roster } from './roster';

/** A decision on the approval of one part. */
export interface ApprovalDecision {
  readonly part: PlacedPart;
  readonly to: Approval;
  readonly submitted: Deed | null;
  readonly decided: Deed;
  readonly reason: string;
  readonly words: string | null;
  readonly scope: string | null;
  readonly exception: string | null;
}

export interface SupplyDecision {
  readonly part: PlacedPart;
  readonly to: SupplyStatus;
  readonly lastOrderOn: string | null;
  readonly decided: Deed;
  readonly reason: string;
}

/** One row of a history, before it gets its place in time among all the others. */
export interface ApprovalStep extends Omit<ApprovalDecision, 'submitted'> {
  readonly from: Approval;
  readonly changedBy: number;
}

export interface SupplyStep extends SupplyDecision {
  readonly from: SupplyStatus;
  readonly changedBy: number;
}

/**
 * The history of a part's approval from the decisions about it, in the order of their days. A draft that is decided on was
 * submitted first; a decision for what stands already leaves no trace.
 *
 * @throws RangeError where a decision breaks a rule of the house: four eyes, the role, the order of things
 */
export function approvalSteps(decisions: readonly ApprovalDecision[], roster: Roster): ApprovalStep[] {
  const steps: ApprovalStep[] = [];
  let state: Approval = 'draft';
  for (const decision of inOrder(decisions)) {
    if (decision.to === state || (decision.to === 'approved' && state === 'preferred')) continue;
    const { part, submitted } = decision;
    try {
      if (state === 'draft' || state === 'withdrawn') {
        const deed = submitted ?? (decision.to === 'in-review' ? decision.decided : null);
        if (!deed) throw new RangeError('a draft is submitted before it is decided on');
        steps.push(submission(part, state, deed, roster));
        state = 'in-review';
        if (decision.to === 'in-review') continue;
      }
      const changedBy = roster.didAs('component-engineer', decision.decided);
      const { entered } = part.family;
      if (entered.by === decision.decided.by) throw new RangeError('nobody approves what he or she entered');
      if (decision.decided.on < entered.on) throw new RangeError('it was decided on before it was entered');
      if (decision.to === 'preferred' && state !== 'approved') {
        throw new RangeError(`only an approved part is promoted, this one is ${state}`);
      }
      steps.push({ ...decision, from: state, changedBy });
      state = decision.to;
    } catch (error) {
      throw new RangeError(
        `${part.manufacturerPartNumber}, ${decision.to} on ${decision.decided.on}: ${error instanceof Error ? error.message : 'unknown'}`,
        { cause: error },
      );
    }
  }
  return steps;
}

function submission(part: PlacedPart, from: Approval, decided: Deed, roster: Roster): ApprovalStep {
  return {
    part,
    from,
    to: 'in-review',
    decided,
    reason: 'Submitted for review.',
    words: null,
    scope: null,
    exception: null,
    changedBy: roster.didAs('librarian', decided),
  };
}

/** The history of a part's supply status, in the order of the days. */
export function supplySteps(decisions: readonly SupplyDecision[], roster: Roster): SupplyStep[] {
  let state: SupplyStatus = 'active';
  return inOrder(decisions).map((decision) => {
    const step = { ...decision, from: state, changedBy: roster.didAs('purchasing', decision.decided) };
    state = decision.to;
    return step;
  });
}

function inOrder<Decision extends { decided: Deed }>(decisions: readonly Decision[]): Decision[] {
  return [...decisions].sort((one, other) =>
    one.decided.on < other.decided.on ? -1 : Number(one.decided.on > other.decided.on),
  );
}
