import { knownInputs } from './basis';
import type { CheckDefinition, Finding } from './check';
import { holds, unrated, yesOrNo } from './finding';

/** Inside both category temperatures; the colder end is the unheated ambient, the hotter one has the rise inside the enclosure. */
export const categoryTemperatureCheck: CheckDefinition = {
  name: 'category-temperature',
  unit: '°C',
  dependsOn: ['/ambient/min', '/ambient/max', '/ambient/enclosureRise'],
  variesWithResistance: false,
  asked: (requirement) => requirement.duty.ambient !== undefined,
  find({ conditions }): Finding {
    const ambient = conditions.requirement.duty.ambient;
    if (ambient === undefined) return unrated(['ambient']);
    const hottest = ambient.max + (ambient.enclosureRise ?? 0);
    const category = conditions.ratings.category;
    if (category === undefined) return unrated(['category'], hottest);
    if (ambient.min < category.min) return yesOrNo(false, ambient.min, category.min);
    return yesOrNo(holds(hottest, category.max), hottest, category.max);
  },
  explain({ conditions }) {
    const { ratings, requirement } = conditions;
    return {
      words:
        'Ambient, at its hottest with the rise inside the enclosure, inside the lower and upper category temperature.',
      formula: 'T_lower category ≤ T_min and T_max + rise ≤ T_upper category',
      inputs: knownInputs(
        {
          name: 'coldest ambient',
          value: requirement.duty.ambient?.min,
          unit: '°C',
          from: 'duty',
          field: 'ambient.min',
        },
        {
          name: 'hottest ambient',
          value: requirement.duty.ambient?.max,
          unit: '°C',
          from: 'duty',
          field: 'ambient.max',
        },
        {
          name: 'rise inside the enclosure',
          value: requirement.duty.ambient?.enclosureRise,
          unit: 'K',
          from: 'duty',
          field: 'ambient.enclosureRise',
        },
        {
          name: 'lower category temperature',
          value: ratings.category?.min,
          unit: '°C',
          from: 'ratings',
          field: 'category.min',
        },
        {
          name: 'upper category temperature',
          value: ratings.category?.max,
          unit: '°C',
          from: 'ratings',
          field: 'category.max',
        },
      ),
      source: 'IEC 60115-1, category temperature range',
      notes: [],
    };
  },
};
