import type { AskedCheck } from '@resistry/engineering/range-search/asked-checks';
import type { Knockout } from './search-plan';

/** Counts masks of unmet checks, and keeps the positions that no check removes. */
export class Tally {
  /** How many were seen with each mask of unmet checks. */
  private readonly byMask: Int32Array;
  /** Positions without an unmet check: met, and unrated apart. */
  readonly met: number[] = [];
  readonly unrated: number[] = [];

  /** Seen with `value` and something else unmet, counted without the rest of their masks. */
  private removedByValueAndMore = 0;

  constructor(private readonly checks: readonly AskedCheck[]) {
    this.byMask = new Int32Array(1 << checks.length);
  }

  add(position: number, unmet: number, unrated: number): void {
    this.byMask[unmet] = (this.byMask[unmet] ?? 0) + 1;
    if (unmet !== 0) return;
    if (unrated === 0) this.met.push(position);
    else this.unrated.push(position);
  }

  /** Counts what `value` removes without looking at the rest. @param alone those of them that nothing else removes */
  addRemovedByValue(valueBit: number, count: number, alone: number): void {
    this.byMask[valueBit] = (this.byMask[valueBit] ?? 0) + alone;
    this.removedByValueAndMore += count - alone;
  }

  /**
   * How many each check removes, and how many of those nothing else removes. `value` counts over everything that was
   * seen, every other check over what `value` does not remove.
   */
  knockouts(): Knockout[] {
    const valueBit = this.checks.find(({ definition }) => definition.name === 'value')?.bit ?? 0;
    const removes = new Map<number, number>([[valueBit, this.removedByValueAndMore]]);
    for (let mask = 1; mask < this.byMask.length; mask += 1) {
      const count = this.byMask[mask] ?? 0;
      if (count === 0) continue;
      for (const { bit } of this.checks) {
        const counts = (mask & bit) !== 0 && (bit === valueBit || (mask & valueBit) === 0);
        if (counts) removes.set(bit, (removes.get(bit) ?? 0) + count);
      }
    }
    return this.checks.map(({ definition, bit }) => ({
      check: definition.name,
      removes: removes.get(bit) ?? 0,
      removesAlone: this.byMask[bit] ?? 0,
    }));
  }
}
