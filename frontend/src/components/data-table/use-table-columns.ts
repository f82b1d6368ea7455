import {
  type ColumnVisibilityState,
  columnVisibilityFeature,
  rowSortingFeature,
  tableFeatures,
  useTable,
} from '@tanstack/react-table';
import { useCallback, useMemo, useState } from 'react';
import { rememberColumns, rememberedColumns } from './column-memory';
import type { DataColumn, Sort } from './data-column';

const features = tableFeatures({ columnVisibilityFeature, rowSortingFeature });

/** The table model holds the columns; rows come by index from the server and never pass through it. */
const noRows: never[] = [];

export interface TableColumns<Row> {
  visible: DataColumn<Row>[];
  /** What may be hidden, and whether it is shown now. */
  choices: { id: string; header: string; shown: boolean; toggle: () => void }[];
  sortBy: (columnId: string) => void;
}

/** Which columns are shown, remembered by the table's id, and what the server is asked to sort by. */
export function useTableColumns<Row extends object>(
  tableId: string,
  columns: readonly DataColumn<Row>[],
  sort: Sort | undefined,
  onSort: (sort: Sort | undefined) => void,
): TableColumns<Row> {
  const [columnVisibility, setVisibility] = useState<ColumnVisibilityState>(() => ({
    ...Object.fromEntries(
      columns.filter((column) => column.hiddenAtFirst).map((column) => [column.id, false]),
    ),
    ...rememberedColumns(tableId),
  }));
  const definitions = useMemo(
    () =>
      columns.map((column) => ({
        id: column.id,
        header: column.header,
        accessorFn: (row: Row) => column.plain(row),
        enableHiding: column.fixed !== true,
        enableSorting: column.sortable === true,
        sortDescFirst: false,
      })),
    [columns],
  );
  const sorting = useMemo(
    () => (sort === undefined ? [] : [{ id: sort.column, desc: sort.descending }]),
    [sort],
  );
  const table = useTable({
    features,
    columns: definitions,
    data: noRows,
    manualSorting: true,
    state: { columnVisibility, sorting },
    onColumnVisibilityChange: (updater) => {
      const next = typeof updater === 'function' ? updater(columnVisibility) : updater;
      rememberColumns(tableId, next);
      setVisibility(next);
    },
    onSortingChange: (updater) => {
      const [first] = typeof updater === 'function' ? updater(sorting) : updater;
      onSort(first === undefined ? undefined : { column: first.id, descending: first.desc });
    },
  });

  const sortBy = useCallback((columnId: string) => table.getColumn(columnId)?.toggleSorting(), [table]);
  const visible = useMemo(
    () => columns.filter((column) => column.fixed === true || columnVisibility[column.id] !== false),
    [columns, columnVisibility],
  );
  const choices = table
    .getAllLeafColumns()
    .filter((column) => column.getCanHide())
    .map((column) => ({
      id: column.id,
      header: columns.find((known) => known.id === column.id)?.header ?? column.id,
      shown: column.getIsVisible(),
      toggle: () => column.toggleVisibility(),
    }));
  return { visible, choices, sortBy };
}
