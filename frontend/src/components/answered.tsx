import type { UseQueryResult } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Failed, Loading, NotReadAgain } from './states';

export interface AnsweredProps<Data> {
  query: UseQueryResult<Data>;
  /** What is being waited for. */
  label: string;
  lines?: number;
  children: (data: Data) => ReactNode;
}

/** What a question to the server answered, or that it is being waited for, failed or is forbidden. */
export function Answered<Data>({ query, label, lines, children }: AnsweredProps<Data>) {
  const again = (): void => void query.refetch();
  if (query.isPending) return <Loading label={label} lines={lines} />;
  if (query.data === undefined) return <Failed error={query.error} onRetry={again} />;
  return (
    <>
      {query.isError && <NotReadAgain error={query.error} onRetry={again} />}
      {children(query.data)}
    </>
  );
}
