/** Smallest value that at least the given share of the values does not pass. */
export function quantile(values: readonly number[], share: number): number {
  const sorted = [...values].sort((first, second) => first - second);
  return sorted[Math.min(sorted.length - 1, Math.ceil(share * sorted.length) - 1)] ?? NaN;
}
