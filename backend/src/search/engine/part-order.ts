import { totalExcess, excessOf } from '@resistry/engineering/assessment/excess';
import { judge } from '@resistry/engineering/assessment/judge';
import { approvals, type Approval } from '@resistry/engineering/ratings/technology';
import type { CatalogueRow } from '../index/catalogue-columns';
import type { CatalogueIndex } from '../index/catalogue-index';
import { candidateAt } from './candidate-at';
import type { Evaluation } from './evaluation';
import { rowOfPosition } from './row-of-position';
import type { SortColumn } from './search-plan';

/** The order of approvals where preference decides. */
const preference: Record<Approval, number> = {
  preferred: 0,
  approved: 1,
  restricted: 2,
  'in-review': 3,
  draft: 4,
  withdrawn: 5,
};
const preferenceByCode = approvals.map((approval) => preference[approval]);

/** Reads the sort keys of single parts; what has to be assessed for one is assessed once. */
export class PartOrder {
  private readonly excesses = new Map<number, { excess: number; margin: number }>();

  constructor(
    private readonly index: CatalogueIndex,
    private readonly evaluation: Evaluation,
  ) {}

  preference(position: number): number {
    return preferenceByCode[this.index.columns.approval[position] ?? 0] ?? 9;
  }

  price(position: number): number {
    return this.index.columns.price[position] ?? Infinity;
  }

  /** Sum of the logarithms of the excesses: how much more than needed is paid for. */
  excess(position: number): number {
    return this.assessed(position).excess;
  }

  /** The number that a column is sorted by; Infinity where there is none, so that it stands last when rising. */
  key(column: SortColumn, position: number): number {
    const { columns } = this.index;
    switch (column) {
      case 'preference':
        return this.preference(position);
      case 'part-number':
        return columns.numberRank[position] ?? Infinity;
      case 'company-part-number': {
        const company = columns.company[position] ?? -1;
        return company < 0 ? Infinity : company;
      }
      case 'resistance':
        return columns.resistance[position] ?? Infinity;
      case 'approval':
        return this.preference(position);
      case 'supply':
        return columns.supply[position] ?? Infinity;
      case 'price':
        return this.price(position);
      case 'margin':
        return this.assessed(position).margin;
      case 'excess':
        return this.assessed(position).excess;
      default:
        return this.rowKey(column, rowOfPosition(this.index.rows, position));
    }
  }

  private rowKey(
    column: 'manufacturer' | 'family' | 'size' | 'tolerance' | 'tcr' | 'dissipation',
    row: CatalogueRow,
  ): number {
    const size = this.index.sizes.get(row.sizeId);
    const ratings = this.index.ratings.get(row.sizeId)?.modes[0]?.ratings;
    switch (column) {
      case 'manufacturer':
        return size?.manufacturerRank ?? Infinity;
      case 'family':
        return size?.familyRank ?? Infinity;
      case 'size':
        return ratings?.body === undefined ? Infinity : ratings.body.length * ratings.body.width;
      case 'tolerance':
        return row.tolerance ?? Infinity;
      case 'tcr':
        return row.tcr ?? Infinity;
      case 'dissipation':
        return ratings?.ratedDissipation ?? Infinity;
    }
  }

  private assessed(position: number): { excess: number; margin: number } {
    const known = this.excesses.get(position);
    if (known !== undefined) return known;
    const { requirement, policy } = this.evaluation;
    const { findings } = judge(candidateAt(this.index, position), requirement, policy);
    const margins = findings.map(({ finding }) => finding.margin).filter((margin) => margin !== null);
    const found = {
      excess: totalExcess(excessOf(findings)),
      margin: margins.length === 0 ? Infinity : Math.min(...margins),
    };
    this.excesses.set(position, found);
    return found;
  }
}
