import { knownDriftAt } from '../deviation/drift';
import { largestVoltage, worstDissipation } from '../duty/steady-load';
import type { Conditions } from './conditions';

/** Where deviation, dissipation and temperature have settled against each other. Ω, fraction, W, V, °C. */
export interface OperatingState {
  /** Nominal resistance, Ω (the lower end where an interval was settled). */
  nominal: number;
  /** Interval of the resistance over life, Ω, from the known contributions. */
  low: number;
  high: number;
  /** Known deviation, fraction of the nominal. */
  deviation: number;
  /** Largest dissipation over that interval, W; 0 without a load. */
  dissipation: number;
  /** Largest steady voltage over that interval, V; 0 without a load. */
  voltage: number;
  /** Hottest element temperature, °C; NaN where it is not known. */
  hot: number;
  /** Element temperature used for the known deviations, °C; the axis temperature where the rise is not known; NaN without. */
  hotKnown: number;
  /** Steps of the iteration. */
  steps: number;
  /** False where no operating point exists: self-heating drives the deviation without end. */
  settled: boolean;
}

const largestStepCount = 10_000;
const closeEnough = 1e-13;

/**
 * Settles self-heating: the temperature depends on the dissipation, that on the resistance at its worst, that on the
 * deviation, and the deviation on the temperature. Iterated from the unheated part to the fixed point. Every step is
 * monotone, so from below it reaches the least fixed point, and settling an interval of resistance bounds every
 * resistance inside it from above.
 * @param lowest nominal resistance, Ω, above 0
 * @param highest nominal resistance, Ω; the same for a single part, more for a bound over an interval
 */
export function settle(conditions: Conditions, lowest: number, highest: number): OperatingState {
  const { axis, load, thermal } = conditions;
  const axisCelsius = axis.known ? axis.celsius : NaN;
  const riseKnown = load === undefined || thermal !== undefined;
  const thermalResistance = thermal?.value ?? 0;
  let deviation = deviationAt(conditions, axisCelsius, 0);
  let dissipation = 0;
  let voltage = 0;
  let hot = axisCelsius;
  let steps = 0;
  let settled = false;
  let change = Infinity;
  const canRunAway =
    load !== undefined &&
    load.powerMax === Infinity &&
    (load.voltageMax === Infinity || load.currentMax === Infinity);
  while (steps < largestStepCount) {
    steps += 1;
    if (load !== undefined) {
      dissipation = worstDissipation(load, lowest * Math.max(0, 1 - deviation), highest * (1 + deviation));
      voltage = largestVoltage(load, highest * (1 + deviation));
      hot = axisCelsius + thermalResistance * dissipation;
    }
    const next = deviationAt(conditions, hot, voltage);
    if (!Number.isFinite(next) || next > 1e6 || !Number.isFinite(dissipation)) break;
    const before = change;
    change = Math.abs(next - deviation);
    deviation = next;
    // By voltage or by current alone every step is convex in the deviation: once steps grow they grow for ever.
    if (canRunAway && change > before * (1 + 1e-9) && change > closeEnough) break;
    if (change <= closeEnough * (1 + next)) {
      settled = true;
      break;
    }
  }
  return {
    nominal: lowest,
    low: lowest * Math.max(0, 1 - deviation),
    high: highest * (1 + deviation),
    deviation,
    dissipation,
    voltage,
    hot: riseKnown ? hot : NaN,
    hotKnown: hot,
    steps,
    settled,
  };
}

/**
 * Known deviation, fraction, with the element at `hot` (°C, NaN where not known) and `voltage` (V) across it:
 * the sum of the contributions, or the root of the sum of their squares for independent ones.
 */
export function deviationAt(conditions: Conditions, hot: number, voltage: number): number {
  const temperature = temperatureDeviation(conditions, hot);
  const byVoltage = conditions.voltageCoefficient * voltage;
  const { driftOverLife } = conditions;
  const drift = driftOverLife === undefined || Number.isNaN(hot) ? 0 : knownDriftAt(driftOverLife, hot);
  if (!conditions.rootSumSquare) return conditions.fixedSum + temperature + byVoltage + drift;
  return Math.sqrt(conditions.fixedSquares + temperature ** 2 + byVoltage ** 2 + drift ** 2);
}

/**
 * TCR × the larger of the hot, loaded and the cold, unloaded distance from the reference temperature, fraction:
 * self-heating warms the hot end and does not help the cold end.
 */
export function temperatureDeviation(conditions: Conditions, hot: number): number {
  const hotSpan = Number.isNaN(hot) ? -Infinity : hot - conditions.referenceTemperature;
  return conditions.tcr * Math.max(hotSpan, conditions.coldSpan, 0);
}
