import type { ReactNode, RefObject } from 'react';
import { ColumnChooser } from '../../../components/data-table/column-chooser';
import type { Sort } from '../../../components/data-table/data-column';
import { useTableColumns } from '../../../components/data-table/use-table-columns';
import type { SearchRequest, Show } from '../requests/search-request';
import type { Search } from '../requests/use-search';
import { CountLine } from './count-line';
import { CopyLink } from './copy-link';
import { groupedColumns, narrowColumns, resultColumns } from './result-columns';
import { ResultTable } from './result-table';
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
  ledger: ReactNode;
  /** What stands in place of the rows where there are none. */
  nothing: ReactNode;
  /** The whole address of the search. */
  address: () => string;
}

const rowHeights = { wide: 52, narrow: 112 };

/** The parts that meet the duty, with how many they are and what can be done with the list. */
export function Results(props: ResultsProps) {
  const { search, request, show, grouped, sort, narrow, openPart, scrollRef, onSort, onOpen } = props;
  const table = useTableColumns('results', resultColumns, sort, onSort);
  const total = search.answer?.total ?? 0;
  const unrated = search.answer?.unrated ?? 0;
  // What was asked for when it was answered, not what the switch says by now.
  const rowCount = search.answered?.show === 'met-and-unrated' ? total + unrated : total;
  const shown = narrow ? narrowColumns : table.visible;
  const columns = search.answered?.group === 'company' ? groupedColumns(shown) : shown;
  return (
    <>
      <CountLine
        total={total}
        unrated={unrated}
        byApproval={search.answer?.byApproval ?? {}}
        show={show}
        grouped={grouped}
        onShow={props.onShow}
        onGrouped={props.onGrouped}
      >
        {!narrow && <ColumnChooser choices={table.choices} />}
        <TableActions request={request} rowCount={rowCount} columns={table.visible} />
        <CopyLink address={props.address} />
      </CountLine>
      {props.ledger}
      {rowCount === 0 ? (
        props.nothing
      ) : (
        <ResultTable
          answered={search.answered}
          rowCount={rowCount}
          columns={columns}
          rowHeight={narrow ? rowHeights.narrow : rowHeights.wide}
          sort={sort}
          onSortBy={table.sortBy}
          openPart={openPart}
          onOpen={onOpen}
          scrollRef={scrollRef}
        />
      )}
    </>
  );
}
