import { conditionsOf, type Conditions } from '@resistry/engineering/operating/conditions';
import type { Policy } from '@resistry/engineering/derating/policy-entry';
import type { Requirement } from '@resistry/engineering/duty/requirement';
import { askedChecks, type AskedCheck } from '@resistry/engineering/range-search/asked-checks';
import { evaluateRow } from '@resistry/engineering/range-search/evaluate-row';
import type { RowMasks } from '@resistry/engineering/range-search/row-masks';
import { approvals, supplyStatuses } from '@resistry/engineering/ratings/technology';
import { wantedApprovals } from '@resistry/engineering/checks/approval';
import { wantedSupply } from '@resistry/engineering/checks/supply';
import type { CatalogueRow } from '../index/catalogue-columns';
import type { CatalogueIndex } from '../index/catalogue-index';

/** Masks of all parts of the catalogue; kept between searches, because a million parts are not worth allocating twice. */
export interface Scratch {
  masks: RowMasks;
  /** For the second and further operating modes of a row. */
  other: RowMasks;
  /** Of parts with several operating modes, the checks that are unmet in every mode. */
  unmetInEveryMode: Uint32Array;
}

export function allocateScratch(length: number): Scratch {
  const masks = (): RowMasks => ({
    unmet: new Uint32Array(length),
    unrated: new Uint32Array(length),
    exact: 0,
  });
  return { masks: masks(), other: masks(), unmetInEveryMode: new Uint32Array(length) };
}

/** The checks a requirement asks and how the rows of a catalogue stand under it. */
export interface Evaluation {
  requirement: Requirement;
  policy: Policy;
  checks: readonly AskedCheck[];
  masks: RowMasks;
  unmetInEveryMode: Uint32Array;
}

/** Conditions of each operating mode of a row. */
export function conditionsOfRow(row: CatalogueRow, requirement: Requirement, policy: Policy): Conditions[] {
  return row.modes.map((ratings) => conditionsOf(ratings, requirement, policy));
}

/** Holds every part of the given rows against a requirement; the standing checks are set last, from the columns. */
export function evaluateRows(
  index: CatalogueIndex,
  rows: readonly CatalogueRow[],
  requirement: Requirement,
  policy: Policy,
  scratch: Scratch,
): Evaluation {
  const checks = askedChecks(requirement);
  const standing = standingMasks(requirement, checks);
  scratch.masks.exact = 0;
  scratch.other.exact = 0;
  for (const row of rows) evaluateModes(index, row, requirement, policy, checks, scratch, standing);
  scratch.masks.exact += scratch.other.exact;
  return { requirement, policy, checks, masks: scratch.masks, unmetInEveryMode: scratch.unmetInEveryMode };
}

function evaluateModes(
  index: CatalogueIndex,
  row: CatalogueRow,
  requirement: Requirement,
  policy: Policy,
  checks: readonly AskedCheck[],
  { masks, other, unmetInEveryMode }: Scratch,
  standing: Uint32Array,
): void {
  const { columns } = index;
  const { from, to } = row;
  const modes = conditionsOfRow(row, requirement, policy);
  modes.forEach((conditions, mode) => {
    const into = mode === 0 ? masks : other;
    evaluateRow(conditions, checks, columns.resistance, from, to, into);
    for (let position = from; position < to; position += 1) {
      const common = mode === 0 ? ~0 : (unmetInEveryMode[position] ?? 0);
      unmetInEveryMode[position] = common & (into.unmet[position] ?? 0);
    }
    if (mode > 0) keepBetterMode(masks, other, from, to);
  });
  for (let position = from; position < to; position += 1) {
    const key = standingKey(
      columns.approval[position] ?? 0,
      columns.supply[position] ?? 0,
      columns.secondSource[position] ?? 0,
    );
    masks.unmet[position] = (masks.unmet[position] ?? 0) | (standing[key] ?? 0);
    unmetInEveryMode[position] = (unmetInEveryMode[position] ?? 0) | (standing[key] ?? 0);
  }
}

/** A part is assessed in the mode of its best verdict, the first of equals. */
function keepBetterMode(masks: RowMasks, other: RowMasks, from: number, to: number): void {
  for (let position = from; position < to; position += 1) {
    const unmet = masks.unmet[position] ?? 0;
    const unrated = masks.unrated[position] ?? 0;
    const rank = unmet !== 0 ? 2 : unrated !== 0 ? 1 : 0;
    if (rank === 0) continue;
    const otherUnmet = other.unmet[position] ?? 0;
    const otherUnrated = other.unrated[position] ?? 0;
    const otherRank = otherUnmet !== 0 ? 2 : otherUnrated !== 0 ? 1 : 0;
    if (otherRank >= rank) continue;
    masks.unmet[position] = otherUnmet;
    masks.unrated[position] = otherUnrated;
  }
}

function standingKey(approval: number, supply: number, secondSource: number): number {
  return approval | (supply << 3) | (secondSource << 5);
}

/** Bits of the standing checks that are unmet, by approval, supply status and second source. */
function standingMasks(requirement: Requirement, checks: readonly AskedCheck[]): Uint32Array {
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
