import { formatRkm } from '../notation/format-rkm';
import { toleranceLetter } from '../notation/tolerance-letter';

/**
 * Writes the letter code of IEC 60062, with the tolerance letter where a tolerance is given: 4K7J.
 *
 * @param resistance Ω, above 0
 * @param tolerance symmetrical, as a fraction
 * @returns null where the standard has no letter for the tolerance or the resistance is not above 0
 */
export function writeLetterMarking(resistance: number, tolerance?: number): string | null {
  if (!Number.isFinite(resistance) || resistance <= 0) return null;
  if (tolerance === undefined) return formatRkm(resistance);
  const letter = toleranceLetter(tolerance);
  return letter === null ? null : `${formatRkm(resistance)}${letter}`;
}
