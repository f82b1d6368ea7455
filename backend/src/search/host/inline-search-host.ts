import { allocateScratch } from '../engine/scratch';
import { searchCatalogue, type SearchScratch } from '../engine/search-catalogue';
import type { SearchPlan, SearchResult } from '../engine/search-plan';
import type { CatalogueIndex } from '../index/catalogue-index';
import type { SearchHost } from './search-host';

/** Scratch for an index. */
export function scratchFor(index: CatalogueIndex): SearchScratch {
  const length = index.columns.partId.length;
  return { main: allocateScratch(length), retrial: allocateScratch(length) };
}

/** Computes in the thread that asks. */
export class InlineSearchHost implements SearchHost {
  private loaded?: { index: CatalogueIndex; scratch: SearchScratch };

  take(index: CatalogueIndex): void {
    this.loaded = { index, scratch: scratchFor(index) };
  }

  search(plan: SearchPlan): Promise<SearchResult> {
    if (this.loaded === undefined) throw new Error('A search was asked for before the index was loaded.');
    return Promise.resolve(searchCatalogue(this.loaded.index, plan, this.loaded.scratch));
  }

  close(): Promise<void> {
    return Promise.resolve();
  }
}
