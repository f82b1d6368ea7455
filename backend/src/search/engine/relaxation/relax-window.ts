import type { Duty } from '@resistry/engineering/duty/duty';
import type { Relaxation } from '../search-plan';
import { roundedOutward, withValueAt } from './relaxable-fields';
import type { Retrial, Unit } from './retrial';

/** Interval that a unit's resistance takes over life, Ω. */
export type LifeInterval = (unit: Unit) => { low: number; high: number };

/** Units that are tried for the edge of the window nearest to them. */
const tried = 64;

/**
 * The smallest widening of the window at one edge that brings a unit back: the nearest resistance over life that only
 * that edge keeps out.
 */
export function relaxWindow(
  duty: Duty,
  edge: 'lower' | 'upper',
  units: readonly Unit[],
  lifeOf: LifeInterval,
  retrial: Retrial,
): Relaxation | undefined {
  const window = duty.window;
  if (window === undefined || window.lower === 0) return undefined;
  const field = { direction: edge === 'upper' ? 'up' : 'down', scale: 'digits' } as const;
  const needed = units
    .map((unit) => ({ unit, life: lifeOf(unit) }))
    .filter(({ life }) => (edge === 'upper' ? life.low >= window.lower : life.high <= window.upper))
    .map(({ unit, life }) => ({ unit, value: edge === 'upper' ? life.high : life.low }))
    .filter(({ value }) => (edge === 'upper' ? value > window.upper : value > 0 && value < window.lower))
    .sort((first, second) => (edge === 'upper' ? first.value - second.value : second.value - first.value));
  const pointer = `/window/${edge}`;
  for (const { unit, value } of needed.slice(0, tried)) {
    const to = roundedOutward(field, value, edge === 'upper' ? Infinity : Number.MIN_VALUE);
    const loosened = withValueAt(duty, pointer, to);
    if (!retrial.meets(loosened, unit)) continue;
    const within = needed.filter((other) =>
      edge === 'upper' ? other.value <= to * (1 + 1e-6) : other.value >= to * (1 - 1e-6),
    );
    return {
      field: pointer,
      to,
      gains: retrial.count(
        loosened,
        within.map((other) => other.unit),
      ),
    };
  }
  return undefined;
}
