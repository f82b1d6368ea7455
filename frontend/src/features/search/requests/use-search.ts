import { useQueries, useQuery } from '@tanstack/react-query';
import { useCallback, useState } from 'react';
import { type SearchAnswer, type SearchItem, pageSize, searchPage } from './search-parts';
import type { SearchRequest } from './search-request';

export interface Search {
  /** The answer to the last request that was answered; the rows and the counts are always of the same one. */
  answer: SearchAnswer | undefined;
  /** A newer request is on its way, and what is shown is still the old answer. */
  waiting: boolean;
  error: Error | null;
  retry: () => void;
  itemAt: (index: number) => SearchItem | undefined;
  showRange: (first: number, last: number) => void;
}

/**
 * Asks the catalogue and keeps the old answer whole until the new one is there. Pages beyond the first are asked for as
 * they come into sight, in any order.
 */
export function useSearch(request: SearchRequest | undefined): Search {
  const [answered, setAnswered] = useState<SearchRequest>();
  const [range, setRange] = useState({ first: 1, last: 1 });
  const head = useQuery(searchPage(request, 1));
  const shown = head.isPlaceholderData || request === undefined ? answered : request;
  if (shown !== answered) {
    setAnswered(shown);
    setRange({ first: 1, last: 1 });
  }

  const pages = Array.from({ length: range.last - range.first + 1 }, (_, at) => range.first + at).filter(
    (page) => page > 1,
  );
  const rest = useQueries({ queries: pages.map((page) => searchPage(shown, page)) });
  const answer = head.data;

  const itemAt = (index: number): SearchItem | undefined => {
    const page = Math.floor(index / pageSize) + 1;
    const query = page === 1 ? head : rest[pages.indexOf(page)];
    return query?.data?.items[index % pageSize];
  };

  const showRange = useCallback((first: number, last: number) => {
    const next = { first: Math.floor(first / pageSize) + 1, last: Math.floor(last / pageSize) + 1 };
    setRange((before) => (before.first === next.first && before.last === next.last ? before : next));
  }, []);

  return {
    answer,
    waiting: head.isPlaceholderData || (head.isFetching && answer === undefined),
    error: head.error,
    retry: () => void head.refetch(),
    itemAt,
    showRange,
  };
}
