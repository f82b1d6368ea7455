import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import { client } from '../../../api/client';
import type { Schema } from '../../../api/schema';

export type FamilySummary = Schema<'FamilySummaryDto'>;

/** What the list is narrowed to; empty texts narrow nothing. */
export interface FamilyFilter {
  /** Words that code, name and manufacturer together must all contain. */
  text: string;
  technology: string;
  /** Id of the manufacturer. */
  manufacturer: string;
}

async function listFamilies(filter: FamilyFilter, signal: AbortSignal): Promise<FamilySummary[]> {
  const { data } = await client.get<Schema<'FamilyListDto'>>('/families', {
    params: {
      q: filter.text.trim() || undefined,
      technology: filter.technology || undefined,
      manufacturer: filter.manufacturer || undefined,
    },
    signal,
  });
  return data.items;
}

const familyList = (filter: FamilyFilter) =>
  queryOptions({
    queryKey: ['families', 'list', filter],
    queryFn: ({ signal }) => listFamilies(filter, signal),
    placeholderData: keepPreviousData,
  });

export const useFamilies = (filter: FamilyFilter) => useQuery(familyList(filter));
