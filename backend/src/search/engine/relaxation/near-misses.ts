import type { AskedCheck } from '@resistry/engineering/range-search/asked-checks';
import type { Unit } from './retrial';

/**
 * A unit that the search does not count as met, with the checks that are unmet in every operating mode; none for one
 * that is unrated, which a loosened demand can make met as well.
 */
export interface Miss {
  unit: Unit;
  unmet: number;
}

/** Bits of the checks whose answer can depend on a field of the duty. */
export function bitsDependingOn(checks: readonly AskedCheck[], pointer: string): number {
  return checks
    .filter(({ definition }) =>
      definition.dependsOn.some((field) => pointer === field || pointer.startsWith(`${field}/`)),
    )
    .reduce((bits, { bit }) => bits | bit, 0);
}

/** The units whose unmet checks all depend on a field. */
export function missesDependingOn(misses: readonly Miss[], bits: number): Unit[] {
  return misses.filter(({ unmet }) => (unmet & ~bits) === 0).map(({ unit }) => unit);
}
