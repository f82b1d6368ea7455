import { standingChecks } from '../checks/list';
import type { Conditions } from '../operating/conditions';
import { settle, type OperatingState } from '../operating/settle';
import { stateAtRest } from './row-answers';
import { linkState } from '../assessment/judge';
import type { AskedCheck } from './asked-checks';

/**
 * Whether one part of a row meets every check but those of its standing, in the operating mode of the conditions. The
 * first check that is not met ends it.
 * @param resistance Ω; not looked at for a link
 */
export function isMetBy(conditions: Conditions, checks: readonly AskedCheck[], resistance: number): boolean {
  const state = conditions.ratings.resistance === 0 ? linkState : settle(conditions, resistance, resistance);
  return allMet(conditions, checks, state);
}

/** Whether a part of the row that no load heats would meet them all; where it would not, no part of the row does. */
export function canBeMet(conditions: Conditions, checks: readonly AskedCheck[]): boolean {
  return allMet(conditions, checks, stateAtRest(conditions));
}

function allMet(conditions: Conditions, checks: readonly AskedCheck[], state: OperatingState): boolean {
  const { ratings, requirement } = conditions;
  return checks.every(
    ({ definition }) =>
      standingChecks.has(definition.name) ||
      !definition.asked(requirement, ratings, undefined) ||
      definition.find({ conditions, state }).status === 'met',
  );
}
