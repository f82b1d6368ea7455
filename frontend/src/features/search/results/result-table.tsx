import { type RefObject, useState } from 'react';
import type { DataColumn, Sort } from '../../../components/data-table/data-column';
import { DataTable } from '../../../components/data-table/data-table';
import type { SearchItem } from '../requests/search-parts';
import type { SearchRequest } from '../requests/search-request';
import { useSearchRows } from '../requests/use-search-rows';

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

const keyOf = ({ part }: SearchItem): number => part.id;

/** The rows of a search. Scrolling through pages draws nothing but this. */
export function ResultTable({ answered, openPart, onOpen, ...table }: ResultTableProps) {
  const { itemAt, showRange } = useSearchRows(answered);
  const [openIndex, setOpenIndex] = useState<number>();
  const open = (index: number): void => {
    const item = itemAt(index);
    if (item === undefined) return;
    setOpenIndex(index);
    onOpen(item.part.id);
  };
  const selected = openIndex !== undefined && itemAt(openIndex)?.part.id === openPart ? openIndex : undefined;
  return (
    <DataTable
      label="Parts that meet the duty"
      rowAt={itemAt}
      rowKey={keyOf}
      onVisible={showRange}
      selectedIndex={selected}
      onOpen={open}
      {...table}
    />
  );
}
