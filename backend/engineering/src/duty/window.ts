import { formatQuantity } from '../notation/format-quantity';
import type { Duty } from './duty';
import type { Conflict } from './duty-conflict';

/** The resistance window over life, Ω; upper may be Infinity where the limits bound it only from below. */
export interface Window {
  lower: number;
  upper: number;
  nominal?: number;
}

/**
 * The window a duty asks for: its own, or lower = U_max/I_max and upper = U_min/I_min of its limits.
 * Conflicts are pushed to the list, with what would make the limits possible.
 * @returns undefined where the duty asks for no window or its window is in conflict
 */
export function windowOf(duty: Duty, conflicts: Conflict[]): Window | undefined {
  if (duty.window !== undefined && duty.limits !== undefined) {
    conflicts.push({
      pointers: ['/window', '/limits'],
      message: 'State either a resistance window or limits of voltage and current, not both.',
    });
    return undefined;
  }
  if (duty.window !== undefined) return statedWindow(duty.window, conflicts);
  if (duty.limits !== undefined) return windowOfLimits(duty.limits, conflicts);
  return undefined;
}

function statedWindow(window: Window, conflicts: Conflict[]): Window | undefined {
  const before = conflicts.length;
  if (window.lower < 0) {
    conflicts.push({ pointers: ['/window/lower'], message: 'The lowest resistance is negative.' });
  }
  if (window.upper <= 0) {
    conflicts.push({ pointers: ['/window/upper'], message: 'The highest resistance must be above 0 Ω.' });
  }
  if (window.lower > window.upper) {
    conflicts.push({
      pointers: ['/window/lower', '/window/upper'],
      message: `The lowest resistance (${formatQuantity(window.lower, 'resistance')}) is above the highest (${formatQuantity(window.upper, 'resistance')}).`,
    });
  }
  if (window.nominal !== undefined && (window.nominal < window.lower || window.nominal > window.upper)) {
    const edge = window.nominal < window.lower ? 'lower' : 'upper';
    conflicts.push({
      pointers: ['/window/nominal', `/window/${edge}`],
      message: 'The nominal resistance lies outside its own window.',
    });
  }
  return conflicts.length > before ? undefined : window;
}

function windowOfLimits(limits: NonNullable<Duty['limits']>, conflicts: Conflict[]): Window | undefined {
  const before = conflicts.length;
  for (const side of ['voltage', 'current'] as const) {
    const { min, max } = limits[side];
    if (min < 0) {
      conflicts.push({
        pointers: [`/limits/${side}/min`],
        message: `Limits of ${side} are magnitudes: not below 0.`,
      });
    }
    if (min > max) {
      conflicts.push({
        pointers: [`/limits/${side}/min`, `/limits/${side}/max`],
        message: `The smallest ${side} is above the largest.`,
      });
    }
  }
  if (conflicts.length > before) return undefined;
  const { voltage, current } = limits;
  if (current.max === 0) {
    conflicts.push({
      pointers: ['/limits/current/max'],
      message: 'A largest current of 0 A leaves no resistance.',
    });
    return undefined;
  }
  const lower = voltage.max / current.max;
  const upper = current.min === 0 ? Infinity : voltage.min / current.min;
  if (lower > upper * (1 + 1e-12)) {
    const widest = formatQuantity((current.max * voltage.min) / voltage.max, 'current');
    const needed =
      voltage.min > 0 ? formatQuantity((voltage.max * current.min) / voltage.min, 'current') : undefined;
    conflicts.push({
      pointers: ['/limits/voltage', '/limits/current'],
      message:
        `At the largest voltage the part must be at least ${formatQuantity(lower, 'resistance')}, at the smallest ` +
        `at most ${formatQuantity(upper, 'resistance')}: empty. A smallest current of ${widest} or less` +
        (needed === undefined
          ? ' would make it possible.'
          : `, or a largest of ${needed} or more, would make it possible.`),
    });
    return undefined;
  }
  return { lower, upper: Math.max(lower, upper) };
}
