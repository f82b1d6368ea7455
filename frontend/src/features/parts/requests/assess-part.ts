import type { Duty } from '@resistry/engineering/duty/duty';
import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import { client } from '../../../api/client';
import type { AnsweredAssessment } from '../../../components/assessment/answered-assessment';
import type { SearchRequest } from '../../search/requests/search-request';

export interface AssessmentRequest {
  duty: Duty;
  policy?: SearchRequest['policy'];
}

export async function assessPart(
  id: number,
  request: AssessmentRequest,
  signal?: AbortSignal,
): Promise<AnsweredAssessment> {
  const { data } = await client.post<AnsweredAssessment>(`/parts/${id}/assessment`, request, { signal });
  return data;
}

export const partAssessment = (id: number, request: AssessmentRequest | undefined) =>
  queryOptions({
    queryKey: ['parts', id, 'assessment', request],
    queryFn: ({ signal }) => {
      if (request === undefined) throw new Error('An assessment that is not enabled was run.');
      return assessPart(id, request, signal);
    },
    enabled: request !== undefined,
    placeholderData: keepPreviousData,
  });

export const usePartAssessment = (id: number, request: AssessmentRequest | undefined) =>
  useQuery(partAssessment(id, request));
