import { queryOptions, useQuery } from '@tanstack/react-query';
import { client } from '../../../api/client';
import type { FamilyRevision } from './family-revision';

async function getFamilyRevision(id: number, number: number, signal: AbortSignal): Promise<FamilyRevision> {
  const { data } = await client.get<FamilyRevision>(`/families/${id}/revisions/${number}`, { signal });
  return data;
}

const familyRevision = (id: number, number: number) =>
  queryOptions({
    queryKey: ['families', id, 'revisions', number],
    queryFn: ({ signal }) => getFamilyRevision(id, number, signal),
  });

export const useFamilyRevision = (id: number, number: number) => useQuery(familyRevision(id, number));
