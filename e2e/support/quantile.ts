/**
 * The smallest of the values that at least this share of them does not exceed (nearest rank).
 *
 * @param share from 0 to 1
 * @throws Error when there are none
 */
export function quantile(values: readonly number[], share: number): number {
  const sorted = [...values].sort((one, other) => one - other);
  const found = sorted[Math.max(0, Math.ceil(share * sorted.length) - 1)];
  if (found === undefined) throw new Error('No values were measured.');
  return found;
}
