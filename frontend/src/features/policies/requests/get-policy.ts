import type { PolicyEntry } from '@resistry/engineering/derating/policy-entry';
import { queryOptions, useQuery } from '@tanstack/react-query';
import { client } from '../../../api/client';
import type { PolicySummary } from './list-policies';

/** A version with its entries; the first that matches a part is in force for it. */
export interface PolicyVersion extends PolicySummary {
  entries: PolicyEntry[];
}

export async function getPolicy(id: number, signal?: AbortSignal): Promise<PolicyVersion> {
  const { data } = await client.get<PolicyVersion>(`/policies/${id}`, { signal });
  return data;
}

/** A published version never changes, so one reading lasts. */
export const policyVersion = (id: number | undefined) =>
  queryOptions({
    queryKey: ['policies', id],
    queryFn: ({ signal }) => {
      if (id === undefined) throw new Error('A policy that is not named was read.');
      return getPolicy(id, signal);
    },
    enabled: id !== undefined,
    staleTime: Infinity,
  });

export const usePolicy = (id: number | undefined) => useQuery(policyVersion(id));
