import type { CatalogueIndex } from '../index/catalogue-index';
import type { SearchPlan, SearchResult } from '../engine/search-plan';

export type ToSearchThread = { kind: 'index'; index: CatalogueIndex } | { kind: 'search'; plan: SearchPlan };

export type FromSearchThread =
  { ok: true; result: SearchResult } | { ok: false; message: string; stack?: string };
