import { roundSignificant } from './round-significant';

/**
 * Reads a quotient of whole numbers, as dissipations and ratios are often given: 1/4, 1:10.
 *
 * @returns the figure as a plain decimal (12 significant digits), null in its place for a division by zero, and what follows; null where the text is no quotient
 */
export function readQuotient(text: string): { readonly figure: string | null; readonly rest: string } | null {
  const [, dividend, divisor, rest = ''] = /^(\d{1,4}) ?[/:] ?(\d{1,4})(?!\d) ?(.*)$/.exec(text) ?? [];
  if (dividend === undefined || divisor === undefined) return null;
  if (Number(divisor) === 0) return { figure: null, rest };
  return { figure: String(roundSignificant(Number(dividend) / Number(divisor))), rest };
}
