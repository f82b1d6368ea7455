/** Allowance over demand at the ends of every margin rule: half of what is needed, and ten times it. */
export const lowestRatio = 0.5;
export const highestRatio = 10;

/** Ratios that bear a small tick: twice and five times the demand. */
export const tickRatios = [2, 5] as const;

/**
 * Where a ratio of allowance to demand lies on the rule: logarithmic, so that twice as much is the same length wherever
 * it starts, and cut at the ends.
 * @param ratio at least 0; 0 and everything below the scale lie at its start
 * @returns 0 to 100
 */
export function positionOf(ratio: number): number {
  if (ratio <= lowestRatio) return 0;
  return Math.min(100, (100 * Math.log(ratio / lowestRatio)) / Math.log(highestRatio / lowestRatio));
}

export const demandPosition = positionOf(1);
