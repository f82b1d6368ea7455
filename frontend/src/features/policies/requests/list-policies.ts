import { queryOptions, useQuery } from '@tanstack/react-query';
import { client } from '../../../api/client';

/** A version of a derating policy as lists show it. */
export interface PolicySummary {
  id: string;
  name: string;
  version: number;
  /** The company's own policy that holds where nobody names another. */
  published: boolean;
  /** Whose table it is, in the words of the document. */
  source?: string | null;
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
