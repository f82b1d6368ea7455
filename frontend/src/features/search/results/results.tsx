import { type RefObject, memo, useCallback } from 'react';
import { ColumnChooser } from '../../../components/data-table/column-chooser';
import type { Sort } from '../../../components/data-table/data-column';
import { useTableColumns } from '../../../components/data-table/use-table-columns';
import { FilterChips } from '../filters/filter-chips';
import { withoutFilters } from '../filters/without-filters';
import { type FindState, isNarrowed } from '../find-address';
import { Steady, Wide } from '../find-layout';
import { Ledger } from '../ledger/ledger';
import type { ChangeDuty } from '../panel/change-duty';
import type { Show } from '../requests/search-request';
import type { Answered } from '../requests/use-search';
import type { ChangeFind } from '../use-find-state';
import { CopyLink } from './copy-link';
import { CountLine } from './count-line';
import { NothingMeets } from './nothing-meets';
import { OrderChoice } from './order-choice';
import { groupedColumns, narrowColumns, resultColumns } from './result-columns';
import { ResultTable } from './result-table';
import { TableActions } from './table-actions';

export interface ResultsProps extends Pick<FindState, 'text' | 'filters' | 'flags' | 'show' | 'grouped'> {
  answered: Answered;
  sort: Sort | undefined;
  narrow: boolean;
  /** Id of the part whose sheet is open. */
  openPart: number | undefined;
  scrollRef: RefObject<HTMLElement | null>;
  onChange: ChangeFind;
  onChangeDuty: ChangeDuty;
  /** The whole address of the search. */
  address: () => string;
}

/** px; a row on a narrow screen has more to say under a number, which has its count of sources beside it. */
const rowHeights = { wide: 52, narrow: 112, narrowGrouped: 128 };

/** The parts that meet the duty, with how many they are, what keeps the others out and what can be done with the list. */
export const Results = memo(function Results(props: ResultsProps) {
  const { answered, text, filters, flags, show, grouped, sort, narrow, openPart, scrollRef } = props;
  const { onChange, onChangeDuty } = props;
  const { answer, question } = answered;
  const onSort = useCallback(
    (next: Sort | undefined) => onChange((before) => ({ ...before, sort: next })),
    [onChange],
  );
  const onShow = useCallback((next: Show) => onChange((before) => ({ ...before, show: next })), [onChange]);
  const onGrouped = useCallback(
    (next: boolean) => onChange((before) => ({ ...before, grouped: next })),
    [onChange],
  );
  const onOpen = useCallback((part: number) => onChange((before) => ({ ...before, part })), [onChange]);
  const table = useTableColumns('results', resultColumns, sort, onSort);
  // What was asked for when it was answered, not what the switches say by now.
  const rowCount = question.state.show === 'met-and-unrated' ? answer.total + answer.unrated : answer.total;
  const shown = narrow ? narrowColumns : table.visible;
  const columns = question.state.grouped ? groupedColumns(shown) : shown;
  return (
    <>
      <Steady>
        <CountLine
          total={answer.total}
          unrated={answer.unrated}
          byApproval={answer.byApproval}
          show={show}
          grouped={grouped}
          onShow={onShow}
          onGrouped={onGrouped}
        >
          {!narrow && <ColumnChooser choices={table.choices} />}
          <TableActions request={question.request} rowCount={rowCount} columns={table.visible} />
          <CopyLink address={props.address} />
        </CountLine>
        <Ledger answer={answer} duty={question.state.duty} onChange={onChangeDuty} />
        <FilterChips text={text} filters={filters} flags={flags} onChange={onChange} />
        {narrow && rowCount > 1 && <OrderChoice columns={resultColumns} sort={sort} onSort={onSort} />}
        {rowCount === 0 && (
          <NothingMeets
            answer={answer}
            duty={question.state.duty}
            narrowed={isNarrowed(question.state)}
            onChange={onChangeDuty}
            onShowUnrated={() => onShow('met-and-unrated')}
            onWithoutFilters={() => onChange(withoutFilters)}
          />
        )}
      </Steady>
      {rowCount > 0 && (
        <Wide>
          <ResultTable
            answered={question.request}
            rowCount={rowCount}
            columns={columns}
            rowHeight={rowHeights[!narrow ? 'wide' : question.state.grouped ? 'narrowGrouped' : 'narrow']}
            sort={sort}
            onSortBy={table.sortBy}
            openPart={openPart}
            onOpen={onOpen}
            scrollRef={scrollRef}
          />
        </Wide>
      )}
    </>
  );
});
