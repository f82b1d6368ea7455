import { parse } from 'csv-parse/sync';
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { SeedDataError } from './seed-data-error';

const header = [
  'number',
  'description',
  'entered_by',
  'entered_on',
  'source_1',
  'source_2',
  'source_3',
  'preferred_on',
  'exception',
];

/** One of the company's numbers with the parts that may be bought under it. */
export interface SeedCompanyPartNumber {
  readonly number: string;
  readonly description: string;
  /** The component engineer who entered it and approved its sources. */
  readonly enteredBy: string;
  readonly enteredOn: string;
  /** Manufacturer part numbers, the first one first choice. */
  readonly sources: readonly string[];
  /** Day on which the first source was promoted; null where it was not. */
  readonly preferredOn: string | null;
  /** Why one source will do, where it was promoted without a second one. */
  readonly exception: string | null;
}

/** @throws SeedDataError naming file, line and column */
export function readCompanyPartNumbers(directory: string, file: string): SeedCompanyPartNumber[] {
  const rows = parse(readFileSync(join(directory, file), 'utf8'), { relax_column_count: false });
  const [first = [], ...lines] = rows;
  if (first.join() !== header.join()) throw new SeedDataError(file, 'line 1', `must be ${header.join(',')}`);
  return lines.map((cells, place) => {
    const refuse = (column: string, words: string): SeedDataError =>
      new SeedDataError(file, `line ${place + 2}, ${column}`, words);
    const cell = (column: string): string => cells[header.indexOf(column)]?.trim() ?? '';
    const given = (column: string): string => {
      if (cell(column) === '') throw refuse(column, 'is empty');
      return cell(column);
    };
    const day = (column: string): string => {
      if (!/^\d{4}-\d\d-\d\d$/.test(cell(column))) throw refuse(column, 'must be a day such as 2026-12-01');
      return cell(column);
    };
    if (!/^BW-R-\d{5}$/.test(cell('number'))) throw refuse('number', 'must look like BW-R-00417');
    const sources = [given('source_1'), cell('source_2'), cell('source_3')].filter((source) => source !== '');
    const preferredOn = cell('preferred_on') === '' ? null : day('preferred_on');
    const exception = cell('exception') || null;
    if (preferredOn !== null && sources.length === 1 && exception === null) {
      throw refuse('exception', 'must say why one source will do');
    }
    return {
      number: cell('number'),
      description: given('description'),
      enteredBy: given('entered_by'),
      enteredOn: day('entered_on'),
      sources,
      preferredOn,
      exception,
    };
  });
}
