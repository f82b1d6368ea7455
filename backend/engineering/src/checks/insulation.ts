import { knownInputs } from './basis';
import type { CheckDefinition } from './check';
import { compared, unrated } from './finding';

export const insulationCheck: CheckDefinition = {
  name: 'insulation',
  unit: 'V',
  dependsOn: ['/insulation/voltage'],
  variesWithResistance: false,
  asked: (requirement) => requirement.duty.insulation !== undefined,
  find({ conditions }) {
    const demand = conditions.requirement.duty.insulation?.voltage ?? 0;
    const allowance = conditions.ratings.insulationVoltage;
    return allowance === undefined ? unrated(['insulationVoltage'], demand) : compared(demand, allowance);
  },
  explain({ conditions }) {
    return {
      words:
        'Voltage between the element and what it may touch, against the insulation voltage of the coating or housing.',
      inputs: knownInputs(
        {
          name: 'demanded insulation voltage',
          value: conditions.requirement.duty.insulation?.voltage,
          unit: 'V',
          from: 'duty',
          field: 'insulation.voltage',
        },
        {
          name: 'insulation voltage',
          value: conditions.ratings.insulationVoltage,
          unit: 'V',
          from: 'ratings',
          field: 'insulationVoltage',
        },
      ),
      source: 'IEC 60115-1, insulation voltage',
      notes: [
        'It rates the coating for the family’s own test; insulation for safety is a matter of the standard in force.',
      ],
    };
  },
};
