import type { Finding } from './check';

/**
 * Relative slack of a comparison: it absorbs the rounding of floating-point arithmetic (a 5 % part in a window of exactly
 * ±5 % is met) and is a million times finer than any rating is known.
 */
export const comparisonSlack = 1e-9;

/** Whether a demand stays inside an allowance, both in the same unit. */
export function holds(demand: number, allowance: number): boolean {
  return demand <= allowance + comparisonSlack * Math.max(Math.abs(allowance), Math.abs(demand) * 1e-3);
}

/** A finding of two known numbers. */
export function compared(demand: number, allowance: number): Finding {
  return {
    demand,
    allowance,
    margin: demand === 0 ? null : allowance / demand - 1,
    status: holds(demand, allowance) ? 'met' : 'unmet',
    missing: [],
  };
}

/** A finding that lacks data; whatever is known is kept beside it. */
export function unrated(
  missing: readonly string[],
  demand: number | null = null,
  allowance: number | null = null,
): Finding {
  return { demand, allowance, margin: null, status: 'unrated', missing };
}

/** A yes-or-no finding. */
export function yesOrNo(
  met: boolean,
  demand: number | null = null,
  allowance: number | null = null,
): Finding {
  return { demand, allowance, margin: null, status: met ? 'met' : 'unmet', missing: [] };
}

/** A demand that no number bounds: the state does not settle, so nothing can be allowed. */
export function beyondBounds(allowance: number | null): Finding {
  return { demand: null, allowance, margin: null, status: 'unmet', missing: [] };
}

/** Why a check that the duty asks for cannot be answered by this version. */
export function notComputed(what: string): string {
  return `${what}: this check is not computed in this version`;
}
