import type { DataColumn, PlainCell } from './data-column';

/** A cell that a spreadsheet would run as a formula is made a text by a leading apostrophe. */
const defused = (text: string): string => (/^[=+\-@\t\r]/.test(text) ? `'${text}` : text);

function commaCell(cell: PlainCell): string {
  if (cell === null) return '';
  if (typeof cell === 'number') return String(cell);
  const text = defused(cell);
  return /[",\r\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
}

function tabCell(cell: PlainCell): string {
  if (cell === null) return '';
  return typeof cell === 'number' ? String(cell) : defused(cell.replaceAll(/[\t\r\n]+/g, ' '));
}

/** Rows as CSV (RFC 4180), with a line of headers. */
export function commaSeparated<Row>(columns: readonly DataColumn<Row>[], rows: readonly Row[]): string {
  const lines = [columns.map((column) => commaCell(column.plainHeader))];
  for (const row of rows) lines.push(columns.map((column) => commaCell(column.plain(row))));
  return lines.map((line) => `${line.join(',')}\r\n`).join('');
}

/** Rows as spreadsheets take them from the clipboard, with a line of headers. */
export function tabSeparated<Row>(columns: readonly DataColumn<Row>[], rows: readonly Row[]): string {
  const lines = [columns.map((column) => tabCell(column.plainHeader))];
  for (const row of rows) lines.push(columns.map((column) => tabCell(column.plain(row))));
  return lines.map((line) => line.join('\t')).join('\n');
}
