import { queryOptions, useQuery } from '@tanstack/react-query';
import { client } from '../../../api/client';
import type { Schema } from '../../../api/schema';
import type { FamilyRevision } from './family-revision';

export interface FamilyDetails extends Omit<Schema<'FamilyDetailsDto'>, 'revision'> {
  /** The one in force; absent before the first publication. */
  revision?: FamilyRevision;
}

async function getFamily(id: number, signal: AbortSignal): Promise<FamilyDetails> {
  const { data } = await client.get<FamilyDetails>(`/families/${id}`, { signal });
  return data;
}

const familyDetails = (id: number) =>
  queryOptions({ queryKey: ['families', id], queryFn: ({ signal }) => getFamily(id, signal) });

export const useFamily = (id: number) => useQuery(familyDetails(id));
