import { queryOptions, useQuery } from '@tanstack/react-query';
import { client } from '../../../api/client';
import type { Schema } from '../../../api/schema';

async function listManufacturers(signal: AbortSignal): Promise<Schema<'ManufacturerDto'>[]> {
  const { data } = await client.get<Schema<'ManufacturerList'>>('/manufacturers', { signal });
  return data.items;
}

const manufacturerList = queryOptions({
  queryKey: ['manufacturers'],
  queryFn: ({ signal }) => listManufacturers(signal),
  staleTime: 300_000,
});

export const useManufacturers = () => useQuery(manufacturerList);
