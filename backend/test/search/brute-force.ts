import { judge } from '@resistry/engineering/assessment/judge';
import type { CheckName } from '@resistry/engineering/checks/check';
import { checkList } from '@resistry/engineering/checks/list';
import type { Policy } from '@resistry/engineering/derating/policy-entry';
import type { Requirement } from '@resistry/engineering/duty/requirement';
import { candidateAt } from '../../src/search/engine/candidate-at';
import type { Knockout } from '../../src/search/engine/search-plan';
import type { CatalogueIndex } from '../../src/search/index/catalogue-index';

export interface Counts {
  met: number[];
  unrated: number[];
  knockouts: Knockout[];
}

/** Counts by assessing one part after another, written from the contract's words and from nothing else. */
export function countOneByOne(
  index: CatalogueIndex,
  positions: readonly number[],
  requirement: Requirement,
  policy: Policy,
): Counts {
  const removes = new Map<CheckName, number>();
  const alone = new Map<CheckName, number>();
  const add = (counts: Map<CheckName, number>, check: CheckName): void =>
    void counts.set(check, (counts.get(check) ?? 0) + 1);
  const met: number[] = [];
  const unrated: number[] = [];
  for (const position of positions) {
    const { findings, verdict } = judge(candidateAt(index, position), requirement, policy);
    const unmet = findings
      .filter(({ finding }) => finding.status === 'unmet')
      .map(({ definition }) => definition.name);
    const valueFails = unmet.includes('value');
    for (const check of unmet) if (check === 'value' || !valueFails) add(removes, check);
    if (unmet.length === 1) add(alone, unmet[0]!);
    if (verdict === 'met') met.push(index.columns.partId[position]!);
    if (verdict === 'unrated') unrated.push(index.columns.partId[position]!);
  }
  const knockouts = checkList
    .map(({ name }) => ({ check: name, removes: removes.get(name) ?? 0, removesAlone: alone.get(name) ?? 0 }))
    .filter((knockout) => knockout.removes > 0 || knockout.removesAlone > 0);
  return { met: met.sort((a, b) => a - b), unrated: unrated.sort((a, b) => a - b), knockouts };
}
