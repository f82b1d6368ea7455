import { useInfiniteQuery } from '@tanstack/react-query';
import { client } from '../../../api/client';
import type { Schema } from '../../../api/schema';

export type AuditEntry = Schema<'AuditEntry'>;

/** As the server takes it; what is undefined narrows nothing. */
export interface AuditQuery {
  subjectType?: string;
  subjectId?: string;
  /** Id of the person who acted. */
  actor?: string;
  action?: string;
  text?: string;
  /** ISO 8601, inclusive. */
  from?: string;
  /** ISO 8601, exclusive. */
  to?: string;
}

const pageSize = 50;

async function listAudit(
  query: AuditQuery,
  before: number | undefined,
  signal: AbortSignal,
): Promise<Schema<'AuditPage'>> {
  const { data } = await client.get<Schema<'AuditPage'>>('/audit', {
    params: { ...query, before, limit: pageSize },
    signal,
  });
  return data;
}

/** The trail, the newest first; older pages are read on demand, each from where the one before ended. */
export function useAuditTrail(query: AuditQuery) {
  return useInfiniteQuery({
    queryKey: ['audit', query],
    queryFn: ({ pageParam, signal }) => listAudit(query, pageParam, signal),
    initialPageParam: undefined as number | undefined,
    getNextPageParam: (page) => page.next,
  });
}
