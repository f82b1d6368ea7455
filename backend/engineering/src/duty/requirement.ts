import { conflictsOfLoad } from './conflicts-of-load';
import type { Duty, Interval } from './duty';
import { DutyConflict, type Conflict } from './duty-conflict';
import { refusalsOf } from './refusals';
import { largestCurrent, largestVoltage, worstDissipation, type SteadyLoad } from './steady-load';
import { windowOf, type Window } from './window';

/** What follows from a duty: the duty itself, its window and steady load, and the quantities they imply (SI). */
export interface Requirement {
  duty: Duty;
  /** Ω that the value check holds a part to; absent where the duty asks for no window. */
  window?: Window;
  /** True where the window's lower end is 0: a zero-ohm link is asked for. */
  link: boolean;
  /** Absent where nothing steady is stated. */
  load?: SteadyLoad;
}

/**
 * Derives the requirement of a duty.
 * @throws DutyConflict naming the fields, where the duty is contradictory, empty or impossible
 */
export function requirementOf(duty: Duty): Requirement {
  const conflicts: Conflict[] = refusalsOf(duty);
  if (conflicts.length > 0) throw new DutyConflict(conflicts);
  const window = windowOf(duty, conflicts);
  const load = loadOf(duty);
  if (load !== undefined) conflicts.push(...conflictsOfLoad(duty, load, window));
  if (conflicts.length > 0) throw new DutyConflict(conflicts);
  return { duty, window, link: window?.lower === 0, load };
}

function loadOf(duty: Duty): SteadyLoad | undefined {
  const stated = duty.load ?? duty.limits;
  if (stated === undefined) return undefined;
  const voltage = magnitudes(stated.voltage);
  const current = magnitudes(stated.current);
  const powerMax = duty.load?.power?.max;
  if (voltage === undefined && current === undefined && powerMax === undefined) return undefined;
  return {
    voltageMin: voltage?.min ?? 0,
    voltageMax: voltage?.max ?? Infinity,
    currentMin: current?.min ?? 0,
    currentMax: current?.max ?? Infinity,
    powerMax: powerMax ?? Infinity,
  };
}

/** Signs are allowed in a load; the larger magnitude counts, and an interval across zero reaches down to zero. */
function magnitudes(interval: Interval | undefined): Interval | undefined {
  if (interval === undefined) return undefined;
  const ends = [Math.abs(interval.min), Math.abs(interval.max)] as const;
  const spansZero = interval.min < 0 && interval.max > 0;
  return { min: spansZero ? 0 : Math.min(...ends), max: Math.max(...ends) };
}

/** Quantities a requirement implies, V, A, W; a field is absent where nothing bounds it. */
export interface ImpliedQuantities {
  /** Ω; from the duty, or where it states none from two of voltage, current and power. */
  window?: { lower: number; upper?: number; nominal?: number };
  voltage?: { min: number; max?: number };
  current?: { min: number; max?: number };
  dissipation?: number;
}

/**
 * Any two of voltage, current, resistance and power give the others, the ends of intervals included (Ohm, Joule):
 * the interval that each can take while all stated bounds hold.
 */
export function impliedQuantities(requirement: Requirement): ImpliedQuantities {
  const { window, load } = requirement;
  const finite = (value: number): number | undefined => (Number.isFinite(value) ? value : undefined);
  const stated = window && { ...window, upper: finite(window.upper) };
  if (load === undefined) return { window: stated };
  const lower =
    window?.lower ??
    Math.max(quotient(load.voltageMin, load.currentMax, 0), quotient(load.voltageMin ** 2, load.powerMax, 0));
  const upper =
    window?.upper ??
    Math.min(
      quotient(load.voltageMax, load.currentMin, Infinity),
      quotient(load.powerMax, load.currentMin ** 2, Infinity),
    );
  const implied =
    window === undefined && (lower > 0 || upper < Infinity) ? { lower, upper: finite(upper) } : stated;
  return {
    window: implied,
    voltage: {
      min: Math.max(load.voltageMin, load.currentMin * lower),
      max: finite(upper === Infinity ? load.voltageMax : largestVoltage(load, upper)),
    },
    current: {
      min: Math.max(load.currentMin, upper === 0 ? 0 : load.voltageMin / upper),
      max: finite(lower === 0 && load.currentMax === Infinity ? Infinity : largestCurrent(load, lower)),
    },
    dissipation: finite(worstDissipation(load, lower, upper)),
  };
}

/** A quotient; where both are nothing it bounds nothing, which is 0 from below and Infinity from above. */
function quotient(numerator: number, denominator: number, unbounded: number): number {
  return numerator === 0 && denominator === 0 ? unbounded : numerator / denominator;
}
