import type { Difference } from './differences';

export const shortfallSenses = ['worse', 'different', 'unknown'] as const;

/** A rating in which a replacement is less than the part, or of which that cannot be said. */
export interface Shortfall extends Difference {
  /** `unknown`: the replacement, or the part, does not state it. */
  sense: (typeof shortfallSenses)[number];
}

export const judgements = ['equal', 'undecided', 'lesser'] as const;
/** Whether a replacement is of equal form, fit and function; `undecided` where a rating that counts is not stated. */
export type Judgement = (typeof judgements)[number];

export function judgementOf(shortfalls: readonly Shortfall[]): Judgement {
  if (shortfalls.some(({ sense }) => sense !== 'unknown')) return 'lesser';
  return shortfalls.length === 0 ? 'equal' : 'undecided';
}
