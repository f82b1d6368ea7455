import type { Duty } from '@resistry/engineering/duty/duty';
import type { Technology } from '@resistry/engineering/ratings/technology';
import type { Sort } from '../../../components/data-table/data-column';

export type Show = 'met' | 'met-and-unrated';

/** What narrows the catalogue beside the duty. */
export interface Filters {
  text?: string;
  /** Ids. */
  manufacturers?: number[];
  families?: number[];
  technologies?: Technology[];
  /** Codes. */
  sizes?: string[];
  series?: string[];
  /** Fractions. */
  tolerances?: number[];
  /** 1/K. */
  tcrs?: number[];
  /** Has a safety certificate in date. */
  certificate?: boolean;
  /** Stands under a company part number. */
  companyPartNumber?: boolean;
  /** Has an offer in force at 1,000 pieces. */
  offer?: boolean;
}

/** One question to the catalogue, without the page. */
export interface SearchRequest {
  duty: Duty;
  /** Id of a version, or `none`; absent for the company's policy in force. */
  policy?: number | 'none';
  filters?: Filters;
  show: Show;
  group?: 'company';
  /** A column, with a minus before it for falling order. */
  sort?: string;
}

export function sortOf(sort: Sort | undefined): SearchRequest['sort'] {
  return sort && `${sort.descending ? '-' : ''}${sort.column}`;
}
