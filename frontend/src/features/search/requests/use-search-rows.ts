import { useQueries } from '@tanstack/react-query';
import { useCallback, useMemo, useState } from 'react';
import { type SearchItem, pageSize, searchPage } from './search-parts';
import type { SearchRequest } from './search-request';

export interface SearchRows {
  /** The row at an index, or undefined while its page is on its way. */
  itemAt: (index: number) => SearchItem | undefined;
  showRange: (first: number, last: number) => void;
}

const pageOf = (index: number): number => Math.floor(index / pageSize) + 1;

/** The rows of an answered search; their pages are asked for as they come into sight, in any order. */
export function useSearchRows(request: SearchRequest | undefined): SearchRows {
  const [range, setRange] = useState({ first: 1, last: 1 });
  const pages = useMemo(
    () => Array.from({ length: range.last - range.first + 1 }, (_, at) => range.first + at),
    [range],
  );
  const answers = useQueries({
    queries: pages.map((page) => ({ ...searchPage(request, page), placeholderData: undefined })),
  });

  const itemAt = (index: number): SearchItem | undefined =>
    answers[pageOf(index) - range.first]?.data?.items[index % pageSize];

  const showRange = useCallback((first: number, last: number) => {
    const next = { first: pageOf(first), last: pageOf(last) };
    setRange((before) => (before.first === next.first && before.last === next.last ? before : next));
  }, []);

  return { itemAt, showRange };
}
