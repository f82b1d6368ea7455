interface Wide {
  /** rem */
  width: number;
}

/** The widths of all columns as a CSS grid takes them: at least what each asks, and the rest in proportion. */
export const columnTracks = (columns: readonly Wide[]): string =>
  columns.map(({ width }) => `minmax(${width}rem, ${width}fr)`).join(' ');

/** What the columns ask together, as a CSS width. */
export const leastWidth = (columns: readonly Wide[]): string =>
  `${columns.reduce((sum, { width }) => sum + width, 0)}rem`;
