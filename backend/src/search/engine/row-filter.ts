import type { CatalogueRow } from '../index/catalogue-columns';
import type { CatalogueIndex } from '../index/catalogue-index';
import type { PartFilters } from './search-plan';

/** Relative slack when a tolerance or a TCR is compared with one that was printed. */
const slack = 1e-9;

/** Whether a whole row passes the filters that do not look at single parts. */
export function rowFilter(index: CatalogueIndex, filters: PartFilters): (row: CatalogueRow) => boolean {
  const { manufacturers, families, technologies, sizes, tolerances, tcrs, certificate } = filters;
  const near = (wanted: readonly number[], value: number | null): boolean =>
    value !== null && wanted.some((number) => Math.abs(number - value) <= slack * Math.max(number, value));
  return (row) => {
    const size = index.sizes.get(row.sizeId);
    if (size === undefined) return false;
    if (manufacturers !== undefined && !manufacturers.includes(size.manufacturerId)) return false;
    if (families !== undefined && !families.includes(size.familyId)) return false;
    if (technologies !== undefined && !technologies.includes(size.technology)) return false;
    if (sizes !== undefined && !sizes.includes(size.code)) return false;
    if (tolerances !== undefined && !near(tolerances, row.tolerance)) return false;
    if (tcrs !== undefined && !near(tcrs, row.tcr)) return false;
    if (certificate === undefined) return true;
    const certificates = index.ratings.get(row.sizeId)?.modes[0]?.ratings.certificates ?? [];
    return certificate === certificates.length > 0;
  };
}
