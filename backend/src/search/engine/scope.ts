import { firstAbove, firstNotBelow } from '@resistry/engineering/range-search/row-masks';
import type { CatalogueRow } from '../index/catalogue-columns';
import type { CatalogueIndex } from '../index/catalogue-index';
import { judgedSources } from './company-numbers';
import { partFilter } from './part-filter';
import { rowFilter } from './row-filter';
import type { SearchPlan } from './search-plan';

/**
 * What a search counts: the parts that the filters accept, or the company part numbers with at least one such part. A unit
 * is the position of a part, or of a company part number, which stands for all the sources it is judged by.
 */
export class Scope {
  readonly rows: readonly CatalogueRow[];
  private readonly filter: ((position: number) => boolean) | undefined;
  private readonly numbers: ReadonlySet<number>;

  readonly byCompanyNumber: boolean;

  constructor(
    private readonly index: CatalogueIndex,
    plan: SearchPlan,
  ) {
    this.byCompanyNumber = plan.byCompanyNumber;
    this.rows = index.rows.filter(rowFilter(index, plan.filters));
    this.filter = partFilter(index, plan.filters);
    this.numbers = plan.byCompanyNumber ? this.acceptedNumbers() : new Set();
  }

  /** Whether the filters accept the part at a position of an accepted row. */
  accepts(position: number): boolean {
    return this.filter === undefined || this.filter(position);
  }

  /** How many parts at [from, to) of an accepted row the filters accept. */
  countAccepted(from: number, to: number): number {
    if (this.filter === undefined) return to - from;
    let count = 0;
    for (let position = from; position < to; position += 1) if (this.filter(position)) count += 1;
    return count;
  }

  /** The positions that decide about a unit. */
  positionsOf(unit: number): readonly number[] {
    return this.byCompanyNumber ? judgedSources(this.index, unit) : [unit];
  }

  /** Whether all the positions that decide about a unit hold; the first that does not ends it. */
  everyPosition(unit: number, holds: (position: number) => boolean): boolean {
    return this.byCompanyNumber ? judgedSources(this.index, unit).every(holds) : holds(unit);
  }

  /** Calls back for the positions that decide about a unit. */
  forEachPosition(unit: number, visit: (position: number) => void): void {
    if (this.byCompanyNumber) judgedSources(this.index, unit).forEach(visit);
    else visit(unit);
  }

  /** Calls back for every unit, or for those whose parts lie in an interval of resistance (Ω). */
  forEach(
    visit: (unit: number) => void,
    interval: { lower: number; upper: number } = { lower: -1, upper: Infinity },
  ): void {
    const { resistance } = this.index.columns;
    if (this.byCompanyNumber) {
      for (const number of this.numbers) {
        const inside = judgedSources(this.index, number).every((position) => {
          const ohm = resistance[position] ?? NaN;
          return ohm >= interval.lower && ohm <= interval.upper;
        });
        if (inside) visit(number);
      }
      return;
    }
    for (const { from, to } of this.rows) {
      const first = firstNotBelow(resistance, from, to, interval.lower);
      const last = firstAbove(resistance, first, to, interval.upper);
      for (let position = first; position < last; position += 1) {
        if (this.accepts(position)) visit(position);
      }
    }
  }

  private acceptedNumbers(): Set<number> {
    const numbers = new Set<number>();
    const { company } = this.index.columns;
    for (const { from, to } of this.rows) {
      for (let position = from; position < to; position += 1) {
        const number = company[position] ?? -1;
        if (number >= 0 && this.accepts(position)) numbers.add(number);
      }
    }
    return numbers;
  }
}
