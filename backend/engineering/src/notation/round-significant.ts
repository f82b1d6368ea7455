/**
 * Rounds a computed value to significant digits, to the double nearest to that decimal: 0.1 + 0.2 becomes 0.3.
 *
 * @param value any finite number
 * @param significantDigits whole, 1 to 15; 12 by default, far finer than anything measured and coarser than rounding noise
 * @throws RangeError for a value that is not finite
 */
export function roundSignificant(value: number, significantDigits = 12): number {
  if (!Number.isFinite(value)) throw new RangeError(`value must be a finite number, not ${value}`);
  // Adding zero turns -0 into 0.
  return Number(value.toPrecision(significantDigits)) + 0;
}
