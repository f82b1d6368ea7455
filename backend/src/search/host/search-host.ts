import type { CatalogueIndex } from '../index/catalogue-index';
import type { SearchPlan, SearchResult } from '../engine/search-plan';

/** Where searches are computed: a thread of their own in the built program, the same thread under the tests. */
export interface SearchHost {
  /** Takes a new index; searches from then on use it. */
  take(index: CatalogueIndex): void;
  search(plan: SearchPlan): Promise<SearchResult>;
  close(): Promise<void>;
}
