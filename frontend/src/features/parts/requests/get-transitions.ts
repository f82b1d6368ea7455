import { queryOptions, useQuery } from '@tanstack/react-query';
import { client } from '../../../api/client';
import type { Schema } from '../../../api/schema';

export type Transitions = Schema<'TransitionsDto'>;
export type ApprovalTransition = Schema<'ApprovalTransitionDto'>;
export type SupplyTransition = Schema<'SupplyTransitionDto'>;
export type Demand = Schema<'DemandDto'>;

export async function getTransitions(id: number, signal?: AbortSignal): Promise<Transitions> {
  const { data } = await client.get<Transitions>(`/parts/${id}/transitions`, { signal });
  return data;
}

export const transitions = (id: number) =>
  queryOptions({
    queryKey: ['parts', id, 'transitions'],
    queryFn: ({ signal }) => getTransitions(id, signal),
    staleTime: 0,
  });

export const useTransitions = (id: number) => useQuery(transitions(id));
