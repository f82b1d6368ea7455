import type { Sort } from '../../components/data-table/data-column';
import { readDutyAddress, writeDuty } from './duty/duty-address';
import type { DutyText } from './duty/duty-text';
import type { Show } from './requests/search-request';

/** Filters as they stand in an address: ids, codes or figures as typed (1 %, 50 ppm/K), by commas. */
export const filterNames = [
  'manufacturer',
  'family',
  'technology',
  'size',
  'series',
  'tolerance',
  'tcr',
] as const;
export type FilterName = (typeof filterNames)[number];

/** Filters that are on or off: a safety certificate in date, a company part number, an offer in force. */
export const flagNames = ['certificate', 'numbered', 'offered'] as const;
export type FlagName = (typeof flagNames)[number];

/** Everything Find shows, as its address holds it. */
export interface FindState {
  duty: DutyText;
  /** Part number, family or manufacturer. */
  text: string;
  filters: Record<FilterName, string[]>;
  flags: Record<FlagName, boolean>;
  show: Show;
  grouped: boolean;
  sort?: Sort;
  /** The part whose side sheet is open. */
  part?: number;
}

const split = (text: string | null): string[] => (text === null || text === '' ? [] : text.split(','));

function readSort(text: string | null): Sort | undefined {
  if (text === null || text === '') return undefined;
  return text.startsWith('-')
    ? { column: text.slice(1), descending: true }
    : { column: text, descending: false };
}

export function readFind(address: URLSearchParams): FindState {
  const part = Number(address.get('part'));
  return {
    duty: readDutyAddress(address),
    text: address.get('text') ?? '',
    filters: {
      manufacturer: split(address.get('manufacturer')),
      family: split(address.get('family')),
      technology: split(address.get('technology')),
      size: split(address.get('size')),
      series: split(address.get('series')),
      tolerance: split(address.get('tolerance')),
      tcr: split(address.get('tcr')),
    },
    flags: {
      certificate: address.get('certificate') === 'yes',
      numbered: address.get('numbered') === 'yes',
      offered: address.get('offered') === 'yes',
    },
    show: address.get('show') === 'met-and-unrated' ? 'met-and-unrated' : 'met',
    grouped: address.get('group') === 'company',
    sort: readSort(address.get('sort')),
    part: Number.isInteger(part) && part > 0 ? part : undefined,
  };
}

export function writeFind(state: FindState): URLSearchParams {
  const address = new URLSearchParams();
  writeDuty(state.duty, address);
  if (state.text !== '') address.set('text', state.text);
  for (const name of filterNames) {
    if (state.filters[name].length > 0) address.set(name, state.filters[name].join(','));
  }
  for (const name of flagNames) if (state.flags[name]) address.set(name, 'yes');
  if (state.show !== 'met') address.set('show', state.show);
  if (state.grouped) address.set('group', 'company');
  if (state.sort !== undefined)
    address.set('sort', `${state.sort.descending ? '-' : ''}${state.sort.column}`);
  if (state.part !== undefined) address.set('part', String(state.part));
  return address;
}

/** Whether only some of the catalogue is looked at. */
export const isNarrowed = ({ text, filters, flags }: FindState): boolean =>
  text !== '' ||
  filterNames.some((name) => filters[name].length > 0) ||
  flagNames.some((name) => flags[name]);
