import type { Status } from '../checks/check';

/**
 * Masks of unmet and unrated checks, one pair a part, and how many parts had to be assessed one by one.
 * The arrays are indexed by the part's position in the catalogue.
 */
export interface RowMasks {
  unmet: Uint32Array;
  unrated: Uint32Array;
  exact: number;
}

/** Sets a bit in a stretch of a mask; both ends are positions, the upper one excluded. */
export function setBit(mask: Uint32Array, from: number, to: number, bit: number): void {
  for (let index = from; index < to; index += 1) mask[index] = (mask[index] ?? 0) | bit;
}

/** Clears a bit in a stretch of a mask. */
export function clearBit(mask: Uint32Array, from: number, to: number, bit: number): void {
  for (let index = from; index < to; index += 1) mask[index] = (mask[index] ?? 0) & ~bit;
}

/** Notes one status for a stretch in which the bit is set in neither mask yet. */
export function setStatus(masks: RowMasks, from: number, to: number, bit: number, status: Status): void {
  if (status === 'unmet') setBit(masks.unmet, from, to, bit);
  else if (status === 'unrated') setBit(masks.unrated, from, to, bit);
}

/** First position in [from, to) whose resistance is not below a value; `to` where there is none. */
export function firstNotBelow(resistances: Float64Array, from: number, to: number, value: number): number {
  let low = from;
  let high = to;
  while (low < high) {
    const middle = (low + high) >>> 1;
    if ((resistances[middle] ?? Infinity) < value) low = middle + 1;
    else high = middle;
  }
  return low;
}

/** First position in [from, to) whose resistance is above a value; `to` where there is none. */
export function firstAbove(resistances: Float64Array, from: number, to: number, value: number): number {
  let low = from;
  let high = to;
  while (low < high) {
    const middle = (low + high) >>> 1;
    if ((resistances[middle] ?? Infinity) <= value) low = middle + 1;
    else high = middle;
  }
  return low;
}
