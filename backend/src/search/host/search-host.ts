import type { CatalogueIndex } from '../index/catalogue-index';
import type { SearchPlan, SearchResult } from '../engine/search-plan';

/** Where searches are computed: a thread of their own in the built program, the same thread under the tests. */
export interface SearchHost {
  /** Takes a new index; searches from then on use it. */
  take(index: CatalogueIndex): void;
  /**
   * @param gone aborted when nobody waits for the answer any more
   * @throws Problem `abandoned` where that was so before the search began
   */
  search(plan: SearchPlan, gone?: AbortSignal): Promise<SearchResult>;
  close(): Promise<void>;
}
