import { type SearchItem, searchParts } from '../requests/search-parts';
import type { SearchRequest } from '../requests/search-request';

/** Rows asked for at once. */
const pageSize = 100;

/** The most rows that are fetched for a file or the clipboard. */
export const mostRows = { file: 10_000, clipboard: 1_000 } as const;

/**
 * Fetches rows of a search from its start, page by page.
 * @param most stops there; the caller says so where more remain
 */
export async function fetchRows(
  request: SearchRequest,
  most: number,
  onProgress: (rows: number) => void,
  signal: AbortSignal,
): Promise<SearchItem[]> {
  const rows: SearchItem[] = [];
  for (let page = 1; rows.length < most; page += 1) {
    const { items, total, unrated } = await searchParts(request, page, pageSize, signal);
    rows.push(...items);
    onProgress(rows.length);
    const shown = request.show === 'met' ? total : total + unrated;
    if (items.length < pageSize || rows.length >= shown) break;
  }
  return rows.slice(0, most);
}
