import { queryOptions, useQuery } from '@tanstack/react-query';
import { client } from '../../../api/client';
import type { Schema } from '../../../api/schema';

export type UserDetails = Schema<'UserDetails'>;

async function listUsers(signal: AbortSignal): Promise<UserDetails[]> {
  const { data } = await client.get<Schema<'UserList'>>('/users', { signal });
  return data.items;
}

const userList = queryOptions({ queryKey: ['users'], queryFn: ({ signal }) => listUsers(signal) });

export const useUsers = () => useQuery(userList);
