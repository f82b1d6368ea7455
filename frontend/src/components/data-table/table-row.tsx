import { memo } from 'react';
import type { DataColumn } from './data-column';

export interface TableRowProps<Row> {
  /** Undefined until the server has sent it. */
  row: Row | undefined;
  index: number;
  columns: readonly DataColumn<Row>[];
  gridId: string;
  /** The column that has the keyboard; −1 in all rows but one. */
  activeColumn: number;
  selected: boolean;
  /** Its depth in a tree of rows; absent in a plain table. */
  level?: 1 | 2;
  /** Whether it is unfolded; absent for a row with nothing beneath it. */
  unfolded?: boolean;
  onOpen: (index: number) => void;
  onPoint: (row: number, column: number) => void;
  onToggle: (index: number) => void;
}

export const cellId = (gridId: string, row: number, column: number): string => `${gridId}-${row}-${column}`;

function Row<Data>({
  row,
  index,
  columns,
  gridId,
  activeColumn,
  selected,
  level,
  unfolded,
  onOpen,
  onPoint,
  onToggle,
}: TableRowProps<Data>) {
  return (
    // The grid takes the keyboard for all its rows (aria-activedescendant); a click is the same as Enter there.
    <tr
      role="row"
      aria-rowindex={index + 2}
      aria-selected={selected}
      data-level={level}
      data-active={activeColumn >= 0 ? '' : undefined}
      onClick={() => onOpen(index)}
    >
      {columns.map((column, at) => (
        <td
          key={column.id}
          id={cellId(gridId, index, at)}
          role="gridcell"
          aria-colindex={at + 1}
          data-align={column.align ?? 'start'}
          data-stays={column.stays === true ? '' : undefined}
          data-active={at === activeColumn ? '' : undefined}
          title={row === undefined ? undefined : column.hint?.(row)}
          onPointerDown={() => onPoint(index, at)}
        >
          {row === undefined ? (
            <span data-waiting="" aria-hidden="true" />
          ) : column.unfolds === true && unfolded !== undefined ? (
            <button
              type="button"
              tabIndex={-1}
              data-unfold=""
              aria-expanded={unfolded}
              onClick={(event) => {
                event.stopPropagation();
                onToggle(index);
              }}
            >
              {column.cell(row)}
            </button>
          ) : (
            column.cell(row)
          )}
        </td>
      ))}
    </tr>
  );
}

/** One row, drawn again only when it itself changes: that keeps ten thousand of them smooth. */
export const TableRow = memo(Row) as typeof Row;
