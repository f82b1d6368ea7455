import { readFind, writeFind } from '../search/find-address';

/** The address of Find narrowed to one family. */
export function findFamilyLink(familyId: number): string {
  const nothing = readFind(new URLSearchParams());
  const narrowed = { ...nothing, filters: { ...nothing.filters, family: [String(familyId)] } };
  return `/find?${writeFind(narrowed).toString()}`;
}
