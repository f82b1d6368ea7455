import type { Duty } from '@resistry/engineering/duty/duty';
import { parseQuantity } from '@resistry/engineering/notation/parse-quantity';
import type { FindState } from './find-address';
import { type Filters, type SearchRequest, sortOf } from './requests/search-request';

const some = (values: string[]): string[] | undefined => (values.length > 0 ? values : undefined);

/** The filters as the server takes them, or undefined while a limit cannot be read. */
export function filtersOf(state: FindState): Filters | undefined {
  const tolerance = state.tolerance.trim() === '' ? undefined : parseQuantity(state.tolerance, 'tolerance');
  const tcr = state.tcr.trim() === '' ? undefined : parseQuantity(state.tcr, 'temperature-coefficient');
  if (tolerance?.ok === false || tcr?.ok === false) return undefined;
  return {
    text: state.text === '' ? undefined : state.text,
    manufacturers: some(state.filters.manufacturer),
    families: some(state.filters.family),
    technologies: some(state.filters.technology),
    sizes: some(state.filters.size),
    series: some(state.filters.series),
    certificates: some(state.filters.certificate),
    tolerance: tolerance?.value,
    tcr: tcr?.value,
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
  const filters = filtersOf(state);
  if (duty === undefined || filters === undefined) return undefined;
  return {
    duty,
    policy: policyOf(state.duty.policy),
    filters,
    show: state.show,
    group: state.grouped ? 'company' : undefined,
    sort: sortOf(state.sort),
  };
}
