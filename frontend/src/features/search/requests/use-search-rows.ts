import { useQueries } from '@tanstack/react-query';
import { useCallback, useEffect, useMemo, useRef, useState } from 'react';
import { type SearchItem, pageSize, searchPage } from './search-parts';
import type { SearchRequest } from './search-request';

export interface SearchRows {
  /** The row at an index, or undefined while its page is on its way. */
  itemAt: (index: number) => SearchItem | undefined;
  /** Tells which rows are in sight, and how many there are. */
  showRange: (first: number, last: number, count: number) => void;
  /** Why a page in sight did not come. */
  error: Error | null;
  retry: () => void;
}

/** Whoever passes a page faster than this flies past it, and wants only the one where the flight ends. */
const flightMilliseconds = 70;

/** Rows asked for beyond those in sight, in the direction in which they move. */
const ahead = pageSize / 2;

const pageOf = (index: number): number => Math.floor(index / pageSize) + 1;

/** The rows of an answered search; their pages are asked for as they come into sight, in any order. */
export function useSearchRows(request: SearchRequest | undefined): SearchRows {
  const [range, setRange] = useState({ first: 1, last: 1 });
  const pages = useMemo(
    () => Array.from({ length: range.last - range.first + 1 }, (_, at) => range.first + at),
    [range],
  );
  const answers = useQueries({ queries: pages.map((page) => searchPage(request, page)) });
  const itemAt = (index: number): SearchItem | undefined =>
    answers[pageOf(index) - range.first]?.data?.items[index % pageSize];

  const wanted = useRef({ ...range, firstRow: 0, at: -Infinity });
  const settle = useCallback(() => {
    const { first, last } = wanted.current;
    setRange((before) => (before.first === first && before.last === last ? before : { first, last }));
  }, []);

  // While pages are on their way no others are asked for, because each is a search of its own on the server.
  const waiting = answers.some((answer) => answer.isFetching && answer.data === undefined);
  const held = useRef(waiting);
  const flight = useRef<ReturnType<typeof setTimeout>>(undefined);
  useEffect(() => {
    held.current = waiting;
    if (!waiting && flight.current === undefined) settle();
  }, [waiting, settle]);
  useEffect(() => () => clearTimeout(flight.current), []);

  const showRange = useCallback(
    (firstRow: number, lastRow: number, count: number) => {
      const before = wanted.current;
      const up = firstRow < before.firstRow;
      const down = firstRow > before.firstRow;
      before.firstRow = firstRow;
      const first = pageOf(up ? Math.max(0, firstRow - ahead) : firstRow);
      const last = pageOf(down ? Math.min(count - 1, lastRow + ahead) : lastRow);
      if (first === before.first && last === before.last) return;
      const at = performance.now();
      wanted.current = { first, last, firstRow, at };
      clearTimeout(flight.current);
      const land = (): void => {
        flight.current = undefined;
        if (!held.current) settle();
      };
      if (at - before.at > flightMilliseconds) land();
      else flight.current = setTimeout(land, flightMilliseconds);
    },
    [settle],
  );

  const failed = answers.filter((answer) => answer.isError);
  return {
    itemAt,
    showRange,
    error: failed[0]?.error ?? null,
    retry: () => {
      for (const answer of failed) void answer.refetch();
    },
  };
}
