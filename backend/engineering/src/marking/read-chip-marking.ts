import { decimalValue } from '../notation/decimal-value';
import type { MarkingReading } from './reading';

/**
 * Reads the three- and four-character codes of chips (IEC 60062): the last digit counts the noughts, R stands for the
 * point (471, 1R5, 103, 1073). Noughts alone (0, 000, 0000) mark a link. They say nothing of the tolerance.
 *
 * @returns null where the text is no such code
 */
export function readChipMarking(text: string): MarkingReading | null {
  if (/^0{1,4}$/.test(text)) return { kind: 'link', resistance: 0 };
  const kind = text.length === 3 ? 'three-character' : 'four-character';
  const [, digits, noughts] = /^([1-9]\d{1,2})(\d)$/.exec(text) ?? [];
  if (digits !== undefined && noughts !== undefined)
    return { kind, resistance: decimalValue(digits, Number(noughts)) };
  if (!/^(?=.{3,4}$)(?:0|[1-9]\d{0,2})?R\d{0,3}$/.test(text)) return null;
  const resistance = decimalValue(`0${text.replace('R', '.')}0`, 0);
  return resistance === 0 ? { kind: 'link', resistance } : { kind, resistance };
}
