import { isSeriesName } from '@resistry/engineering/preferred-values/is-series-name';
import { approvals, supplyStatuses } from '@resistry/engineering/ratings/technology';
import type { CatalogueIndex } from '../index/catalogue-index';
import { acceptedSeriesBits } from '../index/series-bits';
import type { PartFilters } from './search-plan';

/** Whether the part at a position passes the filters that look at single parts; undefined where there are none. */
export function partFilter(
  index: CatalogueIndex,
  filters: PartFilters,
): ((position: number) => boolean) | undefined {
  const { columns } = index;
  const conditions: ((position: number) => boolean)[] = [];
  if (filters.series !== undefined) {
    const accepted = acceptedSeriesBits(filters.series.filter(isSeriesName));
    conditions.push((position) => ((columns.series[position] ?? 0) & accepted) !== 0);
  }
  if (filters.approvals !== undefined) {
    const wanted = approvals.map((name) => filters.approvals?.includes(name) ?? false);
    conditions.push((position) => wanted[columns.approval[position] ?? 0] ?? false);
  }
  if (filters.supply !== undefined) {
    const wanted = supplyStatuses.map((name) => filters.supply?.includes(name) ?? false);
    conditions.push((position) => wanted[columns.supply[position] ?? 0] ?? false);
  }
  const { companyPartNumber, offer, partIds } = filters;
  if (companyPartNumber !== undefined) {
    conditions.push((position) => (columns.company[position] ?? -1) >= 0 === companyPartNumber);
  }
  if (offer !== undefined)
    conditions.push((position) => (columns.price[position] ?? Infinity) < Infinity === offer);
  if (partIds !== undefined) {
    const wanted = new Set(partIds);
    conditions.push((position) => wanted.has(columns.partId[position] ?? 0));
  }
  if (conditions.length === 0) return undefined;
  return (position) => conditions.every((condition) => condition(position));
}
