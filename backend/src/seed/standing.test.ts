import type { Approval, SupplyStatus } from '@resistry/engineering/ratings/technology';
import { smallFamilyFile } from '../../test/support/small-catalogue';
import type { PlacedPart } from './family-rows';
import { readFamily } from './reading/read-family';
import { Roster } from './roster';
import { type ApprovalDecision, approvalSteps, type SupplyDecision, supplySteps } from './standing';
import { standingRows } from './standing-rows';

const family = readFamily('families/tsta.json', smallFamilyFile('TSTA', 'NORTH'));
const part: PlacedPart = {
  id: 7,
  family,
  size: '0603',
  resistance: 100,
  tolerance: 0.01,
  tcr: 100e-6,
  manufacturerPartNumber: 'TSTA0603F1001000',
};
const person = { name: 'Somebody', joined: '2026-01-01', left: null, signsIn: false };
const roster = new Roster([
  { id: 1, person: { ...person, address: 'enterer', roles: ['librarian', 'component-engineer'] } },
  { id: 2, person: { ...person, address: 'engineer', roles: ['component-engineer'] } },
  { id: 3, person: { ...person, address: 'buyer', roles: ['purchasing'] } },
  { id: 4, person: { ...person, address: 'gone', roles: ['component-engineer'], left: '2026-02-01' } },
]);

function decision(to: Approval, on: string, changes: Partial<ApprovalDecision> = {}): ApprovalDecision {
  return {
    part,
    to,
    submitted: null,
    decided: { by: 'engineer', on },
    reason: 'Because.',
    words: null,
    scope: null,
    exception: null,
    ...changes,
  };
}

function supply(to: SupplyStatus, on: string): SupplyDecision {
  return { part, to, lastOrderOn: null, decided: { by: 'buyer', on }, reason: 'Letter.' };
}

const approved = decision('approved', '2026-03-02', { submitted: { by: 'enterer', on: '2026-02-16' } });

describe('the history of an approval', () => {
  it('begins with the submission of the draft and follows the days', () => {
    const steps = approvalSteps([decision('preferred', '2026-05-04'), approved], roster);
    expect(steps.map((step) => [step.from, step.to, step.changedBy, step.decided.on])).toEqual([
      ['draft', 'in-review', 1, '2026-02-16'],
      ['in-review', 'approved', 2, '2026-03-02'],
      ['approved', 'preferred', 2, '2026-05-04'],
    ]);
  });

  it('leaves no trace of a decision for what stands already', () => {
    const again = decision('approved', '2026-06-01');
    expect(approvalSteps([approved, decision('preferred', '2026-05-04'), again], roster)).toHaveLength(3);
  });

  it.each([
    [decision('approved', '2026-03-02'), 'a draft is submitted before it is decided on'],
    [{ ...approved, decided: { by: 'enterer', on: '2026-03-02' } }, 'nobody approves what he or she entered'],
    [{ ...approved, decided: { by: 'buyer', on: '2026-03-02' } }, 'buyer is no component-engineer'],
    [{ ...approved, decided: { by: 'gone', on: '2026-03-02' } }, 'gone did not work here on 2026-03-02'],
    [{ ...approved, decided: { by: 'nobody', on: '2026-03-02' } }, 'nobody has the address nobody'],
    [{ ...approved, to: 'preferred' as const }, 'only an approved part is promoted, this one is in-review'],
    [{ ...approved, submitted: { by: 'engineer', on: '2026-02-16' } }, 'engineer is no librarian'],
  ])('refuses what breaks a rule of the house: %#', (wrong, words) => {
    expect(() => approvalSteps([wrong], roster)).toThrow(words);
    expect(() => approvalSteps([wrong], roster)).toThrow(part.manufacturerPartNumber);
  });

  it('refuses a decision from before the part was entered', () => {
    // The family of the test was entered on 2026-01-05.
    const early = decision('approved', '2026-01-04', { submitted: { by: 'enterer', on: '2026-01-03' } });
    expect(() => approvalSteps([early], roster)).toThrow('decided on before it was entered');
  });
});

describe('what histories amount to', () => {
  const reviewsOf = (approvals: ApprovalDecision[], supplies: SupplyDecision[]): unknown[] =>
    standingRows([
      { approval: approvalSteps(approvals, roster), supply: supplySteps(supplies, roster) },
    ]).reviews.map((row) => [row['cause'], row['state'], row['outcome']]);

  it('closes the review of a submission with the decision', () => {
    expect(reviewsOf([approved], [])).toEqual([['submitted', 'closed', 'approved']]);
    expect(
      reviewsOf([decision('in-review', '2026-03-02', { decided: { by: 'enterer', on: '2026-03-02' } })], []),
    ).toEqual([['submitted', 'open', null]]);
  });

  it('opens a review when a part in use leaves active supply, once, until the next decision', () => {
    const leaving = [supply('not-recommended', '2026-04-06'), supply('discontinued', '2026-07-06')];
    expect(reviewsOf([approved], leaving).slice(1)).toEqual([['left-active-supply', 'open', null]]);
    expect(reviewsOf([approved, decision('withdrawn', '2026-05-04')], leaving).slice(1)).toEqual([
      ['left-active-supply', 'closed', 'withdrawn'],
    ]);
    expect(reviewsOf([], leaving)).toEqual([]);
  });

  it('sets the part to the end of its histories', () => {
    const restricted = decision('restricted', '2026-05-04', { words: 'Not above 50 V.', scope: 'Buoys' });
    const rows = standingRows([
      {
        approval: approvalSteps([approved, restricted], roster),
        supply: supplySteps([supply('discontinued', '2026-07-06')], roster),
      },
    ]);
    expect(rows.approvals).toEqual([
      { id: 7, approval: 'restricted', words: 'Not above 50 V.', scope: 'Buoys', steps: 3 },
    ]);
    expect(rows.supplies).toEqual([{ id: 7, supply: 'discontinued', lastOrderOn: null, steps: 1 }]);
    expect(rows.supplyHistory[0]).toMatchObject({
      from_supply: 'active',
      to_supply: 'discontinued',
      changed_by: 3,
    });
  });
});
