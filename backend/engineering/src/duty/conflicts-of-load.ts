import { formatQuantity } from '../notation/format-quantity';
import type { Duty } from './duty';
import type { Conflict } from './duty-conflict';
import type { SteadyLoad } from './steady-load';

/**
 * Whether any resistance (Ω) inside the window lets all bounds of the load hold together.
 * A voltage of at least U and a current of at most I need R ≥ U/I, and so on for each pair (Ohm, Joule).
 */
export function conflictsOfLoad(
  duty: Duty,
  load: SteadyLoad,
  window: { lower: number; upper: number } | undefined,
): Conflict[] {
  if (duty.load === undefined || window?.lower === 0) return [];
  const ohm = (value: number): string =>
    Number.isFinite(value) ? formatQuantity(value, 'resistance') : 'more than any resistance';
  const lower = window?.lower ?? 0;
  const upper = window?.upper ?? Infinity;
  const atLeast = [
    { value: least(load.voltageMin, load.currentMax), pointers: ['/load/voltage/min', '/load/current/max'] },
    { value: least(load.voltageMin ** 2, load.powerMax), pointers: ['/load/voltage/min', '/load/power/max'] },
    {
      value: lower,
      pointers: duty.window ? ['/window/lower'] : ['/limits/voltage/max', '/limits/current/max'],
    },
  ];
  const atMost = [
    { value: most(load.voltageMax, load.currentMin), pointers: ['/load/voltage/max', '/load/current/min'] },
    { value: most(load.powerMax, load.currentMin ** 2), pointers: ['/load/power/max', '/load/current/min'] },
    {
      value: upper,
      pointers: duty.window ? ['/window/upper'] : ['/limits/voltage/min', '/limits/current/min'],
    },
  ];
  const conflicts: Conflict[] = [];
  for (const low of atLeast) {
    for (const high of atMost) {
      if (low.value <= high.value * (1 + 1e-9)) continue;
      conflicts.push({
        pointers: [...new Set([...low.pointers, ...high.pointers])],
        message:
          `${words(low.pointers)} need at least ${ohm(low.value)}, ` +
          `but ${words(high.pointers)} allow at most ${ohm(high.value)}: no resistance satisfies both.`,
      });
    }
  }
  if (load.voltageMin * load.currentMin > load.powerMax * (1 + 1e-9)) {
    conflicts.push({
      pointers: ['/load/power/max', '/load/voltage/min', '/load/current/min'],
      message: 'The smallest voltage times the smallest current already exceeds the largest power.',
    });
  }
  return conflicts;
}

/** A quotient as a lower bound: nothing at all, whatever divides it, asks for nothing. */
function least(numerator: number, denominator: number): number {
  return numerator === 0 ? 0 : numerator / denominator;
}

/** A quotient as an upper bound: anything divided by nothing bounds nothing. */
function most(numerator: number, denominator: number): number {
  return denominator === 0 ? Infinity : numerator / denominator;
}

function words(pointers: readonly string[]): string {
  return pointers.map((pointer) => pointer.slice(1).replaceAll('/', ' ')).join(' with ');
}
