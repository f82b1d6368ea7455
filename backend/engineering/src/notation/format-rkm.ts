import { plainFigure } from './plain-figure';
import { significantDecimal } from './significant-decimal';

const letters = [
  { letter: 'G', exponent: 9 },
  { letter: 'M', exponent: 6 },
  { letter: 'K', exponent: 3 },
  { letter: 'R', exponent: 0 },
] as const;

/**
 * The letter code of IEC 60062, in which a letter stands for the decimal point: 4K7, 47K3, 10R, R47, 5L0.
 * Below 0.1 Ω the letter L (milliohm) is used.
 *
 * @param resistance Ω, 0 or more; 9 significant digits are kept
 * @throws RangeError for negative values, NaN and infinities
 */
export function formatRkm(resistance: number): string {
  if (!Number.isFinite(resistance) || resistance < 0) {
    throw new RangeError(`resistance must be 0 or more and finite, not ${resistance}`);
  }
  const decimal = significantDecimal(resistance, 9);
  if (decimal.digits === '0') return '0R0';
  const milliohm = decimal.exponent < -1;
  const { letter, exponent } = milliohm
    ? { letter: 'L', exponent: -3 }
    : (letters.find((candidate) => decimal.exponent >= candidate.exponent) ?? { letter: 'R', exponent: 0 });
  const [whole = '0', part = ''] = plainFigure(decimal, exponent).split('.');
  // The standard writes three characters at least: 1R0, 10R, R10.
  if (whole === '0') return `${letter}${part.padEnd(2, '0')}`;
  return whole.length === 1 ? `${whole}${letter}${part.padEnd(1, '0')}` : `${whole}${letter}${part}`;
}
