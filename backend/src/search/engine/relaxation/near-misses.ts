import type { AskedCheck } from '@resistry/engineering/range-search/asked-checks';
import type { Evaluation } from '../evaluation';
import type { Scope } from '../scope';
import { Units } from './units';

/**
 * Units that a search does not count as met, by the checks that are unmet in every operating mode. One that is unrated has
 * none, and a loosened demand can make it met as well.
 */
export class NearMisses {
  private readonly unitsByMask = new Map<number, number[]>();

  constructor(scope: Scope, evaluation: Evaluation, extent: 'everywhere' | 'inside the window') {
    const { masks, unmetInEveryMode } = evaluation.scratch;
    let removed = 0;
    let common = 0;
    const lookAt = (position: number): void => {
      removed |= (masks.unmet[position] ?? 0) | (masks.unrated[position] ?? 0);
      common |= unmetInEveryMode[position] ?? 0;
    };
    const keep = (unit: number): void => {
      removed = 0;
      common = 0;
      scope.forEachPosition(unit, lookAt);
      if (removed === 0) return;
      const units = this.unitsByMask.get(common);
      if (units === undefined) this.unitsByMask.set(common, [unit]);
      else units.push(unit);
    };
    if (scope.byCompanyNumber) {
      scope.forEach(keep, extent === 'everywhere' ? undefined : evaluation.requirement.window);
    } else {
      for (const { from, to } of evaluation.outcomes) {
        for (let position = from; position < to; position += 1) if (scope.accepts(position)) keep(position);
      }
    }
  }

  /** The units whose unmet checks are all among these. */
  within(bits: number): Units {
    return this.unitsWhere((mask) => (mask & ~bits) === 0);
  }

  /** The units that these checks, and only these, remove. */
  removedOnlyBy(bits: number): Units {
    return this.unitsWhere((mask) => mask !== 0 && (mask & ~bits) === 0);
  }

  private unitsWhere(wanted: (mask: number) => boolean): Units {
    return new Units([...this.unitsByMask].flatMap(([mask, units]) => (wanted(mask) ? [units] : [])));
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
