import type { Requirement } from '../duty/requirement';
import type { Approval } from '../ratings/technology';
import { knownInputs } from './basis';
import type { CheckDefinition } from './check';
import { unrated, yesOrNo } from './finding';

/** Approvals that are wanted where the duty names none. */
export const defaultApprovals: readonly Approval[] = ['approved', 'preferred'];

/** Approvals a catalogue part may have under a requirement. */
export function wantedApprovals(requirement: Requirement): readonly Approval[] {
  return requirement.duty.approvals ?? defaultApprovals;
}

export const approvalCheck: CheckDefinition = {
  name: 'approval',
  unit: '',
  dependsOn: ['/approvals'],
  variesWithResistance: false,
  asked: (requirement, _ratings, standing) =>
    standing !== undefined || requirement.duty.approvals !== undefined,
  find({ conditions, standing }) {
    const approval = standing?.approval;
    return approval === undefined
      ? unrated(['approval'])
      : yesOrNo(wantedApprovals(conditions.requirement).includes(approval));
  },
  explain({ conditions, standing }) {
    return {
      words: 'The approval of the part is one of those asked for.',
      inputs: knownInputs(
        {
          name: 'approvals asked for',
          value: wantedApprovals(conditions.requirement).join(', '),
          from: 'duty',
          field: 'approvals',
        },
        { name: 'approval of the part', value: standing?.approval, from: 'catalogue', field: 'approval' },
      ),
      source: 'decision of a component engineer, in the history of the part',
      notes: [],
    };
  },
};
