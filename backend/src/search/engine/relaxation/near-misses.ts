import { distanceToEdge } from '@resistry/engineering/checks/value';
import type { AskedCheck } from '@resistry/engineering/range-search/asked-checks';
import type { CatalogueIndex } from '../../index/catalogue-index';
import type { Evaluation } from '../evaluation';
import { rowOfPosition } from '../row-of-position';
import type { Scope } from '../scope';

/** More than comparisons forgive. */
const rounding = 1e-6;

/**
 * Units that a search does not count as met, by the checks that are unmet in every operating mode. One that is unrated has
 * none, and a loosened demand can make it met as well.
 */
export class NearMisses {
  private readonly unitsByMask = new Map<number, number[]>();

  /** @param isHopeless what no loosened demand can bring back, to be left out */
  constructor(
    scope: Scope,
    { scratch }: Evaluation,
    interval?: { lower: number; upper: number },
    isHopeless: (position: number) => boolean = () => false,
  ) {
    const { masks, unmetInEveryMode } = scratch;
    let removed = 0;
    let common = 0;
    const lookAt = (position: number): boolean => {
      removed |= (masks.unmet[position] ?? 0) | (masks.unrated[position] ?? 0);
      common |= unmetInEveryMode[position] ?? 0;
      return !isHopeless(position);
    };
    scope.forEach((unit) => {
      removed = 0;
      common = 0;
      if (!scope.everyPosition(unit, lookAt) || removed === 0) return;
      const units = this.unitsByMask.get(common);
      if (units === undefined) this.unitsByMask.set(common, [unit]);
      else units.push(unit);
    }, interval);
  }

  /** The units whose unmet checks are all among these. */
  within(bits: number): number[] {
    return this.unitsWhere((mask) => (mask & ~bits) === 0);
  }

  /** The units that these checks, and only these, remove. */
  removedOnlyBy(bits: number): number[] {
    return this.unitsWhere((mask) => mask !== 0 && (mask & ~bits) === 0);
  }

  private unitsWhere(wanted: (mask: number) => boolean): number[] {
    const found: number[] = [];
    for (const [mask, units] of this.unitsByMask) {
      if (wanted(mask)) for (const unit of units) found.push(unit);
    }
    return found;
  }
}

/** Whether the tolerance of a part at delivery alone takes it out of the window that is asked for, whatever else is. */
export function outsideByTolerance(
  index: CatalogueIndex,
  { requirement, scratch, valueBit }: Evaluation,
): (position: number) => boolean {
  const { window } = requirement;
  if (window === undefined || requirement.link) return () => false;
  return (position) => {
    if (((scratch.unmetInEveryMode[position] ?? 0) & valueBit) === 0) return false;
    const tolerance = rowOfPosition(index.rows, position).tolerance ?? 0;
    const distance = distanceToEdge(window, index.columns.resistance[position] ?? NaN);
    return tolerance > distance + rounding;
  };
}

/** Bits of the checks whose answer can depend on a field of the duty. */
export function bitsDependingOn(checks: readonly AskedCheck[], pointer: string): number {
  return checks
    .filter(({ definition }) =>
      definition.dependsOn.some((field) => pointer === field || pointer.startsWith(`${field}/`)),
    )
    .reduce((bits, { bit }) => bits | bit, 0);
}
