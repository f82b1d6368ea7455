import { decimalValue } from '../notation/decimal-value';
import { plainFigure } from '../notation/plain-figure';
import { roundSignificant } from '../notation/round-significant';
import { significantDecimal } from '../notation/significant-decimal';

/**
 * Writes the three- or four-character code of chips; see readChipMarking. Nothing is rounded.
 *
 * @param resistance Ω, above 0
 * @returns null where the value has more digits than the code, or is too large or too small for it
 */
export function writeChipMarking(resistance: number, characters: 3 | 4): string | null {
  if (!Number.isFinite(resistance) || resistance <= 0) return null;
  const digitCount = characters - 1;
  const decimal = significantDecimal(resistance, 9);
  if (decimal.digits.length > digitCount) return null;
  const noughts = decimal.exponent - digitCount + 1;
  if (noughts > 9) return null;
  if (noughts >= 0) return `${decimal.digits.padEnd(digitCount, '0')}${noughts}`;
  const [whole = '', part = ''] = plainFigure(decimal, 0).split('.');
  // Below one ohm the nought before the point is left out: R47, R047.
  const code = `${whole === '0' ? '' : whole}R${part}`.padEnd(characters, '0');
  const saysAll =
    roundSignificant(decimalValue(`0${code.replace('R', '.')}`, 0), 9) === roundSignificant(resistance, 9);
  return code.length === characters && saysAll ? code : null;
}
