import { roundSignificant } from './round-significant';
import { toleranceLetters } from './tolerance-letters';

/**
 * The letter of IEC 60062 for a symmetrical tolerance.
 *
 * @param tolerance fraction, 0.05 for ±5 %
 * @returns the letter (J for 0.05), or null where the standard has none
 */
export function toleranceLetter(tolerance: number): string | null {
  if (!Number.isFinite(tolerance)) return null;
  const wanted = roundSignificant(tolerance, 9);
  for (const [letter, fraction] of toleranceLetters) if (fraction === wanted) return letter;
  return null;
}
