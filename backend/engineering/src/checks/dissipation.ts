import { budgetOf } from '../budget/budget';
import { lineOf } from '../derating/policy-line';
import { hasPulses, type Conditions } from '../operating/conditions';
import type { OperatingState } from '../operating/settle';
import { knownInputs } from './basis';
import type { CheckDefinition, Finding } from './check';
import { beyondBounds, compared, holds, notComputed, unrated } from './finding';

/** Data that are missing for the dissipation itself, whatever is allowed. */
export function missingForDissipation(conditions: Conditions): string[] {
  return [
    ...(conditions.load === undefined && !hasPulses(conditions.requirement) ? ['load'] : []),
    ...(hasPulses(conditions.requirement) ? [notComputed('mean power of the pulses')] : []),
    ...(conditions.ratings.tolerance === undefined ? ['tolerance'] : []),
  ];
}

export const dissipationCheck: CheckDefinition = {
  name: 'dissipation',
  unit: 'W',
  dependsOn: [
    '/load',
    '/limits',
    '/ambient/max',
    '/ambient/enclosureRise',
    '/ambient/terminal',
    '/ambient/case',
    '/ambient/altitude',
    '/life/hours',
    '/deviation',
  ],
  variesWithResistance: true,
  asked: (requirement, ratings) =>
    ratings.resistance !== 0 && (requirement.load !== undefined || hasPulses(requirement)),
  find({ conditions, state }): Finding {
    const allowed = conditions.allowedDissipation;
    const allowance = allowed.known ? allowed.value : null;
    if (conditions.load !== undefined && !state.settled) return beyondBounds(allowance);
    const demand = conditions.load === undefined ? null : state.dissipation;
    if (demand !== null && allowance !== null && !holds(demand, allowance))
      return compared(demand, allowance);
    const missing = [...missingForDissipation(conditions), ...(allowed.known ? [] : allowed.missing)];
    if (missing.length > 0 || demand === null || allowance === null)
      return unrated(missing, demand, allowance);
    return compared(demand, allowance);
  },
  explain({ conditions, state }) {
    return {
      words:
        'Largest steady dissipation anywhere in the interval of the resistance over life, against the rated dissipation ' +
        "times the lower of the policy's line and the manufacturer's curve at the curve's own axis, times the altitude factor.",
      formula: `${demandFormula(conditions, state)} ≤ P_rated · min(policy line, curve) · altitude factor`,
      inputs: dissipationInputs(conditions, state),
      source:
        conditions.entry === undefined
          ? 'IEC 60115-1, derating curve of the manufacturer'
          : 'IEC 60115-1; the derating policy in force',
      notes: intervalNotes(conditions, state),
    };
  },
};

/** What the interval of the resistance over life lacks: a load is then worst over less than the part can take. */
export function intervalNotes(conditions: Conditions, state: OperatingState): string[] {
  if (!state.settled) return ['Self-heating does not settle: there is no operating point.'];
  const missing = budgetOf(conditions, state).filter(({ amount }) => amount === null);
  if (missing.length === 0) return [];
  const names = missing.map(({ contribution }) => contribution).join(', ');
  return [
    `The interval of the resistance over life is without what the datasheet or the duty does not state: ${names}.`,
  ];
}

/** Which bound of the load decides, in symbols. */
function demandFormula(conditions: Conditions, state: OperatingState): string {
  const load = conditions.load;
  if (load === undefined) return 'P';
  const { dissipation } = state;
  const near = (watt: number): boolean => Math.abs(watt - dissipation) <= 1e-9 * dissipation;
  if (near(load.powerMax)) return 'P = P_max';
  if (near(load.voltageMax ** 2 / state.low)) return 'P = U² / R_low';
  if (near(load.currentMax ** 2 * state.high)) return 'P = I² · R_high';
  return 'P = U · I';
}

function dissipationInputs(conditions: Conditions, state: OperatingState): ReturnType<typeof knownInputs> {
  const { ratings, load, entry, axis } = conditions;
  const bounded = (value: number | undefined): number | undefined => (value === Infinity ? undefined : value);
  const line =
    entry?.reading === 'parallel' && ratings.derating !== undefined
      ? lineOf(entry, ratings.derating)
      : undefined;
  return knownInputs(
    {
      name: 'largest voltage',
      symbol: 'U',
      value: bounded(load?.voltageMax),
      unit: 'V',
      from: 'duty',
      field: 'load.voltage',
    },
    {
      name: 'largest current',
      symbol: 'I',
      value: bounded(load?.currentMax),
      unit: 'A',
      from: 'duty',
      field: 'load.current',
    },
    {
      name: 'largest power',
      symbol: 'P_max',
      value: bounded(load?.powerMax),
      unit: 'W',
      from: 'duty',
      field: 'load.power',
    },
    { name: 'lowest resistance over life', symbol: 'R_low', value: state.low, unit: 'Ω', from: 'derived' },
    { name: 'highest resistance over life', symbol: 'R_high', value: state.high, unit: 'Ω', from: 'derived' },
    {
      name: 'rated dissipation',
      symbol: 'P_rated',
      value: ratings.ratedDissipation,
      unit: 'W',
      from: 'ratings',
      field: 'ratedDissipation',
    },
    {
      name: `${ratings.derating?.axis ?? 'ambient'} temperature`,
      value: axis.known ? axis.celsius : undefined,
      unit: '°C',
      from: 'duty',
      field: 'ambient',
    },
    {
      name: 'fraction left at that temperature',
      value: conditions.fraction.known ? conditions.fraction.value : undefined,
      unit: '1',
      from: 'derived',
      field: 'derating',
    },
    {
      name: 'power ratio of the policy',
      value: entry?.powerRatio,
      unit: '1',
      from: 'policy',
      field: 'powerRatio',
    },
    { name: 'reading of the policy', value: entry?.reading, from: 'policy', field: 'reading' },
    { name: 'policy line full up to', value: line?.from, unit: '°C', from: 'policy', field: 'from' },
    { name: 'policy line zero at', value: line?.zero, unit: '°C', from: 'policy', field: 'zero' },
    {
      name: 'altitude factor',
      value: conditions.altitude.known ? conditions.altitude.value : undefined,
      unit: '1',
      from: 'policy',
      field: 'altitude',
    },
  );
}
