import { DutyConflict } from '@resistry/engineering/duty/duty-conflict';
import type { Duty } from '@resistry/engineering/duty/duty';
import { requirementOf, type Requirement } from '@resistry/engineering/duty/requirement';
import type { CatalogueRow } from '../../index/catalogue-columns';
import type { CatalogueIndex } from '../../index/catalogue-index';
import { evaluateRows, type Evaluation } from '../evaluation';
import { rowOfPosition } from '../row-of-position';
import type { Scope } from '../scope';
import type { Scratch } from '../scratch';

/** Tries a loosened duty on single units without touching the masks of the search itself. */
export class Retrial {
  constructor(
    private readonly index: CatalogueIndex,
    private readonly scope: Scope,
    private readonly evaluation: Evaluation,
    private readonly scratch: Scratch,
  ) {}

  /** The units that a duty meets; none where it contradicts itself. */
  met(duty: Duty, units: readonly number[]): number[] {
    const requirement = possibleRequirement(duty);
    if (requirement === undefined || units.length === 0) return [];
    const positions = units.flatMap((unit) => this.scope.positionsOf(unit));
    const { policy } = this.evaluation;
    evaluateRows(this.index, this.slices(positions), requirement, policy, this.scratch, 'all parts');
    const { masks } = this.scratch;
    const isMet = (position: number): boolean => masks.unmet[position] === 0 && masks.unrated[position] === 0;
    return units.filter((unit) => this.scope.positionsOf(unit).every(isMet));
  }

  /** The rows of some positions, each cut to the stretch that holds them. */
  private slices(positions: readonly number[]): CatalogueRow[] {
    const sorted = Int32Array.from(positions).sort();
    const slices: CatalogueRow[] = [];
    let whole: CatalogueRow | undefined;
    let slice: CatalogueRow | undefined;
    for (const position of sorted) {
      if (whole === undefined || slice === undefined || position >= whole.to) {
        whole = rowOfPosition(this.index.rows, position);
        slice = { ...whole, from: position };
        slices.push(slice);
      }
      slice.to = position + 1;
    }
    return slices;
  }
}

function possibleRequirement(duty: Duty): Requirement | undefined {
  try {
    return requirementOf(duty);
  } catch (error) {
    if (error instanceof DutyConflict) return undefined;
    throw error;
  }
}
