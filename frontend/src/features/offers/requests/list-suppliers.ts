import { queryOptions, useQuery } from '@tanstack/react-query';
import { client } from '../../../api/client';
import type { Schema } from '../../../api/schema';

export type Supplier = Schema<'NamedDto'>;

export async function listSuppliers(signal?: AbortSignal): Promise<Supplier[]> {
  const { data } = await client.get<Schema<'SupplierList'>>('/suppliers', { signal });
  return data.items;
}

export const suppliers = queryOptions({
  queryKey: ['suppliers'],
  queryFn: ({ signal }) => listSuppliers(signal),
});

export const useSuppliers = () => useQuery(suppliers);
