import type { RowMasks } from '@resistry/engineering/range-search/row-masks';

/** Masks of all parts of the catalogue; kept between searches, because a million parts are not worth allocating twice. */
export interface Scratch {
  masks: RowMasks;
  /** For the second and further operating modes of a row. */
  other: RowMasks;
  /** Of parts with several operating modes, the checks that are unmet in every mode. */
  unmetInEveryMode: Uint32Array;
}

export function allocateScratch(length: number): Scratch {
  const masks = (): RowMasks => ({
    unmet: new Uint32Array(length),
    unrated: new Uint32Array(length),
    exact: 0,
  });
  return { masks: masks(), other: masks(), unmetInEveryMode: new Uint32Array(length) };
}
