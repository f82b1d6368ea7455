import { queryOptions, useQuery } from '@tanstack/react-query';
import { client } from '../../../api/client';
import type { Schema } from '../../../api/schema';

async function getPermissions(signal: AbortSignal): Promise<Schema<'PermissionTable'>> {
  const { data } = await client.get<Schema<'PermissionTable'>>('/permissions', { signal });
  return data;
}

const permissionTable = queryOptions({
  queryKey: ['permissions'],
  queryFn: ({ signal }) => getPermissions(signal),
});

export const usePermissions = () => useQuery(permissionTable);
