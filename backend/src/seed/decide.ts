import { dayAfter } from './moments';
import type { SeedCompanyPartNumber } from './reading/read-company-part-numbers';
import type { ApprovalRule, SupplyRule } from './reading/read-decisions';
import type { PartIndex } from './reading/read-selection';
import { SeedDataError } from './reading/seed-data-error';
import type { Roster } from './roster';
import {
  type ApprovalDecision,
  approvalSteps,
  type ApprovalStep,
  type SupplyDecision,
  supplySteps,
  type SupplyStep,
} from './standing';

/** Days between the submission of a source and the entry of its company part number. */
const DAYS_UNDER_REVIEW = 4;

/** The histories of one part. */
export interface PartHistory {
  readonly approval: readonly ApprovalStep[];
  readonly supply: readonly SupplyStep[];
}

export interface Decisions {
  readonly approvalRules: readonly ApprovalRule[];
  readonly supplyRules: readonly SupplyRule[];
  readonly companyPartNumbers: readonly SeedCompanyPartNumber[];
}

/**
 * The history of every part that something was decided about: by the rules, and by the entry of company part numbers,
 * whose sources are approved and whose first source may be promoted.
 *
 * @throws SeedDataError naming the file and the rule or number that cannot stand
 */
export function decide(
  { approvalRules, supplyRules, companyPartNumbers }: Decisions,
  index: PartIndex,
  roster: Roster,
): Map<number, PartHistory> {
  const approvals = approvalRules.flatMap((rule, place) =>
    within('approvals.json', `decisions[${place}]`, () =>
      index.select(rule.selection).map((part): ApprovalDecision => ({ ...rule, part, exception: null })),
    ),
  );
  approvals.push(
    ...companyPartNumbers.flatMap((entry) =>
      within('company-part-numbers.csv', entry.number, () => decisionsOf(entry, index)),
    ),
  );
  const supplies = supplyRules.flatMap((rule, place) =>
    within('supply.json', `changes[${place}]`, () =>
      index.select(rule.selection).map((part): SupplyDecision => ({ ...rule, part })),
    ),
  );
  const histories = new Map<number, PartHistory>();
  for (const [id, decisions] of byPart(approvals)) {
    const approval = within('approvals.json or company-part-numbers.csv', 'decisions', () =>
      approvalSteps(decisions, roster),
    );
    histories.set(id, { approval, supply: [] });
  }
  for (const [id, decisions] of byPart(supplies)) {
    const supply = within('supply.json', 'changes', () => supplySteps(decisions, roster));
    histories.set(id, { approval: histories.get(id)?.approval ?? [], supply });
  }
  return histories;
}

function decisionsOf(entry: SeedCompanyPartNumber, index: PartIndex): ApprovalDecision[] {
  const plain = { words: null, scope: null, exception: null, submitted: null };
  return entry.sources.flatMap((source, place) => {
    const part = index.get(source);
    const approved: ApprovalDecision = {
      ...plain,
      part,
      to: 'approved',
      submitted: { by: part.family.entered.by, on: dayAfter(entry.enteredOn, -DAYS_UNDER_REVIEW) },
      decided: { by: entry.enteredBy, on: entry.enteredOn },
      reason: `Approved as a source of ${entry.number}.`,
    };
    if (place > 0 || entry.preferredOn === null) return [approved];
    const preferred: ApprovalDecision = {
      ...plain,
      part,
      to: 'preferred',
      decided: { by: entry.enteredBy, on: entry.preferredOn },
      reason: `First choice for ${entry.number}.`,
      exception: entry.exception,
    };
    return [approved, preferred];
  });
}

function byPart<Decision extends { part: { id: number } }>(
  decisions: readonly Decision[],
): Map<number, Decision[]> {
  const grouped = new Map<number, Decision[]>();
  for (const decision of decisions) {
    const known = grouped.get(decision.part.id);
    if (known) known.push(decision);
    else grouped.set(decision.part.id, [decision]);
  }
  return grouped;
}

function within<Result>(file: string, field: string, work: () => Result): Result {
  try {
    return work();
  } catch (error) {
    if (error instanceof RangeError) throw new SeedDataError(file, field, error.message);
    throw error;
  }
}
