import type { Requirement } from '../duty/requirement';
import type { SupplyStatus } from '../ratings/technology';
import { knownInputs } from './basis';
import type { CheckDefinition } from './check';
import { unrated, yesOrNo } from './finding';

/** Supply statuses that are wanted where the duty names none. */
export const defaultSupply: readonly SupplyStatus[] = ['active'];

/** Supply statuses a catalogue part may have under a requirement. */
export function wantedSupply(requirement: Requirement): readonly SupplyStatus[] {
  return requirement.duty.supply ?? defaultSupply;
}

export const supplyCheck: CheckDefinition = {
  name: 'supply',
  unit: '',
  dependsOn: ['/supply'],
  variesWithResistance: false,
  asked: (requirement, _ratings, standing) => standing !== undefined || requirement.duty.supply !== undefined,
  find({ conditions, standing }) {
    const supply = standing?.supply;
    return supply === undefined
      ? unrated(['supply'])
      : yesOrNo(wantedSupply(conditions.requirement).includes(supply));
  },
  explain({ conditions, standing }) {
    return {
      words: 'The supply status of the part is one of those asked for.',
      inputs: knownInputs(
        {
          name: 'supply statuses asked for',
          value: wantedSupply(conditions.requirement).join(', '),
          from: 'duty',
          field: 'supply',
        },
        { name: 'supply status of the part', value: standing?.supply, from: 'catalogue', field: 'supply' },
      ),
      source: "purchasing's record, in the history of the part",
      notes: [],
    };
  },
};
