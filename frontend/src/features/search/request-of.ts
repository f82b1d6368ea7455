import type { Duty } from '@resistry/engineering/duty/duty';
import { parseQuantity } from '@resistry/engineering/notation/parse-quantity';
import { technologies } from '@resistry/engineering/ratings/technology';
import type { FindState } from './find-address';
import { type Filters, type SearchRequest, sortOf } from './requests/search-request';

const some = <Value>(values: Value[]): Value[] | undefined => (values.length > 0 ? values : undefined);

const ids = (texts: string[]): number[] => texts.map(Number).filter((id) => Number.isInteger(id) && id > 0);

/** Figures that can be read; one from a tampered link that cannot be is left out, as unknown words are. */
const figures = (texts: string[], quantity: 'tolerance' | 'temperature-coefficient'): number[] =>
  texts.flatMap((text) => {
    const parsed = parseQuantity(text, quantity);
    return parsed.ok ? [parsed.value] : [];
  });

/** The filters as the server takes them. */
export function filtersOf({ text, filters, flags }: FindState): Filters {
  return {
    text: text === '' ? undefined : text,
    manufacturers: some(ids(filters.manufacturer)),
    families: some(ids(filters.family)),
    technologies: some(technologies.filter((technology) => filters.technology.includes(technology))),
    sizes: some(filters.size),
    series: some(filters.series),
    tolerances: some(figures(filters.tolerance, 'tolerance')),
    tcrs: some(figures(filters.tcr, 'temperature-coefficient')),
    certificate: flags.certificate ? true : undefined,
    companyPartNumber: flags.numbered ? true : undefined,
    offer: flags.offered ? true : undefined,
  };
}

/** The policy as the server takes it; an id that is none asks for the company's own, as the sentence then says. */
function policyOf(chosen: string | undefined): SearchRequest['policy'] {
  if (chosen === 'none') return 'none';
  const id = Number(chosen);
  return Number.isInteger(id) && id > 0 ? id : undefined;
}

/** The question that Find asks; undefined while something typed cannot be read. */
export function requestOf(state: FindState, duty: Duty | undefined): SearchRequest | undefined {
  if (duty === undefined) return undefined;
  return {
    duty,
    policy: policyOf(state.duty.policy),
    filters: filtersOf(state),
    show: state.show,
    group: state.grouped ? 'company' : undefined,
    sort: sortOf(state.sort),
  };
}
