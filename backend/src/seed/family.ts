import type { SeriesName } from '@resistry/engineering/preferred-values/series';
import type { Feature, Technology } from '@resistry/engineering/ratings/technology';
import type { BindValue } from '../database/bind-values';
import type { OrderingCodeTemplate } from '../parts/ordering-code-template';

/** Columns of a table with their values. */
export type Columns = Readonly<Record<string, BindValue>>;

/** Who did something (the local part of the address) and on which day. */
export interface Deed {
  readonly by: string;
  readonly on: string;
}

/** One row of a datasheet's range table, for several sizes at once; Ω, fraction, 1/K. */
export interface FamilyRange {
  readonly sizes: readonly string[];
  readonly tolerance: number;
  readonly tcr: number | null;
  readonly min: number;
  readonly max: number;
  readonly series: readonly SeriesName[];
}

export interface FamilyPackaging {
  readonly sizes: readonly string[];
  readonly code: string;
  readonly description: string;
  readonly quantity: number;
}

export interface FamilyCitation {
  readonly fields: readonly string[];
  readonly page: number;
  /** Absent: every size. */
  readonly size: string | null;
  readonly note: string | null;
}

/** Ratings of one size in one revision, as columns of `size_ratings` and `operating_modes`. */
export interface FamilySizeRatings {
  readonly columns: Columns;
  readonly modes: readonly Columns[];
  readonly isLinkToo: boolean;
}

export interface FamilyRevision {
  readonly number: number;
  readonly description: string;
  /** `document revision` of one of the family's datasheets. */
  readonly datasheet: string;
  readonly entered: Deed;
  readonly published: Deed;
  readonly referenceTemperature: number | null;
  readonly failureRateStyle: string | null;
  readonly features: readonly Feature[];
  readonly orderingCodeTemplate: string;
  readonly orderingCode: OrderingCodeTemplate;
  readonly sizes: ReadonlyMap<string, FamilySizeRatings>;
  readonly ranges: readonly FamilyRange[];
  readonly packagings: readonly FamilyPackaging[];
  readonly citations: readonly FamilyCitation[];
}

export interface FamilyDatasheet {
  readonly title: string;
  readonly document: string;
  readonly revision: string;
  readonly issuedOn: string;
  readonly pages: number;
}

export interface FamilyCertificate {
  readonly kind: 'safety' | 'automotive';
  readonly standard: string;
  readonly number: string;
  readonly issuedOn: string;
  readonly expiresOn: string | null;
  /** Empty: the whole family. */
  readonly sizes: readonly string[];
}

export interface FamilyDeclaration {
  readonly kind: 'RoHS' | 'REACH';
  readonly datedOn: string;
  readonly exemption: string | null;
  readonly statement: string;
}

/** An ordering code of the datasheet, to hold the template against. */
export interface OrderingCodeExample {
  readonly code: string;
  readonly size: string;
  readonly resistance: number;
  readonly tolerance: number | null;
  readonly tcr: number | null;
  readonly packaging: string | undefined;
}

/** A manufacturer's family with all its revisions; the last one is current. */
export interface Family {
  readonly code: string;
  readonly manufacturer: string;
  readonly name: string;
  readonly technology: Technology;
  readonly entered: Deed;
  readonly sizes: readonly { readonly code: string; readonly metricCode: string | null }[];
  readonly datasheets: readonly FamilyDatasheet[];
  readonly declarations: readonly FamilyDeclaration[];
  readonly certificates: readonly FamilyCertificate[];
  readonly revisions: readonly FamilyRevision[];
  readonly examples: readonly OrderingCodeExample[];
}

/** @throws RangeError for a family without a revision, which the reader never gives */
export function currentRevision(family: Family): FamilyRevision {
  const revision = family.revisions.at(-1);
  if (!revision) throw new RangeError(`The family ${family.code} has no revision.`);
  return revision;
}
