import { knownInputs } from './basis';
import type { CheckDefinition, Finding } from './check';
import { intervalNotes } from './dissipation';
import { beyondBounds, compared, holds, unrated } from './finding';

/** Critical resistance, Ω: where the rated voltage √(P·R) reaches the limiting element voltage (IEC 60115-1). */
export function criticalResistance(limitingElementVoltage: number, ratedDissipation: number): number {
  return limitingElementVoltage ** 2 / ratedDissipation;
}

export const voltageCheck: CheckDefinition = {
  name: 'voltage',
  unit: 'V',
  dependsOn: [
    '/load',
    '/limits',
    '/ambient/max',
    '/ambient/enclosureRise',
    '/ambient/terminal',
    '/ambient/case',
    '/life/hours',
    '/deviation',
  ],
  variesWithResistance: true,
  asked: (requirement, ratings) => ratings.resistance !== 0 && requirement.load !== undefined,
  find({ conditions, state }): Finding {
    const allowed = conditions.allowedVoltage;
    const allowance = allowed.known ? allowed.value : null;
    const stated = conditions.load?.voltageMax ?? Infinity;
    // Without an operating point the stated voltage is all that bounds it.
    const demand = state.settled ? state.voltage : stated;
    if (!Number.isFinite(demand)) return beyondBounds(allowance);
    if (allowance === null || !allowed.known) return unrated(allowed.known ? [] : allowed.missing, demand);
    if (!holds(demand, allowance)) return compared(demand, allowance);
    const dependsOnResistance = !holds(stated, allowance);
    if (dependsOnResistance && conditions.ratings.tolerance === undefined) {
      return unrated(['tolerance'], demand, allowance);
    }
    return compared(demand, allowance);
  },
  explain({ conditions, state }) {
    const { ratings, entry, load } = conditions;
    const { limitingElementVoltage, ratedDissipation } = ratings;
    const critical =
      limitingElementVoltage === undefined || ratedDissipation === undefined || ratedDissipation <= 0
        ? undefined
        : criticalResistance(limitingElementVoltage, ratedDissipation);
    return {
      words:
        'Largest continuous voltage across the part over life, against the limiting element voltage times the voltage ratio of the policy.',
      formula: 'min(U, I · R_high, √(P · R_high)) ≤ voltage ratio · U_limiting',
      inputs: knownInputs(
        {
          name: 'largest voltage',
          symbol: 'U',
          value: load?.voltageMax === Infinity ? undefined : load?.voltageMax,
          unit: 'V',
          from: 'duty',
          field: 'load.voltage',
        },
        {
          name: 'largest current',
          symbol: 'I',
          value: load?.currentMax === Infinity ? undefined : load?.currentMax,
          unit: 'A',
          from: 'duty',
          field: 'load.current',
        },
        {
          name: 'highest resistance over life',
          symbol: 'R_high',
          value: state.high,
          unit: 'Ω',
          from: 'derived',
        },
        {
          name: 'limiting element voltage',
          symbol: 'U_limiting',
          value: limitingElementVoltage,
          unit: 'V',
          from: 'ratings',
          field: 'limitingElementVoltage',
        },
        {
          name: 'voltage ratio of the policy',
          value: entry?.voltageRatio,
          unit: '1',
          from: 'policy',
          field: 'voltageRatio',
        },
        {
          name: 'critical resistance, U_limiting² / P_rated',
          symbol: 'R_crit',
          value: critical,
          unit: 'Ω',
          from: 'derived',
        },
      ),
      source: 'IEC 60115-1, rated voltage and limiting element voltage',
      notes: intervalNotes(conditions, state),
    };
  },
};
