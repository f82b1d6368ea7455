import { holds } from '../checks/finding';
import { distanceToEdge, valueCheck } from '../checks/value';
import { largestVoltage, worstDissipation } from '../duty/steady-load';
import type { Status } from '../checks/check';
import type { Window } from '../duty/window';
import type { Conditions } from '../operating/conditions';
import { deviationAt, settle, type OperatingState } from '../operating/settle';
import { setStatus, type RowMasks } from './row-masks';

/** A stretch of one row that the value check is held to. */
interface Stretch {
  conditions: Conditions;
  window: Window;
  resistances: Float64Array;
  masks: RowMasks;
  bit: number;
  /** Status of a part whose deviation is nothing: unrated where data are missing whatever the resistance. */
  atRest: Status;
}

/** Stretches shorter than this are assessed part by part: bounding one costs as much. */
const shortest = 3;

/**
 * Holds every part of [from, to) against the window. A stretch is settled as an interval first: its bound decides all of
 * it where even the worst of it passes or even the best fails; otherwise it is halved, down to single parts.
 */
export function classifyValue(stretch: Stretch, from: number, to: number): void {
  if (from >= to) return;
  if (to - from >= shortest) {
    const decided = decide(stretch, from, to);
    if (decided !== undefined) {
      setStatus(stretch.masks, from, to, stretch.bit, decided);
      return;
    }
    const middle = (from + to) >>> 1;
    classifyValue(stretch, from, middle);
    classifyValue(stretch, middle, to);
    return;
  }
  for (let index = from; index < to; index += 1) {
    const resistance = stretch.resistances[index] ?? NaN;
    stretch.masks.exact += 1;
    const state = settle(stretch.conditions, resistance, resistance);
    setStatus(stretch.masks, index, index + 1, stretch.bit, statusAt(stretch, state, resistance));
  }
}

function statusAt({ conditions, window, atRest }: Stretch, state: OperatingState, nominal: number): Status {
  if (atRest === 'unrated') {
    // What is missing at rest is missing everywhere, but a part that leaves the window with what is known is unmet.
    return state.settled && holds(state.deviation, distanceToEdge(window, nominal)) ? 'unrated' : 'unmet';
  }
  return valueCheck.find({ conditions, state: { ...state, nominal } }).status;
}

/** The status that the whole stretch shares, or undefined where that cannot be told from its ends. */
function decide(stretch: Stretch, from: number, to: number): Status | undefined {
  const { conditions, resistances, window } = stretch;
  const lowest = resistances[from] ?? NaN;
  const highest = resistances[to - 1] ?? NaN;
  // The distance to the window's edge is smallest at one of the ends and largest in the middle of the window.
  const nearest = Math.min(distanceToEdge(window, lowest), distanceToEdge(window, highest));
  if (nearest > 0) {
    const worst = boundInside(conditions, nearest, lowest, highest);
    if (worst !== undefined) {
      const [low, high] = [statusAt(stretch, worst, lowest), statusAt(stretch, worst, highest)];
      const certain = low === 'met' || stretch.atRest === 'unrated';
      if (low === high && low !== 'unmet' && certain) return low;
    }
  }
  const middle = Math.min(highest, Math.max(lowest, (window.lower + window.upper) / 2));
  return allDeviateMore(conditions, lowest, highest, distanceToEdge(window, middle)) ? 'unmet' : undefined;
}

/** A distance (fraction) from which a part cut off by it would dissipate far more than one that deviates as parts do. */
const wide = 0.1;

/**
 * A state that no part of an interval of resistance (Ω) passes and that stays inside a distance (fraction), if there is
 * one. Settling is monotone: where no more deviation comes out than was put in, no part deviates more.
 */
function boundInside(
  conditions: Conditions,
  distance: number,
  lowest: number,
  highest: number,
): OperatingState | undefined {
  const limit = distance * (1 - 1e-6);
  const step = stepFrom(conditions, distance, lowest, highest);
  if (step.deviation <= limit) return step;
  if (distance < wide) return undefined;
  const state = settle(conditions, lowest, highest);
  return state.settled && state.deviation <= limit ? state : undefined;
}

/** One step of settling over an interval of resistance (Ω): what a deviation leads to at the worst resistance inside. */
function stepFrom(
  conditions: Conditions,
  deviation: number,
  lowest: number,
  highest: number,
): OperatingState {
  const { load, axis, thermal } = conditions;
  const celsius = axis.known ? axis.celsius : NaN;
  const low = lowest * Math.max(0, 1 - deviation);
  const high = highest * (1 + deviation);
  const dissipation = load === undefined ? 0 : worstDissipation(load, low, high);
  const voltage = load === undefined ? 0 : largestVoltage(load, high);
  const hot = celsius + (thermal?.value ?? 0) * dissipation;
  return {
    nominal: lowest,
    low,
    high,
    deviation: deviationAt(conditions, hot, voltage),
    dissipation,
    voltage,
    hot: load === undefined || thermal !== undefined ? hot : NaN,
    hotKnown: hot,
    steps: 1,
    settled: true,
  };
}

/** Steps of settling that are spent on showing that a whole stretch fails; running away shows within fewer. */
const stepsFromBelow = 8;

/**
 * Whether every part of an interval of resistance (Ω) deviates by more than a distance (fraction): a few steps of settling
 * from the unheated part, which all parts reach. Dissipation rises, then falls with the resistance, so inside the interval
 * it is at least the lower of its ends; the voltage never falls.
 */
function allDeviateMore(conditions: Conditions, lowest: number, highest: number, distance: number): boolean {
  const { load, axis, thermal } = conditions;
  const celsius = axis.known ? axis.celsius : NaN;
  const exceeds = (fraction: number): boolean => !holds(fraction * (1 - 1e-9), distance);
  let deviation = deviationAt(conditions, celsius, 0);
  for (let step = 0; step < stepsFromBelow && load !== undefined && !exceeds(deviation); step += 1) {
    const shrink = Math.max(0, 1 - deviation);
    const watt = Math.min(
      worstDissipation(load, lowest * shrink, lowest * (1 + deviation)),
      worstDissipation(load, highest * shrink, highest * (1 + deviation)),
    );
    const voltage = largestVoltage(load, lowest * (1 + deviation));
    const next = deviationAt(conditions, celsius + (thermal?.value ?? 0) * watt, voltage);
    if (next <= deviation * 1.001) return exceeds(next);
    deviation = next;
  }
  return exceeds(deviation);
}
