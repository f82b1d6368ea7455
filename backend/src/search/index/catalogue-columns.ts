import type { Ratings } from '@resistry/engineering/ratings/ratings';

/**
 * The catalogue as columns, one position a part, sorted by row (same size, tolerance and TCR) and within it by resistance.
 * Shared memory: the thread that serves requests writes a part's standing, the one that searches reads it.
 */
export interface CatalogueColumns {
  partId: Int32Array;
  /** Ω */
  resistance: Float64Array;
  /** Position in `approvals`. */
  approval: Uint8Array;
  /** Position in `supplyStatuses`. */
  supply: Uint8Array;
  secondSource: Uint8Array;
  /** The three above in one, as `standingKey` packs them: most searches read nothing else of most parts. */
  standing: Uint8Array;
  /** Lowest valid unit price at 1000 pieces, millionths; Infinity where there is none. */
  price: Float64Array;
  /** Position of the company part number; −1 where there is none. */
  company: Int32Array;
  /** One bit a series of preferred values that holds the resistance. */
  series: Uint8Array;
  /** Position of the part with an id; −1 where the columns hold none. Indexed by id, not by position. */
  positionOfId: Int32Array;
  /** Rank of the manufacturer part number in alphabetical order. */
  numberRank: Int32Array;
}

/** Parts of one size with one tolerance and TCR: positions [from, to). */
export interface CatalogueRow {
  /** Its place among the rows. */
  number: number;
  from: number;
  to: number;
  sizeId: number;
  /** Fraction; null for links. */
  tolerance: number | null;
  /** 1/K */
  tcr: number | null;
  isLink: boolean;
  /** Ratings in each operating mode, at a resistance of 1 Ω (0 for links) that stands for the whole row. */
  modes: readonly Ratings[];
}

/** What rows are filtered and sorted by, one a size. */
export interface CatalogueSize {
  sizeId: number;
  code: string;
  familyId: number;
  familyRank: number;
  manufacturerId: number;
  manufacturerRank: number;
  technology: string;
  bodyStyle: string;
}

/** Company part numbers: ids in the order of their positions, which is alphabetical, and where their sources stand. */
export interface CompanyNumbers {
  id: Int32Array;
  /** Sources of number n: `source[sourceFrom[n] … sourceFrom[n + 1])`, positions of parts. */
  sourceFrom: Int32Array;
  source: Int32Array;
}

/** Position in `approvals` (6 of them), in `supplyStatuses` (4) and the second source, packed into six bits. */
export function standingKey(approval: number, supply: number, secondSource: number): number {
  return approval | (supply << 3) | (secondSource << 5);
}

/** Columns of a given length in shared memory, for parts with ids up to `lastId`. */
export function allocateColumns(length: number, lastId: number): CatalogueColumns {
  return {
    partId: new Int32Array(new SharedArrayBuffer(length * 4)),
    resistance: new Float64Array(new SharedArrayBuffer(length * 8)),
    approval: new Uint8Array(new SharedArrayBuffer(length)),
    supply: new Uint8Array(new SharedArrayBuffer(length)),
    secondSource: new Uint8Array(new SharedArrayBuffer(length)),
    standing: new Uint8Array(new SharedArrayBuffer(length)),
    price: new Float64Array(new SharedArrayBuffer(length * 8)),
    company: new Int32Array(new SharedArrayBuffer(length * 4)),
    series: new Uint8Array(new SharedArrayBuffer(length)),
    positionOfId: new Int32Array(new SharedArrayBuffer((lastId + 1) * 4)).fill(-1),
    numberRank: new Int32Array(new SharedArrayBuffer(length * 4)),
  };
}
