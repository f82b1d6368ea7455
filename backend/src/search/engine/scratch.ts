import type { RowMasks } from '@resistry/engineering/range-search/row-masks';
import { SurroundingsMemory } from './surroundings';

/** What is kept between searches over one index: a million parts are not worth allocating twice. */
export interface Scratch {
  masks: RowMasks;
  /** For the second and further operating modes of a row. */
  other: RowMasks;
  /** Of parts with several operating modes, the checks that are unmet in every mode. */
  unmetInEveryMode: Uint32Array;
  surroundings: SurroundingsMemory;
}

export function allocateScratch(length: number): Scratch {
  const masks = (): RowMasks => ({
    unmet: new Uint32Array(length),
    unrated: new Uint32Array(length),
    exact: 0,
  });
  return {
    masks: masks(),
    other: masks(),
    unmetInEveryMode: new Uint32Array(length),
    surroundings: new SurroundingsMemory(),
  };
}
