import type { Ratings } from '@resistry/engineering/ratings/ratings';
import type { Schema } from '../../../api/schema';

/** What a family states for all parts of a size; SI values, °C. */
export type SizeRatings = Omit<Ratings, 'resistance' | 'tolerance' | 'tcr' | 'certificates'>;

/** A size with its ratings, one set for each operating mode. */
export interface FamilySize extends Omit<Schema<'FamilySizeDto'>, 'modes'> {
  modes: { name: string; ratings: SizeRatings }[];
}

export interface FamilyRevision extends Omit<Schema<'FamilyRevisionDto'>, 'sizes'> {
  sizes: FamilySize[];
}

export type Citation = Schema<'CitationDto'>;
