import { decimalValue } from '../notation/decimal-value';
import { toleranceLetters } from '../notation/tolerance-letters';
import type { MarkingReading } from './reading';

const pointLetters: ReadonlyMap<string, number> = new Map([
  ['L', -3],
  ['R', 0],
  ['K', 3],
  ['M', 6],
  ['G', 9],
]);

/**
 * Reads the letter code of IEC 60062 as it stands on a component, in capitals: R47, 4R7, 4K7, 5L0, 4K7J, 100KK.
 *
 * @returns null where the text is no such code; kind `link` for a code of noughts (0R0)
 */
export function readLetterMarking(text: string): MarkingReading | null {
  const [, whole = '', letter = '', part = '', toleranceLetter] =
    /^((?:0|[1-9]\d{0,3})?)([LRKMG])(\d{0,5})([A-Z])?$/.exec(text) ?? [];
  const exponent = pointLetters.get(letter);
  if (exponent === undefined || whole + part === '') return null;
  const resistance = decimalValue(`${whole || '0'}.${part || '0'}`, exponent);
  const tolerance = toleranceLetter === undefined ? undefined : toleranceLetters.get(toleranceLetter);
  if (toleranceLetter !== undefined && tolerance === undefined) return null;
  if (resistance === 0) return tolerance === undefined ? { kind: 'link', resistance } : null;
  return tolerance === undefined
    ? { kind: 'letter-code', resistance }
    : { kind: 'letter-code', resistance, tolerance };
}
