import { firstAbove, firstNotBelow } from '@resistry/engineering/range-search/row-masks';
import type { CatalogueIndex } from '../../index/catalogue-index';
import type { Evaluation, RowOutcome } from '../evaluation';
import type { Scope } from '../scope';
import { unmetStanding } from '../standing-masks';
import type { NearMisses } from './near-misses';

export type Edge = 'lower' | 'upper';

/** Units that a window keeps out, as one of its edges is moved. */
export interface WindowMisses {
  /** Those that nothing but the window removes and of which each could be the nearest to an edge. */
  nearest(edge: Edge): number[];
  /** All that a window with its edge moved to `to` (Ω) could bring back. */
  within(edge: Edge, to: number): number[];
}

/** Parts: those inside the window that its edge cuts off over life, and in every row the first ones beyond it. */
export class PartsOutside implements WindowMisses {
  constructor(
    private readonly index: CatalogueIndex,
    private readonly scope: Scope,
    private readonly evaluation: Evaluation,
  ) {}

  nearest(edge: Edge): number[] {
    const found: number[] = [];
    for (const outcome of this.evaluation.outcomes) {
      if (outcome.isUnrated) continue;
      for (let position = outcome.from; position < outcome.to; position += 1) {
        if (!this.isCutByOther(edge, outcome, position) && this.isMiss(position)) found.push(position);
      }
      const outside = this.firstOutside(edge, outcome);
      if (outside !== undefined) found.push(outside);
    }
    return found;
  }

  within(edge: Edge, to: number): number[] {
    const { resistance } = this.index.columns;
    const found: number[] = [];
    for (const outcome of this.evaluation.outcomes) {
      if (outcome.isUnrated && outcome.row.modes.length === 1) continue;
      for (let position = outcome.from; position < outcome.to; position += 1) {
        if (this.isMiss(position)) found.push(position);
      }
      const { row } = outcome;
      const [first, last] =
        edge === 'upper'
          ? [outcome.to, firstAbove(resistance, outcome.to, row.to, to)]
          : [firstNotBelow(resistance, row.from, outcome.from, to), outcome.from];
      for (let position = first; position < last; position += 1)
        if (this.couldStand(position)) found.push(position);
    }
    return found;
  }

  /** Whether the tolerance alone reaches past the edge that is not moved. */
  private isCutByOther(edge: Edge, { row }: RowOutcome, position: number): boolean {
    const { window } = this.evaluation.requirement;
    const ohm = this.index.columns.resistance[position] ?? NaN;
    const tolerance = row.tolerance ?? 0;
    if (window === undefined) return true;
    return edge === 'upper' ? ohm * (1 - tolerance) < window.lower : ohm * (1 + tolerance) > window.upper;
  }

  private firstOutside(edge: Edge, { from, to, passingOutside }: RowOutcome): number | undefined {
    if (edge === 'upper') {
      for (let place = 0; place < passingOutside.length; place += 2) {
        const last = passingOutside[place + 1] ?? 0;
        for (let position = Math.max(to, passingOutside[place] ?? 0); position < last; position += 1)
          if (this.couldStand(position)) return position;
      }
      return undefined;
    }
    for (let place = passingOutside.length - 2; place >= 0; place -= 2) {
      const first = passingOutside[place] ?? 0;
      for (
        let position = Math.min(from, passingOutside[place + 1] ?? 0) - 1;
        position >= first;
        position -= 1
      )
        if (this.couldStand(position)) return position;
    }
    return undefined;
  }

  /** Whether nothing but the window removes a part that was judged. */
  private isMiss(position: number): boolean {
    const { valueBit, scratch } = this.evaluation;
    return (
      scratch.masks.unmet[position] !== 0 &&
      scratch.unmetInEveryMode[position] === valueBit &&
      this.scope.accepts(position)
    );
  }

  private couldStand(position: number): boolean {
    return (
      unmetStanding(this.index.columns, this.evaluation.standing, position) === 0 &&
      this.scope.accepts(position)
    );
  }
}

/** Company part numbers: few enough to look at each. */
export class NumbersOutside implements WindowMisses {
  private readonly numbers: number[];

  constructor(misses: NearMisses, valueBit: number) {
    this.numbers = misses.removedOnlyBy(valueBit);
  }

  nearest(): number[] {
    return this.numbers;
  }

  within(): number[] {
    return this.numbers;
  }
}
