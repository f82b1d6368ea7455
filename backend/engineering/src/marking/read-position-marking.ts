import { decimalValue } from '../notation/decimal-value';
import { seriesMantissas } from '../preferred-values/series-mantissas';
import { multiplierLetters } from './multiplier-letters';
import type { MarkingReading } from './reading';

/**
 * Reads the two-digit-and-letter code of 1 % chips (IEC 60062): position in E96 (01 = 100 … 96 = 976) and multiplier.
 *
 * @returns null where the text is no such code
 */
export function readPositionMarking(text: string): MarkingReading | null {
  const [, position = '', letter = ''] = /^(\d\d)([A-Z])$/.exec(text) ?? [];
  const mantissa = seriesMantissas('E96')[Number(position) - 1];
  const multiplier = multiplierLetters.find(({ letters }) => letters.includes(letter));
  if (mantissa === undefined || multiplier === undefined) return null;
  return {
    kind: 'two-digit-and-letter',
    resistance: decimalValue(mantissa, multiplier.exponent),
    tolerance: 0.01,
  };
}
