import { valueCheck } from '../checks/value';
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

function statusAt({ conditions }: Stretch, state: OperatingState, nominal: number): Status {
  return valueCheck.find({ conditions, state: { ...state, nominal } }).status;
}

/** The status that the whole stretch shares, or undefined where that cannot be told from its ends. */
function decide(stretch: Stretch, from: number, to: number): Status | undefined {
  const { conditions, resistances, window } = stretch;
  const lowest = resistances[from] ?? NaN;
  const highest = resistances[to - 1] ?? NaN;
  const worst = settle(conditions, lowest, highest);
  if (worst.settled) {
    // The distance to the window's edge is smallest at one of the ends.
    const atEnds = [statusAt(stretch, worst, lowest), statusAt(stretch, worst, highest)] as const;
    if (atEnds[0] === 'met' && atEnds[1] === 'met') return 'met';
    if (stretch.atRest === 'unrated' && atEnds[0] !== 'unmet' && atEnds[1] !== 'unmet') return 'unrated';
  }
  const atLowest = settle(conditions, lowest, lowest);
  const atHighest = settle(conditions, highest, highest);
  const load = conditions.load;
  if (!atLowest.settled || !atHighest.settled) {
    // By voltage alone the load falls with resistance, by current alone it rises: then one end speaks for all.
    if (load?.currentMax === Infinity && !atHighest.settled && load.powerMax === Infinity) return 'unmet';
    if (load?.voltageMax === Infinity && !atLowest.settled && load.powerMax === Infinity) return 'unmet';
    return undefined;
  }
  // Dissipation rises, then falls with resistance, so inside it is at least the lower of its ends; voltage never falls.
  const coolest = Math.min(atLowest.hotKnown, atHighest.hotKnown);
  const least: OperatingState = {
    ...atLowest,
    deviation: deviationAt(conditions, coolest, atLowest.voltage) * (1 - 1e-9),
  };
  const farthest = Math.min(highest, Math.max(lowest, (window.lower + window.upper) / 2));
  return statusAt(stretch, least, farthest) === 'unmet' ? 'unmet' : undefined;
}
