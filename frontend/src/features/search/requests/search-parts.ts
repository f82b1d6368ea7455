import type { CheckName } from '@resistry/engineering/checks/check';
import type { Approval } from '@resistry/engineering/ratings/technology';
import { queryOptions } from '@tanstack/react-query';
import { client } from '../../../api/client';
import type { AnsweredAssessment } from '../../../components/assessment/answered-assessment';
import type { SearchPart } from '../search-part';
import type { SearchRequest } from './search-request';

export interface SearchItem {
  part: SearchPart;
  assessment: AnsweredAssessment;
  /** With `group: 'company'`: the approved sources under the number, each with its own assessment. */
  companyPartNumber?: { id: number; number: string };
  sources?: { part: SearchPart; assessment: AnsweredAssessment }[];
  /** It stands beneath its number, as one of its sources. */
  beneath?: boolean;
  /** What it has far more of than is asked, in words, the largest first. */
  overSpecification: string[];
}

export interface Knockout {
  check: CheckName;
  removes: number;
  removesAlone: number;
}

/** The smallest change of one demand that brings parts back, and how many. */
export interface Relaxation {
  /** JSON pointer into the duty. */
  field: string;
  to: unknown;
  gains: number;
}

export interface SearchAnswer {
  total: number;
  unrated: number;
  /** The total by approval. */
  byApproval: Partial<Record<Approval, number>>;
  items: SearchItem[];
  knockouts: Knockout[];
  relaxations: Relaxation[];
}

/** As many as fill a tall screen: with its assessment a row weighs more than its search. */
export const pageSize = 30;

export async function searchParts(
  request: SearchRequest,
  page: number,
  size: number,
  signal?: AbortSignal,
): Promise<SearchAnswer> {
  const { data } = await client.post<SearchAnswer>(
    '/parts/search',
    { ...request, page, pageSize: size },
    { signal },
  );
  return data;
}

/** One page of an answer. Pages count from 1. */
export const searchPage = (request: SearchRequest | undefined, page: number) =>
  queryOptions({
    queryKey: ['parts', 'search', request, page],
    queryFn: ({ signal }) => {
      if (request === undefined) throw new Error('A search that is not enabled was run.');
      return searchParts(request, page, pageSize, signal);
    },
    enabled: request !== undefined,
    staleTime: 20_000,
    // A page of assessments is large, and comparing two of them costs more than drawing the rows again.
    structuralSharing: false,
  });
