import type { SignificantDecimal } from './significant-decimal';

/**
 * Writes a decimal without an exponent, in units of 10^`unitExponent`: 4.7 × 10³ in units of 10³ is "4.7".
 * Negative figures bear the minus sign U+2212.
 */
export function plainFigure(decimal: SignificantDecimal, unitExponent: number): string {
  const wholeDigits = decimal.exponent - unitExponent + 1;
  const { digits } = decimal;
  let figure: string;
  if (wholeDigits <= 0) figure = `0.${'0'.repeat(-wholeDigits)}${digits}`;
  else if (digits.length <= wholeDigits) figure = digits.padEnd(wholeDigits, '0');
  else figure = `${digits.slice(0, wholeDigits)}.${digits.slice(wholeDigits)}`;
  if (digits === '0') return '0';
  return decimal.negative ? `\u2212${figure}` : figure;
}
