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
import { columnTracks, leastWidth } from './column-widths';
import type { DataColumn, Sort } from './data-column';
import { tabSeparated } from './delimited-text';
import { type GridPosition, nextPosition } from './grid-position';
import type { RowTree } from './row-tree';
import { TableHead } from './table-head';
import { TableRow, cellId } from './table-row';
import { TableFrame, headHeight } from './table-styles';
import { useScrollMargin } from './use-scroll-margin';
import { scrollUnlessThere, watchSize } from './watch-scroller';

/** Rows drawn beyond either edge, so that a short movement shows no gap. */
const overscan = 4;

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
  const { columns, rowHeight = 48 } = props;
  const sizes = {
    '--row-height': `${rowHeight}px`,
    '--columns': columnTracks(columns),
    '--least-width': leastWidth(columns),
  };
  // The frame with its styles stays out of what is drawn while scrolling.
  return (
    <TableFrame style={sizes as CSSProperties}>
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
  const virtualizer = useVirtualizer<HTMLElement, HTMLTableRowElement>({
    count: rowCount,
    getScrollElement: () => scrollRef.current,
    estimateSize: () => rowHeight,
    overscan,
    scrollMargin,
    // The head covers the first row that scrolls under it.
    scrollPaddingStart: headHeight,
    initialOffset: () => scrollRef.current?.scrollTop ?? 0,
    initialRect: { width: 800, height: 600 },
    observeElementRect: watchSize,
    scrollToFn: scrollUnlessThere,
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
    const page = Math.max(1, last - first - 2 * overscan);
    const next = nextPosition(event, { row, column }, { rows: rowCount, columns: columns.length, page });
    if (next === undefined) return;
    event.preventDefault();
    setActive(next);
    if (next.row !== row) virtualizer.scrollToIndex(next.row, { align: 'auto' });
    if (next.column !== column)
      document.getElementById(cellId(gridId, next.row, next.column))?.scrollIntoView({
        block: 'nearest',
        inline: 'nearest',
      });
  };

  const keyAt = (index: number): string | number => {
    const data = rowAt(index);
    return data !== undefined && rowKey !== undefined ? rowKey(data) : `waiting ${index}`;
  };

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
      <TableHead columns={columns} sort={sort} onSortBy={onSortBy} />
      <tbody ref={bodyRef} style={{ height: rowCount * rowHeight, paddingTop: first * rowHeight }}>
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
      </tbody>
    </table>
  );
}
