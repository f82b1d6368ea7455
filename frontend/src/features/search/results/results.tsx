import { type RefObject, useCallback, useState } from 'react';
import { ColumnChooser } from '../../../components/data-table/column-chooser';
import type { Sort } from '../../../components/data-table/data-column';
import { DataTable } from '../../../components/data-table/data-table';
import { useTableColumns } from '../../../components/data-table/use-table-columns';
import { Empty } from '../../../components/states';
import type { SearchItem } from '../requests/search-parts';
import type { SearchRequest, Show } from '../requests/search-request';
import type { Search } from '../requests/use-search';
import { CountLine } from './count-line';
import { narrowColumns, resultColumns } from './result-columns';
import { TableActions } from './table-actions';

export interface ResultsProps {
  search: Search;
  request: SearchRequest | undefined;
  show: Show;
  grouped: boolean;
  sort: Sort | undefined;
  narrow: boolean;
  /** Id of the part whose sheet is open. */
  openPart: number | undefined;
  scrollRef: RefObject<HTMLElement | null>;
  onSort: (sort: Sort | undefined) => void;
  onShow: (show: Show) => void;
  onGrouped: (grouped: boolean) => void;
  onOpen: (partId: number) => void;
  /** What stands between the count and the rows. */
  ledger: React.ReactNode;
}

const rowHeights = { wide: 52, narrow: 112 };
const keyOf = ({ part }: SearchItem): number => part.id;

/** The parts that meet the duty, with how many they are and what can be done with the list. */
export function Results(props: ResultsProps) {
  const { search, request, show, grouped, sort, narrow, openPart, scrollRef, onSort, onOpen, ledger } = props;
  const table = useTableColumns('results', resultColumns, sort, onSort);
  const columns = narrow ? narrowColumns : table.visible;
  const [openIndex, setOpenIndex] = useState<number>();
  const { itemAt, showRange, answer } = search;
  const total = answer?.total ?? 0;
  const unrated = answer?.unrated ?? 0;
  const rowCount = show === 'met' ? total : total + unrated;

  const open = useCallback(
    (index: number) => {
      const item = itemAt(index);
      if (item === undefined) return;
      setOpenIndex(index);
      onOpen(item.part.id);
    },
    [itemAt, onOpen],
  );

  const selected = openIndex !== undefined && itemAt(openIndex)?.part.id === openPart ? openIndex : undefined;
  return (
    <>
      <CountLine
        total={total}
        unrated={unrated}
        show={show}
        grouped={grouped}
        onShow={props.onShow}
        onGrouped={props.onGrouped}
      >
        {!narrow && <ColumnChooser choices={table.choices} />}
        <TableActions request={request} rowCount={rowCount} columns={table.visible} />
      </CountLine>
      {ledger}
      {rowCount === 0 ? (
        <Empty title="No part meets all of this">
          The ledger says what each demand removes; the sentence above can be loosened number by number.
          {unrated > 0 && ' Some parts cannot be told for lack of data; they can be shown.'}
        </Empty>
      ) : (
        <DataTable
          label="Parts that meet the duty"
          columns={columns}
          rowCount={rowCount}
          rowAt={itemAt}
          rowKey={keyOf}
          onVisible={showRange}
          rowHeight={narrow ? rowHeights.narrow : rowHeights.wide}
          sort={sort}
          onSortBy={table.sortBy}
          selectedIndex={selected}
          onOpen={open}
          scrollRef={scrollRef}
        />
      )}
    </>
  );
}
