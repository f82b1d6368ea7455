import type { DataColumn, Sort } from './data-column';

export interface TableHeadProps<Row> {
  columns: readonly DataColumn<Row>[];
  sort: Sort | undefined;
  onSortBy: (columnId: string) => void;
}

function ariaSort(column: { id: string; sortable?: boolean }, sort: Sort | undefined) {
  if (column.sortable !== true) return undefined;
  if (sort?.column !== column.id) return 'none';
  return sort.descending ? 'descending' : 'ascending';
}

/** The head that stays while the rows pass. Its arrows repeat what `aria-sort` says. */
export function TableHead<Row>({ columns, sort, onSortBy }: TableHeadProps<Row>) {
  return (
    <thead>
      <tr role="row" aria-rowindex={1}>
        {columns.map((column, index) => {
          const sorted = sort?.column === column.id;
          return (
            <th
              key={column.id}
              role="columnheader"
              scope="col"
              aria-colindex={index + 1}
              aria-sort={ariaSort(column, sort)}
              data-align={column.align ?? 'start'}
              data-stays={column.stays === true ? '' : undefined}
            >
              {column.sortable === true ? (
                <button type="button" onClick={() => onSortBy(column.id)}>
                  {column.header}
                  <span aria-hidden="true">{sorted ? (sort.descending ? ' ↓' : ' ↑') : ''}</span>
                </button>
              ) : (
                column.header
              )}
            </th>
          );
        })}
      </tr>
    </thead>
  );
}
