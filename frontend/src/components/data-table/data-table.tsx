import { useVirtualizer } from '@tanstack/react-virtual';
import {
  type CSSProperties,
  type KeyboardEvent,
  type RefObject,
  useCallback,
  useEffect,
  useId,
  useRef,
  useState,
} from 'react';
import type { DataColumn, Sort } from './data-column';
import { tabSeparated } from './delimited-text';
import { type GridPosition, nextPosition } from './grid-position';
import type { RowTree } from './row-tree';
import { TableHead } from './table-head';
import { TableRow, cellId } from './table-row';
import { TableFrame } from './table-styles';
import { useScrollMargin } from './use-scroll-margin';

export interface DataTableProps<Row extends object> {
  /** What the table holds, for screen readers. */
  label: string;
  columns: readonly DataColumn<Row>[];
  /** How many rows there are on the server. */
  rowCount: number;
  /** The row at an index, or undefined while it is on its way. */
  rowAt: (index: number) => Row | undefined;
  /** What a row is, so that it stays itself when its place changes. */
  rowKey?: (row: Row) => string | number;
  /** Tells which rows are in sight, so that they can be asked for. */
  onVisible?: (first: number, last: number) => void;
  rowHeight?: number;
  sort?: Sort;
  onSortBy: (columnId: string) => void;
  selectedIndex?: number;
  onOpen: (index: number) => void;
  /** Where rows unfold; space does it by keyboard. */
  tree?: RowTree;
  /** What scrolls: a column of the page, or the page itself. */
  scrollRef: RefObject<HTMLElement | null>;
}

/** A table of as many rows as the server has, of which only those in sight exist. */
export function DataTable<Row extends object>(props: DataTableProps<Row>) {
  const { rowHeight = 48 } = props;
  // The frame with its styles stays out of what is drawn while scrolling.
  return (
    <TableFrame style={{ '--row-height': `${rowHeight}px` } as CSSProperties}>
      <VirtualTable {...props} rowHeight={rowHeight} />
    </TableFrame>
  );
}

function VirtualTable<Row extends object>(props: DataTableProps<Row> & { rowHeight: number }) {
  const {
    label,
    columns,
    rowCount,
    rowAt,
    rowKey,
    onVisible,
    rowHeight,
    sort,
    onSortBy,
    onOpen,
    tree,
    scrollRef,
  } = props;
  const gridId = useId();
  const bodyRef = useRef<HTMLTableSectionElement>(null);
  const [active, setActive] = useState<GridPosition>({ row: 0, column: 0 });
  const scrollMargin = useScrollMargin(bodyRef, scrollRef);
  const virtualizer = useVirtualizer({
    count: rowCount,
    getScrollElement: () => scrollRef.current,
    estimateSize: () => rowHeight,
    overscan: 8,
    scrollMargin,
    // The head covers the first row that scrolls under it.
    scrollPaddingStart: rowHeight,
    initialRect: { width: 800, height: 600 },
  });
  const shown = virtualizer.getVirtualItems();
  const first = shown[0]?.index ?? 0;
  const last = shown[shown.length - 1]?.index ?? -1;
  const row = Math.min(active.row, Math.max(0, rowCount - 1));
  const column = Math.min(active.column, Math.max(0, columns.length - 1));

  useEffect(() => {
    if (last >= first) onVisible?.(first, last);
  }, [first, last, onVisible]);

  // Rows keep one handler for ever: a new one with each page of data would draw all of them again.
  const handlers = useRef({ onOpen, tree });
  useEffect(() => {
    handlers.current = { onOpen, tree };
  }, [onOpen, tree]);
  const open = useCallback((index: number) => handlers.current.onOpen(index), []);
  const toggle = useCallback((index: number) => handlers.current.tree?.toggle(index), []);

  const point = useCallback(
    (atRow: number, atColumn: number) => setActive({ row: atRow, column: atColumn }),
    [],
  );

  const press = (event: KeyboardEvent<HTMLTableElement>): void => {
    if (event.target !== event.currentTarget || event.altKey) return;
    if (event.key === 'Enter') {
      onOpen(row);
      event.preventDefault();
      return;
    }
    if (event.key === ' ' && tree?.openAt(row) !== undefined) {
      tree.toggle(row);
      event.preventDefault();
      return;
    }
    if (
      event.key === 'c' &&
      (event.ctrlKey || event.metaKey) &&
      window.getSelection()?.isCollapsed !== false
    ) {
      const data = rowAt(row);
      if (data !== undefined) void navigator.clipboard.writeText(tabSeparated(columns, [data]));
      return;
    }
    const page = Math.max(1, last - first - 16);
    const next = nextPosition(event, { row, column }, { rows: rowCount, columns: columns.length, page });
    if (next === undefined) return;
    event.preventDefault();
    setActive(next);
    virtualizer.scrollToIndex(next.row, { align: 'auto' });
  };

  const keyAt = (index: number): string | number => {
    const data = rowAt(index);
    return data !== undefined && rowKey !== undefined ? rowKey(data) : `waiting ${index}`;
  };

  const before = (shown[0]?.start ?? scrollMargin) - scrollMargin;
  const after = virtualizer.getTotalSize() - ((shown[shown.length - 1]?.end ?? scrollMargin) - scrollMargin);
  return (
    <table
      role="grid"
      aria-label={label}
      aria-rowcount={rowCount + 1}
      aria-colcount={columns.length}
      aria-activedescendant={rowCount > 0 ? cellId(gridId, row, column) : undefined}
      tabIndex={0}
      onKeyDown={press}
    >
      <colgroup>
        {columns.map((each) => (
          <col key={each.id} style={{ width: each.width }} />
        ))}
      </colgroup>
      <TableHead columns={columns} sort={sort} onSortBy={onSortBy} />
      <tbody ref={bodyRef}>
        <Spacer height={before} span={columns.length} />
        {shown.map(({ index }) => (
          <TableRow
            key={keyAt(index)}
            row={rowAt(index)}
            index={index}
            columns={columns}
            gridId={gridId}
            activeColumn={index === row ? column : -1}
            selected={index === props.selectedIndex}
            level={tree?.levelAt(index)}
            unfolded={tree?.openAt(index)}
            onOpen={open}
            onPoint={point}
            onToggle={toggle}
          />
        ))}
        <Spacer height={after} span={columns.length} />
      </tbody>
    </table>
  );
}

/** Stands for the rows that are out of sight. */
function Spacer({ height, span }: { height: number; span: number }) {
  if (height <= 0) return null;
  return (
    <tr data-spacer="" aria-hidden="true">
      <td colSpan={span} style={{ height }} />
    </tr>
  );
}
