import { approvals } from '@resistry/engineering/ratings/technology';
import type { CatalogueIndex } from '../index/catalogue-index';

const approvedCodes = new Set([approvals.indexOf('approved'), approvals.indexOf('preferred')]);

/**
 * Positions of the sources that a company part number is judged by: its approved and preferred ones; where it has none,
 * all of them, which the approval check then removes unless the duty asks for their approval.
 */
export function judgedSources(index: CatalogueIndex, number: number): number[] {
  const { sourceFrom, source } = index.companyNumbers;
  const sources = [...source.subarray(sourceFrom[number] ?? 0, sourceFrom[number + 1] ?? 0)];
  const approved = sources.filter((position) => approvedCodes.has(index.columns.approval[position] ?? 0));
  return approved.length > 0 ? approved : sources;
}
