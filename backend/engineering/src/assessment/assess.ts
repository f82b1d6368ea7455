import { budgetOf, type BudgetLine } from '../budget/budget';
import { cautionsOf, type Caution } from '../cautions/cautions';
import type { Basis } from '../checks/basis';
import type { CheckName, CheckUnit, Finding, Status } from '../checks/check';
import type { Policy } from '../derating/policy-entry';
import type { Requirement } from '../duty/requirement';
import type { OperatingState } from '../operating/settle';
import { excessOf, type Excess } from './excess';
import { judge, type Candidate } from './judge';
import { permittedOf, type Permitted } from './permitted';

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

/**
 * Assesses a part: every check the duty asks for, each with its basis, in the operating mode that holds best.
 * @throws RangeError where the candidate has no mode
 */
export function assess(candidate: Candidate, requirement: Requirement, policy: Policy): Assessment {
  const { mode, input, findings, verdict } = judge(candidate, requirement, policy);
  const { conditions, state } = input;
  const isLink = conditions.ratings.resistance === 0;
  return {
    verdict,
    checks: findings.map(({ definition, finding }) => ({
      check: definition.name,
      unit: definition.unit,
      ...finding,
      basis: definition.explain(input, finding),
    })),
    budget: isLink ? [] : budgetOf(conditions, state),
    permitted: permittedOf(conditions),
    excess: excessOf(findings),
    cautions: cautionsOf(conditions, state),
    ...(isLink ? {} : { operating: state }),
    ...(mode === undefined ? {} : { mode }),
  };
}
