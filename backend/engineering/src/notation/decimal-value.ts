/**
 * The double nearest to a written decimal times a power of ten: `decimalValue('4.7', 3)` is exactly 4700.
 * Going through the text avoids the rounding of a multiplication (4.1 * 1e-6 is not the double nearest to 0.0000041).
 *
 * @param digits decimal figure such as `47`, `4.7`, `-0.22`
 * @param exponent whole power of ten
 * @returns the value; ±Infinity beyond the range of a double, NaN when `digits` is no figure
 */
export function decimalValue(digits: string | number, exponent: number): number {
  return Number(`${digits}e${exponent}`);
}
