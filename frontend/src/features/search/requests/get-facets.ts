import { queryOptions, useQuery } from '@tanstack/react-query';
import { client } from '../../../api/client';
import type { Schema } from '../../../api/schema';

/** What a search can be narrowed to, with how many parts of the whole catalogue each value has. */
export type Facets = Schema<'FacetsDto'>;

export async function getFacets(signal?: AbortSignal): Promise<Facets> {
  const { data } = await client.get<Facets>('/facets', { signal });
  return data;
}

export const facets = queryOptions({
  queryKey: ['facets'],
  queryFn: ({ signal }) => getFacets(signal),
  staleTime: 300_000,
});

export const useFacets = () => useQuery(facets);
