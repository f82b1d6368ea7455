import type { CheckDefinition } from '../checks/check';
import { checkList } from '../checks/list';
import type { Requirement } from '../duty/requirement';
import type { Ratings } from '../ratings/ratings';

/** A check that a search asks, with its bit in the masks of unmet and unrated checks. */
export interface AskedCheck {
  definition: CheckDefinition;
  bit: number;
}

const resistor: Ratings = { technology: 'thick-film', resistance: 1 };
const link: Ratings = { technology: 'thick-film', resistance: 0 };

/** The checks that a requirement asks of any catalogue part, in the order of the list, each with a bit of its own. */
export function askedChecks(requirement: Requirement): AskedCheck[] {
  const standing = {};
  return checkList
    .filter(
      (check) => check.asked(requirement, resistor, standing) || check.asked(requirement, link, standing),
    )
    .map((definition, position) => ({ definition, bit: 1 << position }));
}
