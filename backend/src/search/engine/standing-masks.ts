import { wantedApprovals } from '@resistry/engineering/checks/approval';
import { wantedSupply } from '@resistry/engineering/checks/supply';
import type { Requirement } from '@resistry/engineering/duty/requirement';
import type { AskedCheck } from '@resistry/engineering/range-search/asked-checks';
import { approvals, supplyStatuses } from '@resistry/engineering/ratings/technology';
import { standingKey, type CatalogueColumns } from '../index/catalogue-columns';
import type { Scratch } from './scratch';

/** Bits of the standing checks that are unmet, by key of approval, supply status and second source. */
export type StandingMasks = Uint32Array;

export function standingMasks(requirement: Requirement, checks: readonly AskedCheck[]): StandingMasks {
  const bitOf = (name: string): number => checks.find((check) => check.definition.name === name)?.bit ?? 0;
  const wanted = { approvals: wantedApprovals(requirement), supply: wantedSupply(requirement) };
  const masks = new Uint32Array(64);
  for (const [approval, approvalName] of approvals.entries()) {
    for (const [supply, supplyName] of supplyStatuses.entries()) {
      for (const secondSource of [0, 1]) {
        masks[standingKey(approval, supply, secondSource)] =
          (wanted.approvals.includes(approvalName) ? 0 : bitOf('approval')) |
          (wanted.supply.includes(supplyName) ? 0 : bitOf('supply')) |
          (secondSource === 1 ? 0 : bitOf('second-source'));
      }
    }
  }
  return masks;
}

/** Bits of the standing checks that the part at a position does not meet. */
export function unmetStanding(columns: CatalogueColumns, masks: StandingMasks, position: number): number {
  return masks[columns.standing[position] ?? 0] ?? 0;
}

/** Whether any part at [from, to) meets the standing checks. */
export function anyStands(
  columns: CatalogueColumns,
  masks: StandingMasks,
  from: number,
  to: number,
): boolean {
  for (let position = from; position < to; position += 1) {
    if (unmetStanding(columns, masks, position) === 0) return true;
  }
  return false;
}

/** Adds the standing checks to what the ratings of the parts at [from, to) gave. */
export function addStanding(
  columns: CatalogueColumns,
  standing: StandingMasks,
  { masks, unmetInEveryMode }: Scratch,
  from: number,
  to: number,
): void {
  for (let position = from; position < to; position += 1) {
    const unmet = unmetStanding(columns, standing, position);
    if (unmet === 0) continue;
    masks.unmet[position] = (masks.unmet[position] ?? 0) | unmet;
    unmetInEveryMode[position] = (unmetInEveryMode[position] ?? 0) | unmet;
  }
}
