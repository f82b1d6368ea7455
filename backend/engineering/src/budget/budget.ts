import { hasPulses, type Conditions } from '../operating/conditions';
import { temperatureDeviation, type OperatingState } from '../operating/settle';
import { driftAt, driftLawOf } from '../deviation/drift';

export type Contribution =
  'tolerance' | 'temperature' | 'voltage' | 'soldering' | 'humidity' | 'pulse' | 'drift';

/** One line of the deviation budget; amount is a fraction of the nominal, null where data are missing (never 0 for it). */
export interface BudgetLine {
  contribution: Contribution;
  amount: number | null;
  basis: string;
  missing: readonly string[];
}

/** The deviation budget of a part where it settled: one line a contribution the duty brings into play, no total. */
export function budgetOf(conditions: Conditions, state: OperatingState): BudgetLine[] {
  const { ratings, requirement, load } = conditions;
  const lines: BudgetLine[] = [plain('tolerance', ratings.tolerance, 'tolerance at delivery', 'tolerance')];
  if (requirement.duty.ambient !== undefined) lines.push(temperatureLine(conditions, state));
  if (load !== undefined) lines.push(voltageLine(conditions, state));
  lines.push(plain('soldering', ratings.solderShift, 'shift by soldering', 'solderShift'));
  lines.push(plain('humidity', ratings.humidityShift, 'shift by humidity', 'humidityShift'));
  if (hasPulses(requirement)) {
    lines.push(plain('pulse', ratings.pulses?.shift, 'shift by pulses', 'pulses.shift'));
  }
  if (requirement.duty.life !== undefined) lines.push(driftLine(conditions, state));
  return lines;
}

function plain(
  contribution: Contribution,
  amount: number | undefined,
  words: string,
  field: string,
): BudgetLine {
  return amount === undefined
    ? { contribution, amount: null, basis: `${words}: the datasheet gives none`, missing: [field] }
    : { contribution, amount, basis: `${words}, as rated`, missing: [] };
}

const noOperatingPoint = 'an operating point, for self-heating does not settle';

/** What is missing for the temperature of the element. */
function missingForElement(conditions: Conditions, state: OperatingState): string[] {
  const missing: string[] = [];
  if (!state.settled) missing.push(noOperatingPoint);
  if (!conditions.axis.known) missing.push(conditions.axis.missing);
  if (conditions.load !== undefined && conditions.thermal === undefined) missing.push('thermalResistance');
  return missing;
}

function temperatureLine(conditions: Conditions, state: OperatingState): BudgetLine {
  const missing = [
    ...(conditions.ratings.tcr === undefined ? ['tcr'] : []),
    ...missingForElement(conditions, state),
  ];
  if (missing.length > 0) {
    return {
      contribution: 'temperature',
      amount: null,
      basis: 'temperature coefficient: not all data are known',
      missing,
    };
  }
  const amount = temperatureDeviation(conditions, state.hot);
  const span = Math.max(state.hot - conditions.referenceTemperature, conditions.coldSpan);
  const end = span === conditions.coldSpan ? 'cold and unloaded' : 'hot and loaded';
  return {
    contribution: 'temperature',
    amount,
    basis: `TCR × ${span.toFixed(1)} K, ${end}, from ${String(conditions.referenceTemperature)} °C`,
    missing: [],
  };
}

function voltageLine(conditions: Conditions, state: OperatingState): BudgetLine {
  if (conditions.ratings.voltageCoefficient === undefined) {
    return plain('voltage', undefined, 'voltage coefficient', 'voltageCoefficient');
  }
  if (!state.settled) {
    return {
      contribution: 'voltage',
      amount: null,
      basis: 'voltage coefficient: the voltage is not known',
      missing: [noOperatingPoint],
    };
  }
  return {
    contribution: 'voltage',
    amount: conditions.voltageCoefficient * state.voltage,
    basis: `voltage coefficient × ${state.voltage.toPrecision(4)} V`,
    missing: [],
  };
}

function driftLine(conditions: Conditions, state: OperatingState): BudgetLine {
  const { driftOverLife, hours, ratings } = conditions;
  const { drift } = ratings;
  if (drift === undefined || driftOverLife === undefined)
    return plain('drift', undefined, 'load-life drift', 'drift');
  const missing = missingForElement(conditions, state);
  if (missing.length > 0) {
    return {
      contribution: 'drift',
      amount: null,
      basis: 'load-life drift: the element temperature is not known',
      missing,
    };
  }
  const amount = driftAt(driftOverLife, state.hot);
  const stated = `${String(drift.fraction * 100)} % at ${String(drift.hours)} h and ${String(drift.temperature)} °C`;
  if (!amount.complete) {
    const missingData = `drift beyond ${String(drift.hours)} h or ${String(drift.temperature)} °C`;
    return {
      contribution: 'drift',
      amount: null,
      basis: `load-life drift: only ${stated} is stated`,
      missing: [missingData],
    };
  }
  const law = driftLawOf(ratings.technology, drift);
  const words =
    law === undefined
      ? `${stated}, never less`
      : `${stated}, scaled by (t/t₀)^${law.exponent.toPrecision(3)} and doubling per ${String(law.doubling)} K ` +
        `to ${String(hours)} h at ${state.hot.toFixed(1)} °C (${drift.law === undefined ? 'common practice' : "the family's law"})`;
  return { contribution: 'drift', amount: amount.known, basis: words, missing: [] };
}
