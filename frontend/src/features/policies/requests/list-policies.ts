import { queryOptions, useQuery } from '@tanstack/react-query';
import { client } from '../../../api/client';

/** A published version of a derating policy as lists show it. */
export interface PolicySummary {
  id: number;
  name: string;
  version: number;
  origin: 'company' | 'agency';
  /** Where its figures come from. */
  source: string;
  /** The company's own that holds where nobody names another. */
  inForce: boolean;
  note: string;
}

export async function listPolicies(signal?: AbortSignal): Promise<PolicySummary[]> {
  const { data } = await client.get<{ items: PolicySummary[] }>('/policies', { signal });
  return data.items;
}

export const policyList = queryOptions({
  queryKey: ['policies'],
  queryFn: ({ signal }) => listPolicies(signal),
  staleTime: 300_000,
});

export const usePolicies = () => useQuery(policyList);
