import { knownInputs } from './basis';
import type { CheckDefinition } from './check';
import { unrated, yesOrNo } from './finding';

export const secondSourceCheck: CheckDefinition = {
  name: 'second-source',
  unit: '',
  dependsOn: ['/secondSource'],
  variesWithResistance: false,
  asked: (requirement) => requirement.duty.secondSource === true,
  find({ standing }) {
    return standing?.secondSource === undefined ? unrated(['second source']) : yesOrNo(standing.secondSource);
  },
  explain({ standing }) {
    const found = standing?.secondSource;
    return {
      words:
        "Another manufacturer's part, approved or preferred and in active supply, stands under the same company part number.",
      inputs: knownInputs({
        name: 'second source',
        value: found === undefined ? undefined : found ? 'yes' : 'no',
        from: 'catalogue',
        field: 'secondSource',
      }),
      source: 'approved manufacturer list of the company part number',
      notes: [],
    };
  },
};
