import { approvals } from '@resistry/engineering/ratings/technology';
import type { CatalogueIndex } from '../index/catalogue-index';
import { judgedSources } from './company-numbers';
import { countNumbers, countParts } from './count-units';
import { evaluateRows, type Evaluation, type Extent } from './evaluation';
import { PartOrder } from './part-order';
import { Scope } from './scope';
import type { Scratch } from './scratch';
import type { FoundItem, SearchPlan, SearchResult } from './search-plan';
import { orderOfNumbers, orderOfParts } from './unit-order';
import { selectFirst } from './select-first';
import { relaxationsOf } from './relaxation/relaxations';

/**
 * The whole search over the columns of a catalogue: every check on every part that the filters accept, exact counts, the
 * page asked for, and what loosened demands would bring back.
 * @throws DutyConflict where the duty contradicts itself
 */
export function searchCatalogue(index: CatalogueIndex, plan: SearchPlan, scratch: Scratch): SearchResult {
  const scope = new Scope(index, plan);
  // The sources of a company part number can stand in rows that the filters leave out.
  const rows = plan.byCompanyNumber ? index.rows : scope.rows;
  const evaluation = evaluateRows(index, rows, plan.duty, plan.policy, scratch, extentOf(plan));
  const tally = plan.byCompanyNumber ? countNumbers(scope, evaluation) : countParts(index, scope, evaluation);
  const order = new PartOrder(index, evaluation);
  const compare = plan.byCompanyNumber
    ? orderOfNumbers(index, order, plan.sort)
    : orderOfParts(index, order, plan.sort);
  const { met, unrated } = tally;
  return {
    total: met.length,
    unrated: unrated.length,
    items: page(plan, met, unrated, compare).map((unit) => itemOf(index, plan, evaluation, unit)),
    knockouts: tally.knockouts(),
    relaxations: plan.relaxations ? relaxationsOf(index, scope, evaluation) : [],
    byApproval: countByApproval(index, scope, met),
    exact: evaluation.exact,
  };
}

/**
 * Company part numbers are judged by sources on either side of the window, and loosened limits move the window itself;
 * everything else is decided by the parts inside it.
 */
function extentOf(plan: SearchPlan): Extent {
  const movable = plan.relaxations && plan.duty.limits !== undefined;
  return plan.byCompanyNumber || movable ? 'all parts' : 'inside the window';
}

/** The page: by preference what is met comes before what is unrated; by any other column they stand mixed. */
function page(
  plan: SearchPlan,
  met: number[],
  unrated: number[],
  compare: (first: number, second: number) => number,
): number[] {
  const { offset, limit, showUnrated, sort } = plan;
  const last = offset + limit;
  if (!showUnrated) return selectFirst(met, last, compare).slice(offset);
  if (sort.by !== 'preference') return selectFirst([...met, ...unrated], last, compare).slice(offset);
  const first = selectFirst(met, last, compare);
  return [...first, ...selectFirst(unrated, last - first.length, compare)].slice(offset);
}

function itemOf(
  index: CatalogueIndex,
  plan: SearchPlan,
  evaluation: Evaluation,
  position: number,
): FoundItem {
  const { columns, companyNumbers } = index;
  if (!plan.byCompanyNumber) return { partId: columns.partId[position] ?? 0 };
  const { unmet, unrated } = evaluation.scratch.masks;
  const badness = (source: number): number => (unmet[source] !== 0 ? 2 : unrated[source] !== 0 ? 1 : 0);
  const sources = judgedSources(index, position).sort(
    (first, second) => badness(second) - badness(first) || first - second,
  );
  const ids = sources.map((source) => columns.partId[source] ?? 0);
  return { partId: ids[0] ?? 0, companyNumberId: companyNumbers.id[position], sourceIds: ids };
}

function countByApproval(
  index: CatalogueIndex,
  scope: Scope,
  met: readonly number[],
): SearchResult['byApproval'] {
  const counts: SearchResult['byApproval'] = {};
  const preferred = approvals.indexOf('preferred');
  for (const unit of met) {
    // A company part number counts as preferred where any of its sources is.
    const codes = scope.positionsOf(unit).map((position) => index.columns.approval[position] ?? 0);
    const name = approvals[codes.includes(preferred) ? preferred : (codes[0] ?? 0)];
    if (name !== undefined) counts[name] = (counts[name] ?? 0) + 1;
  }
  return counts;
}
