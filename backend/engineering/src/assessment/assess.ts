import { budgetOf, type BudgetLine } from '../budget/budget';
import { cautionsOf, type Caution } from '../cautions/cautions';
import type { Basis } from '../checks/basis';
import type { CheckName, CheckUnit, Finding, Standing, Status } from '../checks/check';
import { checkList, standingChecks } from '../checks/list';
import type { Policy } from '../derating/policy-entry';
import type { Requirement } from '../duty/requirement';
import { conditionsOf, type Conditions } from '../operating/conditions';
import { settle, type OperatingState } from '../operating/settle';
import type { Ratings } from '../ratings/ratings';
import { excessOf, type Excess } from './excess';
import { permittedOf, type Permitted } from './permitted';
import { compareVerdicts, verdictOf } from './verdict';

/** One line of an assessment. */
export interface CheckResult extends Finding {
  check: CheckName;
  unit: CheckUnit;
  basis: Basis;
}

/** One part held against one requirement. */
export interface Assessment {
  verdict: Status;
  checks: CheckResult[];
  budget: BudgetLine[];
  permitted: Permitted;
  excess: Excess;
  cautions: Caution[];
  /** Where self-heating settled; absent for a link. */
  operating?: OperatingState;
  /** Name of the operating mode used, where the size has several. */
  mode?: string;
}

/** A part as it is assessed: its ratings in each operating mode, in the family's order, and its standing. */
export interface Candidate {
  modes: readonly { name?: string; ratings: Ratings }[];
  standing?: Standing;
}

/** State of a link: it has no deviation to settle. */
const linkState: OperatingState = {
  nominal: 0,
  low: 0,
  high: 0,
  deviation: 0,
  dissipation: 0,
  voltage: 0,
  hot: NaN,
  hotKnown: NaN,
  steps: 0,
  settled: true,
};

/** Settles a part at its nominal resistance. */
export function stateOf(conditions: Conditions): OperatingState {
  const resistance = conditions.ratings.resistance;
  return resistance === 0 ? linkState : settle(conditions, resistance, resistance);
}

/** What every check that is asked finds, without the words. */
export function findingsOf(
  conditions: Conditions,
  state: OperatingState,
  standing: Standing | undefined,
): { check: CheckName; finding: Finding }[] {
  return checkList
    .filter((check) => check.asked(conditions.requirement, conditions.ratings, standing))
    .map((check) => ({ check: check.name, finding: check.find({ conditions, state, standing }) }));
}

/**
 * Assesses a part: every check the duty asks for, in each operating mode; the mode whose ratings hold best stands, the
 * first of equals. Modes are never mixed, and the part's standing in the catalogue has no say in the mode.
 * @throws RangeError where the candidate has no mode
 */
export function assess(candidate: Candidate, requirement: Requirement, policy: Policy): Assessment {
  let best: Assessment | undefined;
  for (const mode of candidate.modes) {
    const assessment = assessMode(mode, candidate.standing, requirement, policy);
    if (best === undefined || compareVerdicts(verdictOfRatings(assessment), verdictOfRatings(best)) < 0)
      best = assessment;
  }
  if (best === undefined) throw new RangeError('A part without an operating mode cannot be assessed.');
  return best;
}

function verdictOfRatings(assessment: Assessment): Status {
  return verdictOf(
    assessment.checks.filter(({ check }) => !standingChecks.has(check)).map(({ status }) => status),
  );
}

function assessMode(
  mode: { name?: string; ratings: Ratings },
  standing: Standing | undefined,
  requirement: Requirement,
  policy: Policy,
): Assessment {
  const conditions = conditionsOf(mode.ratings, requirement, policy);
  const state = stateOf(conditions);
  const checks: CheckResult[] = checkList
    .filter((check) => check.asked(requirement, mode.ratings, standing))
    .map((check) => {
      const input = { conditions, state, standing };
      const finding = check.find(input);
      return { check: check.name, unit: check.unit, ...finding, basis: check.explain(input, finding) };
    });
  const isLink = mode.ratings.resistance === 0;
  return {
    verdict: verdictOf(checks.map((check) => check.status)),
    checks,
    budget: isLink ? [] : budgetOf(conditions, state),
    permitted: permittedOf(conditions),
    excess: excessOf(checks.map((check) => ({ check: check.check, finding: check }))),
    cautions: cautionsOf(conditions, state),
    ...(isLink ? {} : { operating: state }),
    ...(mode.name === undefined ? {} : { mode: mode.name }),
  };
}
