import type { Requirement } from '../duty/requirement';
import type { CheckDefinition, CheckName, CheckUnit } from './check';
import { notComputed, unrated } from './finding';

/**
 * Checks that the duty can ask for and that this version does not compute: they answer *unrated* with that reason, so that
 * a duty which needs them never looks as if it were held.
 */
function notComputedCheck(
  name: CheckName,
  unit: CheckUnit,
  what: string,
  asks: (requirement: Requirement) => boolean,
): CheckDefinition {
  return {
    name,
    unit,
    dependsOn: [],
    variesWithResistance: false,
    asked: (requirement, ratings) => ratings.resistance !== 0 && asks(requirement),
    find: () => unrated([notComputed(what)]),
    explain: () => ({
      words: `The duty states ${what}; this version does not compute the check, so it says neither yes nor no.`,
      inputs: [],
      source: 'none',
      notes: ['Confirm it by hand against the datasheet.'],
    }),
  };
}

const pulses = (requirement: Requirement): NonNullable<Requirement['duty']['pulses']> =>
  requirement.duty.pulses ?? [];

export const singlePulseCheck = notComputedCheck('single-pulse', 'W', 'single pulses', (requirement) =>
  pulses(requirement).some((pulse) => pulse.period === undefined),
);
export const repeatedPulseCheck = notComputedCheck('repeated-pulse', 'W', 'repeated pulses', (requirement) =>
  pulses(requirement).some((pulse) => pulse.period !== undefined),
);
export const pulseVoltageCheck = notComputedCheck(
  'pulse-voltage',
  'V',
  'pulse voltages',
  (requirement) => pulses(requirement).length > 0,
);
export const noiseCheck = notComputedCheck(
  'noise',
  'V',
  'a noise limit',
  (requirement) => requirement.duty.noise !== undefined,
);
export const frequencyCheck = notComputedCheck(
  'frequency',
  '1',
  'a frequency',
  (requirement) => requirement.duty.frequency !== undefined,
);
