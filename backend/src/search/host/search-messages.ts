import type { CatalogueIndex } from '../index/catalogue-index';
import type { SearchPlan, SearchResult } from '../engine/search-plan';

export type ToSearchThread =
  { kind: 'index'; index: CatalogueIndex } | { kind: 'search'; id: number; plan: SearchPlan };

export type FromSearchThread =
  { id: number; ok: true; result: SearchResult } | { id: number; ok: false; message: string; stack?: string };
