import { valuesBetween } from '@resistry/engineering/preferred-values/values-between';
import { manufacturerPartNumber } from '../parts/ordering-code';
import { currentRevision, type Family, type FamilyRange, type FamilyRevision } from './family';

/** One orderable part of a family; Ω, fraction, 1/K. */
export interface ExpandedPart {
  readonly size: string;
  readonly resistance: number;
  readonly tolerance: number | null;
  readonly tcr: number | null;
  readonly manufacturerPartNumber: string;
}

/** The preferred values of a row of the range table, ascending; a value of several series once. */
export function valuesOf(range: Pick<FamilyRange, 'min' | 'max' | 'series'>): number[] {
  const values = new Set(range.series.flatMap((series) => valuesBetween(range.min, range.max, series)));
  return [...values].sort((one, other) => one - other);
}

/**
 * Every part that a family's current revision offers: size by size its link, where it has one, then the values of its
 * range rows.
 */
export function expandParts(
  family: Family,
  revision: FamilyRevision = currentRevision(family),
): ExpandedPart[] {
  const part = (
    size: string,
    resistance: number,
    tolerance: number | null,
    tcr: number | null,
  ): ExpandedPart => ({
    size,
    resistance,
    tolerance,
    tcr,
    manufacturerPartNumber: manufacturerPartNumber(revision.orderingCode, {
      familyCode: family.code,
      sizeCode: size,
      resistance,
      tolerance,
      tcr,
    }),
  });
  return [...revision.sizes].flatMap(([size, ratings]) => [
    ...(ratings.isLinkToo ? [part(size, 0, null, null)] : []),
    ...revision.ranges
      .filter((range) => range.sizes.includes(size))
      .flatMap((range) => valuesOf(range).map((value) => part(size, value, range.tolerance, range.tcr))),
  ]);
}
