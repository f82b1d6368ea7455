import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { client } from '../../../api/client';
import type { Schema } from '../../../api/schema';

export type ListedBackup = Schema<'ListedBackupDetails'>;

async function listBackups(signal: AbortSignal): Promise<ListedBackup[]> {
  const { data } = await client.get<Schema<'BackupList'>>('/backups', { signal });
  return data.items;
}

const backupList = queryOptions({ queryKey: ['backups'], queryFn: ({ signal }) => listBackups(signal) });

export const useBackups = () => useQuery(backupList);

async function takeBackup(): Promise<Schema<'BackupDetails'>> {
  const { data } = await client.post<Schema<'BackupDetails'>>('/backups', {});
  return data;
}

export function useTakeBackup() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: takeBackup,
    onSuccess: () => queryClient.invalidateQueries({ queryKey: backupList.queryKey }),
  });
}

async function checkBackup(name: string): Promise<Schema<'BackupCheck'>> {
  const { data } = await client.post<Schema<'BackupCheck'>>(`/backups/${encodeURIComponent(name)}/check`, {});
  return data;
}

/** Reads a backup through and says whether it could be restored. */
export const useCheckBackup = () => useMutation({ mutationFn: checkBackup });
