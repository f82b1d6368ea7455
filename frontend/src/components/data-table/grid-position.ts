/** Which cell has the keyboard; row 0 is the first row of data. */
export interface GridPosition {
  row: number;
  column: number;
}

export interface GridSize {
  rows: number;
  columns: number;
  /** Rows that a page key passes. */
  page: number;
}

interface KeyPress {
  key: string;
  ctrlKey: boolean;
  metaKey: boolean;
}

const within = (value: number, count: number): number => Math.max(0, Math.min(count - 1, value));

/**
 * Where a key leads in a grid, by the ARIA practice for grids, with j and k beside the arrows.
 * @returns undefined for keys that do not move
 */
export function nextPosition(press: KeyPress, at: GridPosition, size: GridSize): GridPosition | undefined {
  const whole = press.ctrlKey || press.metaKey;
  const to = (row: number, column: number): GridPosition => ({
    row: within(row, size.rows),
    column: within(column, size.columns),
  });
  if (whole && press.key !== 'Home' && press.key !== 'End') return undefined;
  switch (press.key) {
    case 'ArrowDown':
    case 'j':
      return to(at.row + 1, at.column);
    case 'ArrowUp':
    case 'k':
      return to(at.row - 1, at.column);
    case 'ArrowRight':
      return to(at.row, at.column + 1);
    case 'ArrowLeft':
      return to(at.row, at.column - 1);
    case 'PageDown':
      return to(at.row + size.page, at.column);
    case 'PageUp':
      return to(at.row - size.page, at.column);
    case 'Home':
      return whole ? to(0, 0) : to(at.row, 0);
    case 'End':
      return whole ? to(size.rows - 1, size.columns - 1) : to(at.row, size.columns - 1);
    default:
      return undefined;
  }
}
