import { decadePosition } from '../preferred-values/decade-position';
import { multiplierLetters } from './multiplier-letters';

/**
 * Writes the two-digit-and-letter code of 1 % chips; see readPositionMarking.
 *
 * @param resistance Ω, above 0
 * @returns null where the value is not in E96 or outside 0.1 Ω to 97.6 MΩ
 */
export function writePositionMarking(resistance: number): string | null {
  if (!Number.isFinite(resistance) || resistance <= 0) return null;
  const { decade, index, member } = decadePosition(resistance, 'E96');
  const letter = multiplierLetters.find(({ exponent }) => exponent === decade - 2)?.letters[0];
  if (!member || letter === undefined) return null;
  return `${String(index + 1).padStart(2, '0')}${letter}`;
}
