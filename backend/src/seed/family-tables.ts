import type { Columns } from './family';
import type { IdSequences } from './id-sequences';

/** Tables that a family fills, in an order in which every row finds what it refers to. */
export const familyTables = [
  'families',
  'datasheets',
  'sizes',
  'family_revisions',
  'size_ratings',
  'operating_modes',
  'ranges',
  'packagings',
  'citations',
  'declarations',
  'certificates',
  'parts',
] as const;
export type FamilyTable = (typeof familyTables)[number];
export type FamilyRows = Readonly<Record<FamilyTable, Columns[]>>;

export interface FamilyContext {
  readonly manufacturerId: number;
  /** Local part of an address → id of the account. */
  readonly personId: (address: string) => number;
  readonly ids: IdSequences;
}

export function emptyFamilyRows(): FamilyRows {
  return {
    families: [],
    datasheets: [],
    sizes: [],
    family_revisions: [],
    size_ratings: [],
    operating_modes: [],
    ranges: [],
    packagings: [],
    citations: [],
    declarations: [],
    certificates: [],
    parts: [],
  };
}
