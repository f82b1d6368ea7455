import type { Ratings } from '@resistry/engineering/ratings/ratings';

/** Ratings that all parts of one size share, one set an operating mode, in the family's order. */
export interface SizeRatings {
  sizeId: number;
  familyId: number;
  revisionId: number;
  modes: readonly { name: string; ratings: Ratings }[];
}

/** The modes of one part: its size's ratings with its own resistance (Ω), tolerance (fraction) and TCR (1/K). */
export function modesOfPart(
  size: SizeRatings,
  part: { resistance: number; tolerance: number | null; tcr: number | null },
): { name?: string; ratings: Ratings }[] {
  return size.modes.map(({ name, ratings }) => ({
    ...(size.modes.length > 1 ? { name } : {}),
    ratings: {
      ...ratings,
      resistance: part.resistance,
      ...(part.tolerance === null ? {} : { tolerance: part.tolerance }),
      ...(part.tcr === null ? {} : { tcr: part.tcr }),
      link: part.resistance === 0 ? ratings.link : undefined,
    },
  }));
}
