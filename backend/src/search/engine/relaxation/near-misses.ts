import type { AskedCheck } from '@resistry/engineering/range-search/asked-checks';
import type { Evaluation } from '../evaluation';
import type { Scope } from '../scope';

/**
 * Units that a search does not count as met: each with the checks that are unmet in every operating mode. One that is
 * unrated has none, and a loosened demand can make it met as well.
 */
export class NearMisses {
  private readonly units: number[] = [];
  private readonly masks: number[] = [];

  constructor(scope: Scope, { scratch }: Evaluation, interval?: { lower: number; upper: number }) {
    const { masks, unmetInEveryMode } = scratch;
    scope.forEach((unit) => {
      let removed = 0;
      let common = 0;
      for (const position of scope.positionsOf(unit)) {
        removed |= (masks.unmet[position] ?? 0) | (masks.unrated[position] ?? 0);
        common |= unmetInEveryMode[position] ?? 0;
      }
      if (removed === 0) return;
      this.units.push(unit);
      this.masks.push(common);
    }, interval);
  }

  /** The units whose unmet checks are all among these. */
  within(bits: number): number[] {
    return this.units.filter((_, place) => ((this.masks[place] ?? 0) & ~bits) === 0);
  }

  /** The units that these checks, and only these, remove. */
  removedOnlyBy(bits: number): number[] {
    return this.units.filter(
      (_, place) => this.masks[place] !== 0 && ((this.masks[place] ?? 0) & ~bits) === 0,
    );
  }
}

/** Bits of the checks whose answer can depend on a field of the duty. */
export function bitsDependingOn(checks: readonly AskedCheck[], pointer: string): number {
  return checks
    .filter(({ definition }) =>
      definition.dependsOn.some((field) => pointer === field || pointer.startsWith(`${field}/`)),
    )
    .reduce((bits, { bit }) => bits | bit, 0);
}
