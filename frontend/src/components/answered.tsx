import type { UseQueryResult } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Failed, Loading } from './states';

export interface AnsweredProps<Data> {
  query: UseQueryResult<Data>;
  /** What is being waited for. */
  label: string;
  lines?: number;
  children: (data: Data) => ReactNode;
}

/** What a question to the server answered, or that it is being waited for, failed or is forbidden. */
export function Answered<Data>({ query, label, lines, children }: AnsweredProps<Data>) {
  if (query.isPending) return <Loading label={label} lines={lines} />;
  if (query.isError) return <Failed error={query.error} onRetry={() => void query.refetch()} />;
  return <>{children(query.data)}</>;
}
