import type { Ratings } from '@resistry/engineering/ratings/ratings';
import { queryOptions, useQuery } from '@tanstack/react-query';
import { client } from '../../../api/client';
import type { SearchPart } from '../../search/search-part';

/** A part with everything the catalogue knows of its ratings. */
export interface PartDetails extends SearchPart {
  /** One set of ratings for each operating mode. */
  modes: { name?: string | null; ratings: Ratings }[];
  version: number;
}

export async function getPart(id: number, signal?: AbortSignal): Promise<PartDetails> {
  const { data } = await client.get<PartDetails>(`/parts/${id}`, { signal });
  return data;
}

export const partDetails = (id: number) =>
  queryOptions({ queryKey: ['parts', id], queryFn: ({ signal }) => getPart(id, signal) });

export const usePart = (id: number) => useQuery(partDetails(id));
