import { DutyConflict } from '@resistry/engineering/duty/duty-conflict';
import type { Duty } from '@resistry/engineering/duty/duty';
import { requirementOf, type Requirement } from '@resistry/engineering/duty/requirement';
import type { CatalogueRow } from '../../index/catalogue-columns';
import type { CatalogueIndex } from '../../index/catalogue-index';
import { evaluateRows, type Evaluation, type Scratch } from '../evaluation';

/** A part, or the sources of a company part number: met where all its positions are. */
export type Unit = readonly number[];

/** Tries a loosened duty on single parts without touching the masks of the search itself. */
export class Retrial {
  constructor(
    private readonly index: CatalogueIndex,
    private readonly evaluation: Evaluation,
    private readonly scratch: Scratch,
  ) {}

  /** The requirement of a loosened duty, or undefined where it contradicts itself. */
  requirement(duty: Duty): Requirement | undefined {
    try {
      return requirementOf(duty);
    } catch (error) {
      if (error instanceof DutyConflict) return undefined;
      throw error;
    }
  }

  /** How many of the units a duty meets. */
  count(duty: Duty, units: readonly Unit[]): number {
    const requirement = this.requirement(duty);
    if (requirement === undefined) return 0;
    const masks = this.evaluate(requirement, units);
    return units.filter((unit) =>
      unit.every((position) => masks.unmet[position] === 0 && masks.unrated[position] === 0),
    ).length;
  }

  /** Whether a duty meets one unit. */
  meets(duty: Duty, unit: Unit): boolean {
    return this.count(duty, [unit]) === 1;
  }

  private evaluate(requirement: Requirement, units: readonly Unit[]): Evaluation['masks'] {
    const slices = slicesOf(this.index, units);
    return evaluateRows(this.index, slices, requirement, this.evaluation.policy, this.scratch).masks;
  }
}

/** The rows of the units, each cut to the stretch that holds them. */
function slicesOf(index: CatalogueIndex, units: readonly Unit[]): CatalogueRow[] {
  const positions = units.flat().sort((first, second) => first - second);
  const slices: CatalogueRow[] = [];
  let rowNumber = 0;
  let current: CatalogueRow | undefined;
  let currentRow: CatalogueRow | undefined;
  for (const position of positions) {
    if (currentRow !== undefined && current !== undefined && position < currentRow.to) {
      current.to = position + 1;
      continue;
    }
    rowNumber = rowAt(index.rows, position, rowNumber);
    currentRow = index.rows[rowNumber];
    if (currentRow === undefined) continue;
    current = { ...currentRow, from: position, to: position + 1 };
    slices.push(current);
  }
  return slices;
}

function rowAt(rows: readonly CatalogueRow[], position: number, from: number): number {
  let low = from;
  let high = rows.length - 1;
  while (low < high) {
    const middle = (low + high + 1) >>> 1;
    if ((rows[middle]?.from ?? Infinity) <= position) low = middle;
    else high = middle - 1;
  }
  return low;
}
