import { approvals } from '@resistry/engineering/ratings/technology';
import { requirementOf } from '@resistry/engineering/duty/requirement';
import type { CatalogueIndex } from '../index/catalogue-index';
import { judgedSources, masksOfNumber } from './company-numbers';
import { evaluateRows, type Evaluation, type Scratch } from './evaluation';
import { partFilter } from './part-filter';
import { PartOrder } from './part-order';
import { rowFilter } from './row-filter';
import type { FoundItem, SearchPlan, SearchResult } from './search-plan';
import { orderOfNumbers, orderOfParts } from './unit-order';
import { selectFirst } from './select-first';
import { Tally } from './tally';
import { relaxationsOf } from './relaxation/relaxations';
import type { Miss } from './relaxation/near-misses';

/** Scratch for the search itself and for trying loosened duties beside it. */
export interface SearchScratch {
  main: Scratch;
  retrial: Scratch;
}

/**
 * The whole search over the columns of a catalogue: every check on every part that the filters accept, exact counts, the
 * page asked for, and what loosened demands would bring back.
 * @throws DutyConflict where the duty contradicts itself
 */
export function searchCatalogue(
  index: CatalogueIndex,
  plan: SearchPlan,
  scratch: SearchScratch,
): SearchResult {
  const requirement = requirementOf(plan.duty);
  const inRow = rowFilter(index, plan.filters);
  const rows = index.rows.filter(inRow);
  // The sources of a company part number can stand in rows that the filters leave out.
  const evaluated = plan.byCompanyNumber ? index.rows : rows;
  const evaluation = evaluateRows(index, evaluated, requirement, plan.policy, scratch.main);
  const seen = collect(index, plan, rows, evaluation);
  const order = new PartOrder(index, evaluation);
  const compare = plan.byCompanyNumber
    ? orderOfNumbers(index, order, plan.sort)
    : orderOfParts(index, order, plan.sort);
  const { met, unrated } = seen.tally;
  return {
    total: met.length,
    unrated: unrated.length,
    items: page(plan, met, unrated, compare).map((position) => itemOf(index, plan, evaluation, position)),
    knockouts: seen.tally.knockouts(),
    relaxations: plan.relaxations
      ? relaxationsOf(index, evaluation, plan.duty, seen.misses, scratch.retrial)
      : [],
    byApproval: countByApproval(index, plan, met),
    exact: evaluation.masks.exact,
  };
}

/** Runs over everything the filters accept: parts, or company part numbers with at least one accepted source. */
function collect(
  index: CatalogueIndex,
  plan: SearchPlan,
  rows: CatalogueIndex['rows'],
  evaluation: Evaluation,
): { tally: Tally; misses: Miss[] } {
  const tally = new Tally(evaluation.checks);
  const accepts = partFilter(index, plan.filters);
  const misses: Miss[] = [];
  const { unmetInEveryMode } = evaluation;
  const { unmet, unrated } = evaluation.masks;
  const numbers = new Set<number>();
  for (const { from, to } of rows) {
    for (let position = from; position < to; position += 1) {
      if (accepts !== undefined && !accepts(position)) continue;
      if (plan.byCompanyNumber) {
        const number = index.columns.company[position] ?? -1;
        if (number >= 0) numbers.add(number);
        continue;
      }
      const mask = unmet[position] ?? 0;
      const lacks = unrated[position] ?? 0;
      tally.add(position, mask, lacks);
      if (plan.relaxations && (mask | lacks) !== 0)
        misses.push({ unit: [position], unmet: unmetInEveryMode[position] ?? 0 });
    }
  }
  for (const number of numbers) {
    const unit = judgedSources(index, number);
    const masks = masksOfNumber(evaluation, unit);
    tally.add(number, masks.unmet, masks.unrated);
    if (!plan.relaxations || (masks.unmet | masks.unrated) === 0) continue;
    const common = unit.reduce((bits, position) => bits | (unmetInEveryMode[position] ?? 0), 0);
    misses.push({ unit, unmet: common });
  }
  return { tally, misses };
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
  const { unmet, unrated } = evaluation.masks;
  const badness = (source: number): number => (unmet[source] !== 0 ? 2 : unrated[source] !== 0 ? 1 : 0);
  const sources = judgedSources(index, position).sort(
    (first, second) => badness(second) - badness(first) || first - second,
  );
  const ids = sources.map((source) => columns.partId[source] ?? 0);
  return { partId: ids[0] ?? 0, companyNumberId: companyNumbers.id[position], sourceIds: ids };
}

function countByApproval(
  index: CatalogueIndex,
  plan: SearchPlan,
  met: readonly number[],
): SearchResult['byApproval'] {
  const counts: SearchResult['byApproval'] = {};
  for (const position of met) {
    // A company part number counts as preferred where any of its sources is.
    const parts = plan.byCompanyNumber ? judgedSources(index, position) : [position];
    const codes = parts.map((part) => index.columns.approval[part] ?? 0);
    const preferred = approvals.indexOf('preferred');
    const name = approvals[codes.includes(preferred) ? preferred : (codes[0] ?? 0)];
    if (name !== undefined) counts[name] = (counts[name] ?? 0) + 1;
  }
  return counts;
}
