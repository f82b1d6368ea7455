import { knownInputs } from './basis';
import type { CheckDefinition } from './check';
import { unrated, yesOrNo } from './finding';

export const mountingCheck: CheckDefinition = {
  name: 'mounting',
  unit: '',
  dependsOn: ['/mounting'],
  variesWithResistance: false,
  asked: (requirement) => requirement.duty.mounting !== undefined,
  find({ conditions }) {
    const mounting = conditions.ratings.mounting;
    return mounting === undefined
      ? unrated(['mounting'])
      : yesOrNo(mounting === conditions.requirement.duty.mounting);
  },
  explain({ conditions }) {
    return {
      words: 'The way the body is fixed is the one asked for.',
      inputs: knownInputs(
        {
          name: 'mounting asked for',
          value: conditions.requirement.duty.mounting,
          from: 'duty',
          field: 'mounting',
        },
        {
          name: 'mounting of the part',
          value: conditions.ratings.mounting,
          from: 'ratings',
          field: 'mounting',
        },
      ),
      source: 'datasheet',
      notes: [],
    };
  },
};
