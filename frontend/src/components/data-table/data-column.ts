import type { ReactNode } from 'react';

/** What a cell is as plain data: for copying and for CSV. A number is written in its SI unit, null as nothing. */
export type PlainCell = string | number | null;

export interface DataColumn<Row> {
  id: string;
  header: string;
  /** The header of the plain data, with its unit: "Resistance, Ω". */
  plainHeader: string;
  cell: (row: Row) => ReactNode;
  plain: (row: Row) => PlainCell;
  /** The whole of what a narrow cell may cut off; shown when one rests on it. */
  hint?: (row: Row) => string;
  /** Holds the button that unfolds a row, where rows can be unfolded. */
  unfolds?: boolean;
  /** rem; the table is as wide as its columns ask, or as its place, which they then share in proportion. */
  width: number;
  /** Stays in sight while the others scroll sideways beneath it. */
  stays?: boolean;
  align?: 'start' | 'end';
  /** Whether the server can sort by it, under the column's id. */
  sortable?: boolean;
  /** Always shown. */
  fixed?: boolean;
  /** Left out until the person asks for it. */
  hiddenAtFirst?: boolean;
}

export interface Sort {
  column: string;
  descending: boolean;
}
