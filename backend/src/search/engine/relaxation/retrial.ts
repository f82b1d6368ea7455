import { standingChecks } from '@resistry/engineering/checks/list';
import { DutyConflict } from '@resistry/engineering/duty/duty-conflict';
import type { Duty } from '@resistry/engineering/duty/duty';
import { requirementOf, type Requirement } from '@resistry/engineering/duty/requirement';
import type { Conditions } from '@resistry/engineering/operating/conditions';
import { canBeMet, isMetBy } from '@resistry/engineering/range-search/is-met-by';
import { askedChecks, type AskedCheck } from '@resistry/engineering/range-search/asked-checks';
import type { CatalogueIndex } from '../../index/catalogue-index';
import { conditionsOfRow, type Evaluation } from '../evaluation';
import { rowOfPosition } from '../row-of-position';
import type { Scope } from '../scope';
import { standingMasks, unmetStanding } from '../standing-masks';
import type { Units } from './units';

/** Tries a changed duty on single units. */
export class Retrial {
  constructor(
    private readonly index: CatalogueIndex,
    private readonly scope: Scope,
    private readonly evaluation: Evaluation,
  ) {}

  /** The units that a duty meets; none where it contradicts itself. */
  met(duty: Duty, units: readonly number[]): number[] {
    return units.filter(this.unitMeets(duty));
  }

  /** How many units a duty meets. */
  countMet(duty: Duty, units: Units): number {
    return units.countWhere(this.unitMeets(duty));
  }

  /** How many units a duty meets that asks something else of their standing, and the same as before of their ratings. */
  countMetByStanding(duty: Duty, units: Units): number {
    const { checks, scratch } = this.evaluation;
    const requirement = requirementOf(duty);
    const standing = standingMasks(requirement, askedChecks(requirement));
    const standingBits = checks
      .filter(({ definition }) => standingChecks.has(definition.name))
      .reduce((bits, { bit }) => bits | bit, 0);
    const isMet = (position: number): boolean =>
      ((scratch.masks.unmet[position] ?? 0) & ~standingBits) === 0 &&
      scratch.masks.unrated[position] === 0 &&
      unmetStanding(this.index.columns, standing, position) === 0;
    return units.countWhere((unit) => this.scope.everyPosition(unit, isMet));
  }

  private unitMeets(duty: Duty): (unit: number) => boolean {
    const requirement = possibleRequirement(duty);
    if (requirement === undefined) return () => false;
    const isMet = this.tryPositions(requirement);
    return (unit) => this.scope.everyPosition(unit, isMet);
  }

  /** Units mostly come row by row, so the conditions of the last row are kept. */
  private tryPositions(requirement: Requirement): (position: number) => boolean {
    const { columns, rows } = this.index;
    const checks: readonly AskedCheck[] = askedChecks(requirement);
    const standing = standingMasks(requirement, checks);
    let row = rows[0];
    let conditions: Conditions[] | undefined;
    let hopeful: Conditions[] = [];
    return (position) => {
      if (unmetStanding(columns, standing, position) !== 0) return false;
      if (conditions === undefined || row === undefined || position < row.from || position >= row.to) {
        row = rowOfPosition(rows, position);
        const { conditions: known, policy } = this.evaluation;
        conditions = conditionsOfRow(row, requirement, policy, known[row.number]);
        hopeful = conditions.filter((mode) => canBeMet(mode, checks));
      }
      const ohm = columns.resistance[position] ?? NaN;
      return hopeful.some((mode) => isMetBy(mode, checks, ohm));
    };
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
