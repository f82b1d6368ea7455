import type { Policy } from '@resistry/engineering/derating/policy-entry';
import type { Duty } from '@resistry/engineering/duty/duty';
import type { CheckName } from '@resistry/engineering/checks/check';

/** Columns that a search can be sorted by; `preference` is preference, price, least excess, id. */
export const sortColumns = [
  'preference',
  'part-number',
  'company-part-number',
  'manufacturer',
  'family',
  'size',
  'resistance',
  'tolerance',
  'tcr',
  'dissipation',
  'margin',
  'excess',
  'approval',
  'supply',
  'price',
] as const;
export type SortColumn = (typeof sortColumns)[number];

export interface Sort {
  by: SortColumn;
  descending: boolean;
}

/** Filters beside the duty; an absent one accepts every part. */
export interface PartFilters {
  manufacturers?: readonly number[];
  families?: readonly number[];
  technologies?: readonly string[];
  sizes?: readonly string[];
  series?: readonly string[];
  tolerances?: readonly number[];
  tcrs?: readonly number[];
  certificate?: boolean;
  approvals?: readonly string[];
  supply?: readonly string[];
  companyPartNumber?: boolean;
  offer?: boolean;
  /** Ids of the parts that a text search found. */
  partIds?: readonly number[];
}

/** A search as the engine takes it. */
export interface SearchPlan {
  duty: Duty;
  policy: Policy;
  filters: PartFilters;
  showUnrated: boolean;
  byCompanyNumber: boolean;
  sort: Sort;
  offset: number;
  limit: number;
  relaxations: boolean;
}

export interface Knockout {
  check: CheckName;
  /** Parts unmet at this check. */
  removes: number;
  /** Of those, the parts that nothing else removes. */
  removesAlone: number;
}

/** The smallest change of one demand that brings parts back: a JSON pointer into the duty, its new value, how many. */
export interface Relaxation {
  field: string;
  to: unknown;
  gains: number;
}

/** One line of the page: a part, or a company part number with its judged sources, the worst first. */
export interface FoundItem {
  partId: number;
  companyNumberId?: number;
  sourceIds?: readonly number[];
}

export interface SearchResult {
  total: number;
  unrated: number;
  items: FoundItem[];
  knockouts: Knockout[];
  relaxations: Relaxation[];
  /** Met parts (or company part numbers) by approval, for the line of counts. */
  byApproval: Partial<Record<string, number>>;
  /** Checks of single parts that bounds could not decide. */
  exact: number;
}
