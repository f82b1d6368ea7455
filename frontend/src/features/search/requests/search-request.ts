import type { Duty } from '@resistry/engineering/duty/duty';
import type { Sort } from '../../../components/data-table/data-column';

export type Show = 'met' | 'met-and-unrated';

/** What narrows the catalogue beside the duty; lists hold ids or codes. */
export interface Filters {
  text?: string;
  manufacturers?: string[];
  families?: string[];
  technologies?: string[];
  sizes?: string[];
  series?: string[];
  /** Fraction, at most. */
  tolerance?: number;
  /** 1/K, at most. */
  tcr?: number;
  certificates?: string[];
}

/** One question to the catalogue, without the page. */
export interface SearchRequest {
  duty: Duty;
  /** Id of a version, or `none`; absent for the company's policy in force. */
  policy?: number | 'none';
  filters?: Filters;
  show: Show;
  group?: 'company';
  sort?: { by: string; direction: 'ascending' | 'descending' };
}

export function sortOf(sort: Sort | undefined): SearchRequest['sort'] {
  return sort && { by: sort.column, direction: sort.descending ? 'descending' : 'ascending' };
}
