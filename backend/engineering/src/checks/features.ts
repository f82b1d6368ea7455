import { knownInputs } from './basis';
import type { CheckDefinition } from './check';
import { unrated, yesOrNo } from './finding';

export const featuresCheck: CheckDefinition = {
  name: 'features',
  unit: '',
  dependsOn: ['/features'],
  variesWithResistance: false,
  asked: (requirement) => (requirement.duty.features?.length ?? 0) > 0,
  find({ conditions }) {
    const has = conditions.ratings.features;
    if (has === undefined) return unrated(['features']);
    return yesOrNo((conditions.requirement.duty.features ?? []).every((feature) => has.includes(feature)));
  },
  explain({ conditions }) {
    return {
      words: 'The datasheet claims every feature that is asked for.',
      inputs: knownInputs(
        {
          name: 'features asked for',
          value: conditions.requirement.duty.features?.join(', '),
          from: 'duty',
          field: 'features',
        },
        {
          name: 'features claimed',
          value: conditions.ratings.features?.join(', '),
          from: 'ratings',
          field: 'features',
        },
      ),
      source: 'datasheet',
      notes: [],
    };
  },
};
