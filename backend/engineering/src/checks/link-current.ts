import { largestCurrent } from '../duty/steady-load';
import { knownInputs } from './basis';
import type { CheckDefinition } from './check';
import { compared, unrated } from './finding';

export const linkCurrentCheck: CheckDefinition = {
  name: 'link-current',
  unit: 'A',
  dependsOn: ['/load/current'],
  variesWithResistance: false,
  asked: (requirement, ratings) => ratings.resistance === 0 && requirement.load !== undefined,
  find({ conditions }) {
    const current = conditions.load === undefined ? Infinity : largestCurrent(conditions.load, 0);
    const demand = Number.isFinite(current) ? current : null;
    const allowance = conditions.ratings.link?.ratedCurrent ?? null;
    const missing = [
      ...(demand === null ? ['load.current'] : []),
      ...(allowance === null ? ['link.ratedCurrent'] : []),
    ];
    if (demand === null || allowance === null) return unrated(missing, demand, allowance);
    return compared(demand, allowance);
  },
  explain({ conditions }) {
    return {
      words: 'Largest steady current through the link, against its rated current.',
      formula: 'I ≤ I_rated',
      inputs: knownInputs(
        {
          name: 'largest current',
          symbol: 'I',
          value: conditions.load?.currentMax === Infinity ? undefined : conditions.load?.currentMax,
          unit: 'A',
          from: 'duty',
          field: 'load.current',
        },
        {
          name: 'rated current',
          symbol: 'I_rated',
          value: conditions.ratings.link?.ratedCurrent,
          unit: 'A',
          from: 'ratings',
          field: 'link.ratedCurrent',
        },
      ),
      source: 'rated current of the datasheet; common practice for zero-ohm links',
      notes: [],
    };
  },
};
