import type { Policy } from '@resistry/engineering/derating/policy-entry';
import type { Duty } from '@resistry/engineering/duty/duty';
import { requirementOf, type Requirement } from '@resistry/engineering/duty/requirement';
import { conditionsOf, type Conditions } from '@resistry/engineering/operating/conditions';
import { askedChecks, type AskedCheck } from '@resistry/engineering/range-search/asked-checks';
import { evaluateRow, insideWindow, type Row } from '@resistry/engineering/range-search/evaluate-row';
import { passingStretches } from '@resistry/engineering/range-search/passing-stretches';
import { answersOf } from '@resistry/engineering/range-search/row-answers';
import type { CatalogueRow } from '../index/catalogue-columns';
import type { CatalogueIndex } from '../index/catalogue-index';
import type { Scratch } from './scratch';
import { addStanding, anyStands, standingMasks, type StandingMasks } from './standing-masks';

/**
 * How one row stands. Its parts at [from, to) have been judged by every check. The others lie outside the window by their
 * nominal resistance and their tolerance: of them it is only known in which stretches nothing but the window, and perhaps
 * their standing in the catalogue, removes them.
 */
export interface RowOutcome {
  row: CatalogueRow;
  from: number;
  to: number;
  /** Pairs of first position and position after the last. */
  passingOutside: readonly number[];
  /** Whether data are missing without which no part of the row can be met, whatever its resistance. */
  isUnrated: boolean;
}

/** The checks a requirement asks. */
interface Question {
  requirement: Requirement;
  policy: Policy;
  checks: readonly AskedCheck[];
  /** Bit of the value check; 0 where it is not asked. */
  valueBit: number;
  standing: StandingMasks;
  scratch: Scratch;
  /** Conditions of each operating mode that was looked at, by the number of the row. */
  conditions: (Conditions[] | undefined)[];
}

/** How the rows of a catalogue stand under a requirement; the masks are in its scratch. */
export interface Evaluation extends Question {
  outcomes: readonly RowOutcome[];
  /** Checks of single parts that bounds could not decide. */
  exact: number;
}

/**
 * Which parts are judged by every check: all of them, or those inside the window, which is enough to count parts and a
 * small share of the work.
 */
export type Extent = 'all parts' | 'inside the window';

/**
 * Conditions of each operating mode of a row.
 * @param siblings those of another row of the same size
 */
export function conditionsOfRow(
  row: CatalogueRow,
  requirement: Requirement,
  policy: Policy,
  siblings?: readonly Conditions[],
): Conditions[] {
  return row.modes.map((ratings, mode) => conditionsOf(ratings, requirement, policy, siblings?.[mode]));
}

/** Holds the parts of the given rows against a requirement. */
export function evaluateRows(
  index: CatalogueIndex,
  rows: readonly CatalogueRow[],
  duty: Duty,
  policy: Policy,
  scratch: Scratch,
  extent: Extent,
): Evaluation {
  const surroundings = scratch.surroundings.of(duty, policy);
  const { ambient, life, conditions } = surroundings;
  const requirement = requirementOf({ ...duty, ambient, life });
  const checks = askedChecks(requirement);
  const question: Question = {
    requirement,
    policy: surroundings.policy,
    checks,
    valueBit: checks.find(({ definition }) => definition.name === 'value')?.bit ?? 0,
    standing: standingMasks(requirement, checks),
    scratch,
    conditions,
  };
  scratch.masks.exact = 0;
  scratch.other.exact = 0;
  let previous: CatalogueRow | undefined;
  const outcomes = rows.map((row) => {
    const sameSize = previous?.sizeId === row.sizeId ? conditions[previous.number] : undefined;
    previous = row;
    return outcomeOf(index, row, question, extent, conditions[row.number] ?? sameSize ?? []);
  });
  return { ...question, outcomes, exact: scratch.masks.exact + scratch.other.exact };
}

function outcomeOf(
  index: CatalogueIndex,
  row: CatalogueRow,
  { requirement, checks, policy, scratch, standing, conditions }: Question,
  extent: Extent,
  siblings: readonly Conditions[],
): RowOutcome {
  const { resistance } = index.columns;
  const { window, link } = requirement;
  const windowDecides = extent === 'inside the window' && window !== undefined && !link && !row.isLink;
  const [from, to] = windowDecides
    ? insideWindow(window, row.tolerance ?? 0, resistance, row.from, row.to)
    : [row.from, row.to];
  // Most rows hold no part that is approved at all; outside the window nothing is to be counted there.
  const around = anyStands(index.columns, standing, row.from, row.to) ? outside(row, from, to) : [];
  let passingOutside: readonly number[] = [];
  let isUnrated = true;
  const ofModes: Conditions[] = [];
  for (const [mode, ratings] of row.modes.entries()) {
    // Outside the window every operating mode is unmet, and of equals the first stands.
    if (from >= to && (mode > 0 || around.length === 0)) break;
    const ofMode = conditionsOf(ratings, requirement, policy, siblings[mode]);
    ofModes.push(ofMode);
    const judged: Row = {
      conditions: ofMode,
      answers: answersOf(ofMode, checks),
      resistances: resistance,
    };
    if (mode === 0) passingOutside = passingStretches(judged, around);
    isUnrated &&= judged.answers.some(({ unloaded }) => unloaded === 'unrated');
    judgeMode(judged, mode, from, to, scratch);
  }
  // What rows share does not change, so the first conditions are kept: new ones at every search would only grow old.
  if (ofModes.length > (conditions[row.number]?.length ?? 0)) conditions[row.number] = ofModes;
  addStanding(index.columns, standing, scratch, from, to);
  return { row, from, to, passingOutside, isUnrated };
}

/** The stretches of a row that are not in [from, to). */
function outside(row: CatalogueRow, from: number, to: number): number[] {
  if (from >= to) return row.from < row.to ? [row.from, row.to] : [];
  const stretches: number[] = [];
  if (row.from < from) stretches.push(row.from, from);
  if (to < row.to) stretches.push(to, row.to);
  return stretches;
}

/** Judges [from, to) in one operating mode; a part keeps the mode of its best verdict, the first of equals. */
function judgeMode(row: Row, mode: number, from: number, to: number, scratch: Scratch): void {
  const { masks, other, unmetInEveryMode } = scratch;
  const into = mode === 0 ? masks : other;
  evaluateRow(row, from, to, into);
  for (let position = from; position < to; position += 1) {
    const common = mode === 0 ? ~0 : (unmetInEveryMode[position] ?? 0);
    unmetInEveryMode[position] = common & (into.unmet[position] ?? 0);
  }
  if (mode === 0) return;
  for (let position = from; position < to; position += 1) {
    const rank = rankOf(masks.unmet[position] ?? 0, masks.unrated[position] ?? 0);
    if (rank === 0) continue;
    const unmet = other.unmet[position] ?? 0;
    const unrated = other.unrated[position] ?? 0;
    if (rankOf(unmet, unrated) >= rank) continue;
    masks.unmet[position] = unmet;
    masks.unrated[position] = unrated;
  }
}

function rankOf(unmet: number, unrated: number): number {
  return unmet !== 0 ? 2 : unrated !== 0 ? 1 : 0;
}
