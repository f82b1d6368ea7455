import { chakra } from '@chakra-ui/react';
import { type RefObject, useCallback, useMemo, useState } from 'react';
import type { DataColumn, Sort } from '../../../components/data-table/data-column';
import { DataTable } from '../../../components/data-table/data-table';
import type { RowTree } from '../../../components/data-table/row-tree';
import { Failed } from '../../../components/states';
import { type SearchItem, pageSize } from '../requests/search-parts';
import type { SearchRequest } from '../requests/search-request';
import { useSearchRows } from '../requests/use-search-rows';
import { type Unfolded, countOfRows, rowAtPlace, rowOfSource } from './unfolded-rows';

export interface ResultTableProps {
  /** The request whose answer is shown. */
  answered: SearchRequest | undefined;
  rowCount: number;
  columns: readonly DataColumn<SearchItem>[];
  rowHeight: number;
  sort: Sort | undefined;
  onSortBy: (columnId: string) => void;
  /** Id of the part whose sheet is open. */
  openPart: number | undefined;
  onOpen: (partId: number) => void;
  scrollRef: RefObject<HTMLElement | null>;
}

const keyOf = ({ part, sources, companyPartNumber }: SearchItem): string =>
  sources === undefined ? `part ${part.id}` : `number ${companyPartNumber?.id ?? part.id}`;

const noneUnfolded: Unfolded = new Map();

/** The rows of a search. Scrolling through pages draws nothing but this. */
export function ResultTable({ answered, rowCount, openPart, onOpen, ...table }: ResultTableProps) {
  const { itemAt, showRange, error, retry } = useSearchRows(answered);
  const [openPlace, setOpenPlace] = useState<number>();
  const [unfoldedOf, setUnfolded] = useState<{ question: string; unfolded: Unfolded }>();
  const question = JSON.stringify(answered);
  // Places mean something only within the answer they were unfolded in.
  const unfolded = unfoldedOf?.question === question ? unfoldedOf.unfolded : noneUnfolded;

  const rowAt = (place: number): SearchItem | undefined => {
    const { item, source } = rowAtPlace(place, unfolded);
    const found = itemAt(item);
    return source === undefined || found === undefined ? found : rowOfSource(found, source);
  };
  const open = (place: number): void => {
    const row = rowAt(place);
    if (row === undefined) return;
    setOpenPlace(place);
    onOpen(row.part.id);
  };
  const visible = useCallback(
    (first: number, last: number) =>
      showRange(rowAtPlace(first, unfolded).item, rowAtPlace(last, unfolded).item, rowCount),
    [showRange, unfolded, rowCount],
  );
  const toggle = (place: number): void => {
    const { item, source } = rowAtPlace(place, unfolded);
    const sources = itemAt(item)?.sources?.length;
    if (source !== undefined || sources === undefined) return;
    const next = new Map(unfolded);
    if (!next.delete(item)) next.set(item, sources);
    setUnfolded({ question, unfolded: next });
  };
  const tree: RowTree = {
    levelAt: (place) => (rowAtPlace(place, unfolded).source === undefined ? 1 : 2),
    openAt: (place) => {
      const { item, source } = rowAtPlace(place, unfolded);
      return source === undefined && itemAt(item)?.sources !== undefined ? unfolded.has(item) : undefined;
    },
    toggle,
  };
  const shownCount = useMemo(() => countOfRows(rowCount, unfolded), [rowCount, unfolded]);
  const isOpen = (place: number | undefined): boolean =>
    place !== undefined && openPart !== undefined && rowAt(place)?.part.id === openPart;
  // A link says which part is open, but not where it stands; it is marked where it is one of the first.
  const firstPlaces = Array.from({ length: Math.min(shownCount, pageSize) }, (_, place) => place);
  const selected = isOpen(openPlace)
    ? openPlace
    : openPart === undefined
      ? undefined
      : firstPlaces.find(isOpen);
  return (
    <>
      <DataTable
        label="Parts that meet the duty"
        rowAt={rowAt}
        rowCount={shownCount}
        rowKey={keyOf}
        onVisible={visible}
        selectedIndex={selected}
        onOpen={open}
        tree={answered?.group === 'company' ? tree : undefined}
        {...table}
      />
      {error !== null && (
        <chakra.div position="sticky" bottom={0} bg="bg" borderTop="1px solid" borderColor="border">
          <Failed error={error} onRetry={retry} />
        </chakra.div>
      )}
    </>
  );
}
