import type { PolicyEntry } from '@resistry/engineering/derating/policy-entry';
import { formatQuantity } from '@resistry/engineering/notation/format-quantity';
import type { Technology } from '@resistry/engineering/ratings/technology';
import { mountingWords, technologyWords } from '../../wording/technology-words';

/** Which parts an entry is for: `Thick film, thin film; surface; to ±1 %`, or every part. */
export function policyMatchWords({ technology, mounting, style, tolerance }: PolicyEntry['match']): string {
  const technologies: readonly Technology[] =
    technology === undefined ? [] : typeof technology === 'string' ? [technology] : technology;
  const words = [
    ...(technologies.length > 0 ? [technologies.map((each) => technologyWords[each]).join(', ')] : []),
    ...(mounting === undefined ? [] : [mountingWords[mounting].toLowerCase()]),
    ...(style === undefined ? [] : [`style ${style}`]),
    ...(tolerance === undefined ? [] : [`to ${formatQuantity(tolerance, 'tolerance')}`]),
  ];
  return words.length === 0 ? 'every other part' : words.join('; ');
}
