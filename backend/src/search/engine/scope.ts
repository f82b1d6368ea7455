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
  private readonly accepts: ((position: number) => boolean) | undefined;
  private readonly numbers: ReadonlySet<number>;

  constructor(
    private readonly index: CatalogueIndex,
    private readonly plan: SearchPlan,
  ) {
    this.rows = index.rows.filter(rowFilter(index, plan.filters));
    this.accepts = partFilter(index, plan.filters);
    this.numbers = plan.byCompanyNumber ? this.acceptedNumbers() : new Set();
  }

  /** The positions that decide about a unit. */
  positionsOf(unit: number): readonly number[] {
    return this.plan.byCompanyNumber ? judgedSources(this.index, unit) : [unit];
  }

  /** Calls back for every unit, or for those whose parts lie in an interval of resistance (Ω). */
  forEach(
    visit: (unit: number) => void,
    interval: { lower: number; upper: number } = { lower: -1, upper: Infinity },
  ): void {
    const { resistance } = this.index.columns;
    if (this.plan.byCompanyNumber) {
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
        if (this.accepts === undefined || this.accepts(position)) visit(position);
      }
    }
  }

  private acceptedNumbers(): Set<number> {
    const numbers = new Set<number>();
    const { company } = this.index.columns;
    for (const { from, to } of this.rows) {
      for (let position = from; position < to; position += 1) {
        const number = company[position] ?? -1;
        if (number >= 0 && (this.accepts === undefined || this.accepts(position))) numbers.add(number);
      }
    }
    return numbers;
  }
}
