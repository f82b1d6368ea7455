/** A decimal in scientific form: `digits` "4702", `exponent` 3 stand for 4.702 × 10³. */
export interface SignificantDecimal {
  readonly negative: boolean;
  /** At least one digit, no trailing zeros; "0" for zero. */
  readonly digits: string;
  /** Power of ten of the first digit; 0 for zero. */
  readonly exponent: number;
}

/**
 * Rounds to a number of significant digits and gives the decimal digits, so that 4700.000000001 becomes 47 × 10².
 *
 * @param value any finite number
 * @param significantDigits whole, 1 to 15
 * @throws RangeError for a value that is not finite or a count of digits outside 1 to 15
 */
export function significantDecimal(value: number, significantDigits: number): SignificantDecimal {
  if (!Number.isFinite(value)) throw new RangeError(`value must be a finite number, not ${value}`);
  if (!Number.isInteger(significantDigits) || significantDigits < 1 || significantDigits > 15) {
    throw new RangeError(`significantDigits must be a whole number from 1 to 15, not ${significantDigits}`);
  }
  const [mantissa = '0', exponent = '0'] = Math.abs(value)
    .toExponential(significantDigits - 1)
    .split('e');
  const digits = mantissa.replace('.', '').replace(/0+$/, '') || '0';
  return { negative: value < 0, digits, exponent: digits === '0' ? 0 : Number(exponent) };
}
