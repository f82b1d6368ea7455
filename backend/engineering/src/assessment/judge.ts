import type { CheckDefinition, CheckInput, Finding, Standing, Status } from '../checks/check';
import { checkList, standingChecks } from '../checks/list';
import type { Policy } from '../derating/policy-entry';
import type { Requirement } from '../duty/requirement';
import { conditionsOf, type Conditions } from '../operating/conditions';
import { settle, type OperatingState } from '../operating/settle';
import type { Ratings } from '../ratings/ratings';
import { compareVerdicts, verdictOf } from './verdict';

/** A part as it is assessed: its ratings in each operating mode, in the family's order, and its standing. */
export interface Candidate {
  modes: readonly { name?: string; ratings: Ratings }[];
  standing?: Standing;
}

/** What the checks found for a part in the operating mode that stands, without the words. */
export interface Judgement {
  mode?: string;
  input: CheckInput;
  findings: { definition: CheckDefinition; finding: Finding }[];
  verdict: Status;
}

/** State of a link: it has no deviation to settle. */
export const linkState: OperatingState = {
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

/** What every check that is asked finds. */
export function findingsOf(input: CheckInput): Judgement['findings'] {
  const { conditions, standing } = input;
  return checkList
    .filter((check) => check.asked(conditions.requirement, conditions.ratings, standing))
    .map((definition) => ({ definition, finding: definition.find(input) }));
}

/**
 * Holds a part against a requirement in each of its operating modes; the mode whose ratings hold best stands, the first
 * of equals. Modes are never mixed, and the part's standing in the catalogue has no say in the mode.
 * @throws RangeError where the candidate has no mode
 */
export function judge(candidate: Candidate, requirement: Requirement, policy: Policy): Judgement {
  let best: { judgement: Judgement; byRatings: Status } | undefined;
  for (const { name, ratings } of candidate.modes) {
    const conditions = conditionsOf(ratings, requirement, policy);
    const input: CheckInput = { conditions, state: stateOf(conditions), standing: candidate.standing };
    const findings = findingsOf(input);
    const byRatings = verdictOf(
      statuses(findings.filter(({ definition }) => !standingChecks.has(definition.name))),
    );
    if (best !== undefined && compareVerdicts(byRatings, best.byRatings) >= 0) continue;
    best = { judgement: { mode: name, input, findings, verdict: verdictOf(statuses(findings)) }, byRatings };
  }
  if (best === undefined) throw new RangeError('A part without an operating mode cannot be assessed.');
  return best.judgement;
}

function statuses(findings: Judgement['findings']): Status[] {
  return findings.map(({ finding }) => finding.status);
}
