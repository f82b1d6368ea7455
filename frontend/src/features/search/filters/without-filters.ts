import type { FindState } from '../find-address';

/** The same search over the whole catalogue. */
export const withoutFilters = (state: FindState): FindState => ({
  ...state,
  text: '',
  filters: { manufacturer: [], family: [], technology: [], size: [], series: [], tolerance: [], tcr: [] },
  flags: { certificate: false, numbered: false, offered: false },
});
