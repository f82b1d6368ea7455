import { knownInputs } from './basis';
import type { CheckDefinition } from './check';
import { compared, unrated } from './finding';

export const linkResistanceCheck: CheckDefinition = {
  name: 'link-resistance',
  unit: 'Ω',
  dependsOn: ['/window/upper'],
  variesWithResistance: false,
  asked: (requirement, ratings) => requirement.link && ratings.resistance === 0,
  find({ conditions }) {
    const allowance = conditions.requirement.window?.upper ?? 0;
    const demand = conditions.ratings.link?.residualResistance;
    return demand === undefined
      ? unrated(['link.residualResistance'], null, allowance)
      : compared(demand, allowance);
  },
  explain({ conditions }) {
    return {
      words: 'Largest residual resistance of the link, against the upper end of the window.',
      formula: 'R_residual ≤ R_upper',
      inputs: knownInputs(
        {
          name: 'largest residual resistance',
          symbol: 'R_residual',
          value: conditions.ratings.link?.residualResistance,
          unit: 'Ω',
          from: 'ratings',
          field: 'link.residualResistance',
        },
        {
          name: 'highest allowed resistance',
          symbol: 'R_upper',
          value: conditions.requirement.window?.upper,
          unit: 'Ω',
          from: 'duty',
          field: 'window.upper',
        },
      ),
      source: 'residual resistance of the datasheet; common practice for zero-ohm links',
      notes: [],
    };
  },
};
