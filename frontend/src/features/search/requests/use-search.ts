import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { type SearchAnswer, searchPage } from './search-parts';
import type { SearchRequest } from './search-request';

export interface Search {
  /** The answer to `answered`; the rows and the counts are always of the same request. */
  answer: SearchAnswer | undefined;
  answered: SearchRequest | undefined;
  /** A newer request is on its way, and what is shown is still the old answer. */
  waiting: boolean;
  error: Error | null;
  retry: () => void;
}

/** Asks the catalogue and keeps the old answer whole until the new one is there. */
export function useSearch(request: SearchRequest | undefined): Search {
  const [answered, setAnswered] = useState<SearchRequest>();
  const head = useQuery(searchPage(request, 1));
  const shown =
    request !== undefined && head.data !== undefined && !head.isPlaceholderData ? request : answered;
  if (shown !== answered) setAnswered(shown);
  return {
    answer: head.data,
    answered: shown,
    waiting: head.isPlaceholderData || (head.isFetching && head.data === undefined),
    error: head.error,
    retry: () => void head.refetch(),
  };
}
