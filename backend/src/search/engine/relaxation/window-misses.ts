import { insideWindow } from '@resistry/engineering/range-search/evaluate-row';
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

/** Parts: those that were judged, and in every row the first ones beyond them that nothing but the window removes. */
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
        if (this.isMiss(position)) found.push(position);
      }
      const outside = edge === 'upper' ? this.firstAbove(outcome) : this.lastBelow(outcome);
      if (outside !== undefined) found.push(outside);
    }
    return found;
  }

  within(edge: Edge, to: number): number[] {
    const { resistance } = this.index.columns;
    const { window } = this.evaluation.requirement;
    if (window === undefined) return [];
    const moved = { ...window, [edge]: to };
    const found: number[] = [];
    for (const { row, from, to: end, isUnrated, passingOutside } of this.evaluation.outcomes) {
      const single = row.modes.length === 1;
      if (isUnrated && single) continue;
      const [first, last] = insideWindow(moved, row.tolerance ?? 0, resistance, row.from, row.to);
      for (let position = Math.max(first, from); position < Math.min(last, end); position += 1)
        if (this.isMiss(position)) found.push(position);
      // In a second operating mode another stretch may pass, which nobody has looked at.
      const outside = single ? passingOutside : [row.from, from, end, row.to];
      for (let place = 0; place < outside.length; place += 2) {
        const stretchEnd = Math.min(last, outside[place + 1] ?? 0);
        for (let position = Math.max(first, outside[place] ?? 0); position < stretchEnd; position += 1)
          if (this.couldStand(position)) found.push(position);
      }
    }
    return found;
  }

  /** The first part above the judged ones that the lower edge leaves alone. */
  private firstAbove({ row, to, passingOutside }: RowOutcome): number | undefined {
    const { window } = this.evaluation.requirement;
    if (window === undefined) return undefined;
    const uncut = { lower: window.lower, upper: Infinity };
    const [first] = insideWindow(uncut, row.tolerance ?? 0, this.index.columns.resistance, row.from, row.to);
    for (let place = 0; place < passingOutside.length; place += 2) {
      const last = passingOutside[place + 1] ?? 0;
      for (let position = Math.max(first, to, passingOutside[place] ?? 0); position < last; position += 1)
        if (this.couldStand(position)) return position;
    }
    return undefined;
  }

  /** The last part below the judged ones that the upper edge leaves alone. */
  private lastBelow({ row, from, passingOutside }: RowOutcome): number | undefined {
    const { window } = this.evaluation.requirement;
    if (window === undefined) return undefined;
    const uncut = { lower: 0, upper: window.upper };
    const [, end] = insideWindow(uncut, row.tolerance ?? 0, this.index.columns.resistance, row.from, row.to);
    for (let place = passingOutside.length - 2; place >= 0; place -= 2) {
      const first = passingOutside[place] ?? 0;
      const last = Math.min(end, from, passingOutside[place + 1] ?? 0) - 1;
      for (let position = last; position >= first; position -= 1)
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
    this.numbers = misses.removedOnlyBy(valueBit).toArray();
  }

  nearest(): number[] {
    return this.numbers;
  }

  within(): number[] {
    return this.numbers;
  }
}
