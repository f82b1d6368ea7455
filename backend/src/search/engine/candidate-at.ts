import type { Candidate } from '@resistry/engineering/assessment/judge';
import { approvals, supplyStatuses } from '@resistry/engineering/ratings/technology';
import { modesOfPart } from '../../parts/ratings/size-ratings';
import type { CatalogueIndex } from '../index/catalogue-index';
import { rowOfPosition } from './row-of-position';

/** The part at a position of the columns, as it is assessed alone. */
export function candidateAt(index: CatalogueIndex, position: number): Candidate {
  const row = rowOfPosition(index.rows, position);
  const size = index.ratings.get(row.sizeId);
  if (size === undefined) throw new Error(`Size ${String(row.sizeId)} of the index has no ratings.`);
  const { columns } = index;
  const { tolerance, tcr } = row;
  return {
    modes: modesOfPart(size, { resistance: columns.resistance[position] ?? NaN, tolerance, tcr }),
    standing: {
      approval: approvals[columns.approval[position] ?? 0],
      supply: supplyStatuses[columns.supply[position] ?? 0],
      secondSource: columns.secondSource[position] === 1,
    },
  };
}
