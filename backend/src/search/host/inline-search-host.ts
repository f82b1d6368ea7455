import { allocateScratch, type Scratch } from '../engine/scratch';
import { searchCatalogue } from '../engine/search-catalogue';
import type { SearchPlan, SearchResult } from '../engine/search-plan';
import type { CatalogueIndex } from '../index/catalogue-index';
import type { SearchHost } from './search-host';

/** Computes in the thread that asks. */
export class InlineSearchHost implements SearchHost {
  private loaded?: { index: CatalogueIndex; scratch: Scratch };

  take(index: CatalogueIndex): void {
    this.loaded = { index, scratch: allocateScratch(index.columns.partId.length) };
  }

  search(plan: SearchPlan): Promise<SearchResult> {
    if (this.loaded === undefined) throw new Error('A search was asked for before the index was loaded.');
    return Promise.resolve(searchCatalogue(this.loaded.index, plan, this.loaded.scratch));
  }

  close(): Promise<void> {
    return Promise.resolve();
  }
}
