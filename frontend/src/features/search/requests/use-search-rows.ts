import { useQueries } from '@tanstack/react-query';
import { useCallback, useEffect, useMemo, useRef, useState } from 'react';
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

  // While pages are on their way no others are asked for: each is a search of its own on the server, and whoever flies
  // past a hundred of them wants the last.
  const waiting = answers.some((answer) => answer.isFetching && answer.data === undefined);
  const wanted = useRef(range);
  const settle = useCallback(() => {
    const next = wanted.current;
    setRange((before) => (before.first === next.first && before.last === next.last ? before : next));
  }, []);
  const held = useRef(waiting);
  useEffect(() => {
    held.current = waiting;
    if (!waiting) settle();
  }, [waiting, settle]);

  const showRange = useCallback(
    (first: number, last: number) => {
      wanted.current = { first: pageOf(first), last: pageOf(last) };
      if (!held.current) settle();
    },
    [settle],
  );

  return { itemAt, showRange };
}
