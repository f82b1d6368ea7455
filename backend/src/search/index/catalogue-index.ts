import type { SizeRatings } from '../../parts/ratings/size-ratings';
import type { CatalogueColumns, CatalogueRow, CatalogueSize, CompanyNumbers } from './catalogue-columns';

/** Everything a search reads: columns of parts, rows, sizes with their ratings, company part numbers. */
export interface CatalogueIndex {
  columns: CatalogueColumns;
  rows: readonly CatalogueRow[];
  sizes: ReadonlyMap<number, CatalogueSize>;
  ratings: ReadonlyMap<number, SizeRatings>;
  companyNumbers: CompanyNumbers;
}
