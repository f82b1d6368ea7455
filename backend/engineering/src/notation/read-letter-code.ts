import { typedPrefixes } from './prefixes';
import type { QuantityDefinition } from './quantity-definition';
import { toleranceLetters } from './tolerance-letters';

/** A figure whose decimal point is a letter. */
export interface WrittenCode {
  readonly figure: string;
  readonly exponent: number;
  readonly tolerance?: number;
  /** What follows the code, to be read as a unit without prefix; often empty. */
  readonly rest: string;
  /** Whether the letter bears a power of ten (4k7, 5L0) rather than standing for the unit itself (4R7). */
  readonly prefixed: boolean;
}

/**
 * Reads the letter code of IEC 60062 (4k7, R47, 5L0, 4K7J, 100KK) and the like of other quantities (3V3, 4n7).
 *
 * @param text normalised text without sign
 * @returns null where the text has another form; then it is to be read as figure and unit
 */
export function readLetterCode(text: string, definition: QuantityDefinition): WrittenCode | null {
  const { pointLetters } = definition;
  if (pointLetters === undefined) return null;
  const exponentOf = (letter: string): number | undefined =>
    pointLetters.get(letter) ?? typedPrefixes.get(letter);
  const bearsTolerance = pointLetters.has('R');

  const inside = /^(\d*)([A-Za-zµΩ])(\d+)(.*)$/.exec(text);
  if (inside) {
    const [, whole = '', letter = '', part = '', rest = ''] = inside;
    const exponent = exponentOf(letter);
    if (exponent === undefined) return null;
    const code = { figure: `${whole || '0'}.${part}`, exponent, prefixed: exponent !== 0 };
    const tolerance = bearsTolerance ? toleranceLetters.get(rest) : undefined;
    return tolerance === undefined ? { ...code, rest } : { ...code, rest: '', tolerance };
  }
  // Capital letters only: 100KF is 100 kΩ ±1 %, whereas 100kF would be kilofarad.
  const after = /^(\d+)([LRKMG])([A-Z])$/.exec(text);
  if (after && bearsTolerance) {
    const [, figure = '', letter = '', toleranceLetter = ''] = after;
    const exponent = exponentOf(letter);
    const tolerance = toleranceLetters.get(toleranceLetter);
    if (exponent === undefined || tolerance === undefined) return null;
    return { figure, exponent, tolerance, rest: '', prefixed: exponent !== 0 };
  }
  return null;
}
