import type { Assessment } from '@resistry/engineering/assessment/assess';
import type { PolicyEntry } from '@resistry/engineering/derating/policy-entry';
import type { Duty } from '@resistry/engineering/duty/duty';
import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import { client } from '../../../api/client';

/** An assessment as the server answers it: which policy it was made under, and the entry in force. */
export interface PartAssessment extends Assessment {
  policy: { id: string; version: number; name?: string; entry?: PolicyEntry } | 'none' | 'inline';
}

export interface AssessmentRequest {
  duty: Duty;
  policy?: string;
}

export async function assessPart(
  id: number,
  request: AssessmentRequest,
  signal?: AbortSignal,
): Promise<PartAssessment> {
  const { data } = await client.post<PartAssessment>(`/parts/${id}/assessment`, request, { signal });
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
