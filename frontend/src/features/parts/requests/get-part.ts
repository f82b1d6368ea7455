import type { Ratings } from '@resistry/engineering/ratings/ratings';
import { queryOptions, useQuery } from '@tanstack/react-query';
import { client } from '../../../api/client';
import type { Schema } from '../../../api/schema';

/** A set of ratings for an operating mode; without a name where the size has one mode only. */
export interface PartMode {
  name?: string;
  ratings: Ratings;
}

/** Everything that the catalogue knows of a part. */
export type PartDetails = Omit<Schema<'PartDetailsDto'>, 'modes'> & { modes: PartMode[] };

export async function getPart(id: number, signal?: AbortSignal): Promise<PartDetails> {
  const { data } = await client.get<PartDetails>(`/parts/${id}`, { signal });
  return data;
}

export const partDetails = (id: number) =>
  queryOptions({ queryKey: ['parts', id], queryFn: ({ signal }) => getPart(id, signal) });

export const usePart = (id: number) => useQuery(partDetails(id));
