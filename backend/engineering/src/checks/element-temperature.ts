import type { Conditions } from '../operating/conditions';
import { knownInputs } from './basis';
import type { CheckDefinition, Finding } from './check';
import { missingForDissipation } from './dissipation';
import { beyondBounds, holds, unrated } from './finding';

/** Highest element temperature that is allowed, °C: the family's maximum less the policy's reserve. */
export function allowedElementTemperature(conditions: Conditions): number | undefined {
  const maximum = conditions.ratings.maxElementTemperature;
  if (maximum === undefined || conditions.policyUnmatched) return undefined;
  return maximum - (conditions.entry?.reserve ?? 0);
}

export const elementTemperatureCheck: CheckDefinition = {
  name: 'element-temperature',
  unit: '°C',
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
  asked: (requirement, ratings) =>
    ratings.resistance !== 0 &&
    (requirement.load !== undefined || (requirement.duty.pulses?.length ?? 0) > 0),
  find({ conditions, state }): Finding {
    const allowance = allowedElementTemperature(conditions) ?? null;
    const { axis } = conditions;
    if (conditions.load !== undefined && axis.known && conditions.thermal !== undefined && !state.settled) {
      return beyondBounds(allowance);
    }
    const demand = conditions.load === undefined || Number.isNaN(state.hot) ? null : state.hot;
    const missing = [
      ...missingForDissipation(conditions),
      ...(axis.known ? [] : [axis.missing]),
      ...(conditions.thermal === undefined ? ['thermalResistance'] : []),
      ...(conditions.ratings.maxElementTemperature === undefined ? ['maxElementTemperature'] : []),
      ...(conditions.policyUnmatched ? ['an entry of the derating policy for this part'] : []),
    ];
    if (demand !== null && allowance !== null && !holds(demand, allowance))
      return onRise(demand, allowance, axis);
    if (missing.length > 0 || demand === null || allowance === null)
      return unrated(missing, demand, allowance);
    return onRise(demand, allowance, axis);
  },
  explain({ conditions, state }) {
    const { thermal, ratings, axis, entry } = conditions;
    return {
      words:
        'Temperature of the element at its largest dissipation, against the maximum element temperature less the reserve of ' +
        'the policy. The margin is taken on the rise above the reference.',
      formula: 'T_reference + R_th · P ≤ T_max − reserve',
      inputs: knownInputs(
        {
          name: `${ratings.derating?.axis ?? 'ambient'} temperature`,
          symbol: 'T_reference',
          value: axis.known ? axis.celsius : undefined,
          unit: '°C',
          from: 'duty',
          field: 'ambient',
        },
        {
          name: `thermal resistance, from the ${thermal?.from ?? 'datasheet'}`,
          symbol: 'R_th',
          value: thermal?.value,
          unit: 'K/W',
          from: thermal?.from === 'datasheet' ? 'ratings' : 'derived',
          field: thermal?.from === 'datasheet' ? 'thermalResistance' : 'derating',
        },
        {
          name: 'largest dissipation',
          symbol: 'P',
          value: conditions.load === undefined ? undefined : state.dissipation,
          unit: 'W',
          from: 'derived',
        },
        {
          name: 'maximum element temperature',
          symbol: 'T_max',
          value: ratings.maxElementTemperature,
          unit: '°C',
          from: 'ratings',
          field: 'maxElementTemperature',
        },
        { name: 'reserve', value: entry?.reserve, unit: 'K', from: 'policy', field: 'reserve' },
      ),
      source: 'IEC 60115-1; R_th = (T_film at P70 − 70 °C) / P70 where the datasheet states none',
      notes: state.settled
        ? [`Self-heating settled in ${String(state.steps)} steps.`]
        : ['Self-heating does not settle: there is no operating point.'],
    };
  },
};

function onRise(demand: number, allowance: number, axis: Conditions['axis']): Finding {
  const reference = axis.known ? axis.celsius : NaN;
  const rise = demand - reference;
  return {
    demand,
    allowance,
    margin: rise > 0 ? (allowance - reference) / rise - 1 : null,
    status: holds(demand, allowance) ? 'met' : 'unmet',
    missing: [],
  };
}
