import type { Duty } from '@resistry/engineering/duty/duty';
import type { Relaxation } from '../search-plan';
import { roundedOutward, withValueAt } from './relaxable-fields';
import type { Retrial } from './retrial';
import type { Edge, WindowMisses } from './window-misses';

/** Resistance of a unit, and the narrowest interval it takes over life, Ω. */
export interface Reach {
  /** Ends over the positions of the unit, at delivery. */
  nominal(unit: number): { low: number; high: number };
  /** Ends over life. */
  life(unit: number): { low: number; high: number };
}

/** Units that are tried before the edge is given up: those nearest to it lack something else. */
const tried = 64;

/**
 * The smallest widening of the window at one edge that brings a unit back. A unit needs at least its nominal resistance
 * inside, so units are looked at from the edge outwards, and no farther than the best found so far.
 */
export function relaxWindow(
  duty: Duty,
  edge: Edge,
  misses: WindowMisses,
  reach: Reach,
  retrial: Retrial,
): Relaxation | undefined {
  const window = duty.window;
  if (window === undefined || window.lower === 0) return undefined;
  const sign = edge === 'upper' ? 1 : -1;
  const outer = (ends: { low: number; high: number }): number => (edge === 'upper' ? ends.high : ends.low);
  const byNominal = misses
    .nearest(edge)
    .map((unit) => ({ unit, nominal: reach.nominal(unit) }))
    .filter(({ nominal }) => (edge === 'upper' ? nominal.low >= window.lower : nominal.high <= window.upper))
    .map(({ unit, nominal }) => ({ unit, nominal: outer(nominal) }))
    .sort((first, second) => sign * (first.nominal - second.nominal));
  const field = { direction: edge === 'upper' ? 'up' : 'down', scale: 'digits' } as const;
  const pointer = `/window/${edge}`;
  let best: number | undefined;
  let tries = 0;
  for (const { unit, nominal } of byNominal) {
    if (tries >= tried || (best !== undefined && sign * (nominal - best) > 0)) break;
    const life = reach.life(unit);
    const keptByOther = edge === 'upper' ? life.low < window.lower : life.high > window.upper;
    const needed = outer(life);
    if (keptByOther || !Number.isFinite(needed) || needed <= 0 || sign * (needed - window[edge]) <= 0)
      continue;
    const to = roundedOutward(field, needed, edge === 'upper' ? Infinity : Number.MIN_VALUE);
    if (best !== undefined && sign * (to - best) >= 0) continue;
    tries += 1;
    if (retrial.met(withValueAt(duty, pointer, to), [unit]).length === 1) best = to;
  }
  if (best === undefined) return undefined;
  const gains = retrial.met(withValueAt(duty, pointer, best), misses.within(edge, best)).length;
  return { field: pointer, to: best, gains };
}
