import { queryOptions, useQuery } from '@tanstack/react-query';
import { client } from '../../../api/client';
import type { Schema } from '../../../api/schema';

export type Alternates = Schema<'AlternatesDto'>;
export type Alternate = Schema<'AlternateDto'>;

export async function getAlternates(id: number, signal?: AbortSignal): Promise<Alternates> {
  const { data } = await client.get<Alternates>(`/parts/${id}/alternates`, { signal });
  return data;
}

export const alternates = (id: number) =>
  queryOptions({ queryKey: ['parts', id, 'alternates'], queryFn: ({ signal }) => getAlternates(id, signal) });

export const useAlternates = (id: number) => useQuery(alternates(id));
