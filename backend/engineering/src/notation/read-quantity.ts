import { normaliseText } from './normalise-text';
import type { Quantity } from './quantity';
import { quantityDefinitions } from './quantity-definitions';
import type { QuantityDefinition } from './quantity-definition';
import { quoteInput } from './quote-input';
import { readLetterCode } from './read-letter-code';
import { readNumber } from './read-number';
import { readQuotient } from './read-quotient';
import { readUnit, type Scale } from './read-unit';

/** What was written, before it is known whether the value is possible. */
export interface WrittenQuantity {
  readonly ok: true;
  readonly negative: boolean;
  /** Plain decimals; two where a comma can be read in two ways. */
  readonly figures: readonly string[];
  readonly exponent: number;
  readonly scales: readonly Scale[];
  readonly form: 'none' | 'prefix' | 'unit';
  /** The unit as typed, to be carried to the other end of an interval. */
  readonly unitText: string;
  readonly tolerance?: number;
}

export interface Refusal {
  readonly ok: false;
  readonly message: string;
}

/** No quantity takes more characters; longer texts are refused unread. */
export const longestText = 64;
const numberAtStart = /^(?:\d[\d.,]*|[.,]\d[\d.,]*)(?: \d{3}(?!\d)[.,\d]*)*(?:[eE][+-]?\d+)?/;

/** Takes a typed quantity apart: sign, figure, unit. Refuses what has no such form or the unit of another quantity. */
export function readQuantity(text: string, quantity: Quantity): WrittenQuantity | Refusal {
  const definition = quantityDefinitions[quantity];
  const shown = quoteInput(text);
  const refuse = (message: string): Refusal => ({ ok: false, message });

  if (text.length > longestText)
    return refuse(`${shown} is too long to be ${definition.name}: at most ${longestText} characters.`);
  const normal = normaliseText(text);
  if (normal === '') return refuse(`Enter ${definition.name}, for example ${definition.example}.`);

  const [, sign = '', unsigned = ''] = /^([±+\-\u2013]?) ?(.*)$/.exec(normal) ?? [];
  if (sign === '±' && !definition.plusMinus) {
    return refuse(
      `${shown} states a spread; ${definition.name} as one number is wanted, for example ${definition.example}.`,
    );
  }
  const negative = sign === '-' || sign === '\u2013';

  const code = readLetterCode(unsigned, definition);
  if (code) {
    const unit = readUnit(code.rest, definition);
    // The code bears its own power of ten: behind it only the unit itself may follow, without a prefix.
    const repeated = unit?.form === 'unit' && unit.scales.every((scale) => scale.exponent === 0);
    if (unit?.form !== 'none' && !repeated) return refuse(unitMessage(shown, code.rest, definition));
    return {
      ok: true,
      negative,
      figures: [code.figure],
      exponent: 0,
      scales: [{ exponent: code.exponent, factor: 1, offset: 0 }],
      form: code.prefixed ? 'prefix' : 'unit',
      unitText: /[A-Za-zµΩ]/.exec(unsigned)?.[0] ?? '',
      tolerance: code.tolerance,
    };
  }
  const quotient = definition.quotients ? readQuotient(unsigned) : null;
  if (quotient) {
    if (quotient.figure === null) return refuse(`${shown} divides by zero.`);
    const unit = readUnit(quotient.rest, definition);
    if (!unit) return refuse(unitMessage(shown, quotient.rest, definition));
    return {
      ok: true,
      negative,
      figures: [quotient.figure],
      exponent: 0,
      scales: unit.scales,
      form: unit.form,
      unitText: quotient.rest,
    };
  }
  const numberText = numberAtStart.exec(unsigned)?.[0];
  if (numberText === undefined) {
    return refuse(
      `${shown} is not ${definition.name}: write a number and its unit, for example ${definition.example}.`,
    );
  }
  const number = readNumber(numberText);
  if (!number.ok) return refuse(`${shown} is not ${definition.name}: it ${number.reason}.`);
  const unitText = unsigned.slice(numberText.length).trim();
  const unit = readUnit(unitText, definition);
  if (!unit) return refuse(unitMessage(shown, unitText, definition));
  return {
    ok: true,
    negative,
    figures: number.figures,
    exponent: number.exponent,
    scales: unit.scales,
    form: unit.form,
    unitText,
  };
}

function unitMessage(shown: string, unitText: string, definition: QuantityDefinition): string {
  const bare = unitText.trim();
  for (const other of Object.values(quantityDefinitions)) {
    if (other !== definition && readUnit(bare, other)?.form === 'unit') {
      return `${shown} ends in a unit of ${other.name}; ${definition.name} is wanted, for example ${definition.example}.`;
    }
  }
  return `${shown} is not ${definition.name}: ${quoteInput(bare)} is no unit of it. Write for example ${definition.example}.`;
}
