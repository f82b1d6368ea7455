import { ambiguousCapitalE } from './ambiguous-capital-e';
import { decimalValue } from './decimal-value';
import { formatQuantity } from './format-quantity';
import { normaliseText } from './normalise-text';
import type { Quantity } from './quantity';
import { quantityDefinitions } from './quantity-definitions';
import { quoteInput } from './quote-input';
import { longestText, readQuantity, type WrittenQuantity } from './read-quantity';
import type { Scale } from './read-unit';
import { refuseValue } from './refuse-value';
import { roundSignificant } from './round-significant';
import { toleranceLetters } from './tolerance-letters';

export type ParsedQuantity =
  | {
      readonly ok: true;
      /** SI unit of the quantity: Ω, V, A, W, J, s, Hz, F, H, m, K/W; temperatures °C; fractions; 1/K, 1/V; dB. */
      readonly value: number;
      /** The value as Resistry prints it: 4.7 kΩ. */
      readonly text: string;
      /** Fraction; only for a resistance typed with its tolerance (4K7J, 4.7 kΩ ±5 %). */
      readonly tolerance?: number;
    }
  | {
      readonly ok: false;
      /** Names the input and says what to do. */
      readonly message: string;
      /** SI values, where the input can be read in several ways. */
      readonly readings?: readonly number[];
    };

const toleranceBehind = /^(.+?)(?: ?± ?| )([\d.,]+ ?%)$/;

/**
 * Reads a quantity as engineers type it: `4k7`, `R10`, `5L0`, `4,7k`, `250 µs`, `±1 %`, `50 ppm/K`, `10 years`.
 * `m` is milli and `M` mega; `K` is taken for kilo. A year is 8760 h. Superscript powers are refused.
 * A text that can be read in two ways is refused with both readings; nothing is guessed, nothing is clamped.
 *
 * @example parseQuantity('4k7', 'resistance') // { ok: true, value: 4700, text: '4.7 kΩ' }
 */
export function parseQuantity(text: string, quantity: Quantity): ParsedQuantity {
  if (quantity === 'resistance' && text.length <= longestText) {
    const ambiguous = ambiguousCapitalE(text);
    if (ambiguous) return ambiguous;
    const [, value, tolerance] = toleranceBehind.exec(normaliseText(text)) ?? [];
    if (value !== undefined && tolerance !== undefined) return withTolerance(text, value, tolerance);
  }
  if (quantity === 'tolerance') {
    const fraction = toleranceLetters.get(text.trim());
    if (fraction !== undefined)
      return { ok: true, value: fraction, text: formatQuantity(fraction, quantity) };
  }
  const written = readQuantity(text, quantity);
  if (!written.ok) return written;
  const readings = readingsOf(written);
  const possible = readings.filter((reading) => refuseValue(reading, quantity) === null);
  const [only, other] = possible;
  if (written.figures.length === 1 && only !== undefined && other === undefined)
    return accepted(only, quantity, written.tolerance);
  if (readings.length > 1 && only !== undefined) return ambiguous(text, quantity, written, readings);
  const first = readings[0] ?? { value: NaN, lost: true };
  return { ok: false, message: `${quoteInput(text)} ${refuseValue(first, quantity) ?? 'cannot be read'}.` };
}

/** A value, and whether its digits were lost because it is below the range of a double. */
interface Reading {
  readonly value: number;
  readonly lost: boolean;
}

function readingsOf(written: WrittenQuantity): Reading[] {
  const readings: Reading[] = [];
  for (const figure of written.figures) {
    for (const scale of written.scales) {
      const reading = siReading(`${written.negative ? '-' : ''}${figure}`, written.exponent, scale);
      if (!readings.some((known) => known.value === reading.value)) readings.push(reading);
    }
  }
  return readings;
}

function siReading(figure: string, exponent: number, scale: Scale): Reading {
  const plain = decimalValue(figure, exponent + scale.exponent);
  const lost = plain === 0 && /[1-9]/.test(figure);
  // Adding zero turns -0 into 0.
  if (scale.factor === 1 && scale.offset === 0) return { value: plain + 0, lost };
  const scaled = plain * scale.factor + scale.offset;
  return { value: Number.isFinite(scaled) ? roundSignificant(scaled) : scaled, lost };
}

function accepted({ value }: Reading, quantity: Quantity, tolerance?: number): ParsedQuantity {
  const text = formatQuantity(value, quantity);
  if (tolerance === undefined) return { ok: true, value, text };
  return { ok: true, value, text: `${text} ${formatQuantity(tolerance, 'tolerance')}`, tolerance };
}

function ambiguous(
  text: string,
  quantity: Quantity,
  written: WrittenQuantity,
  readings: readonly Reading[],
): ParsedQuantity {
  const values = readings.map((reading) => reading.value);
  const words = values.map((value) => formatQuantity(value, quantity)).join(' or ');
  const advice =
    written.figures.length > 1
      ? `Write ${written.figures.join(' or ')} instead`
      : `Write the unit, for example ${quantityDefinitions[quantity].example}`;
  return { ok: false, message: `${quoteInput(text)} can mean ${words}. ${advice}.`, readings: values };
}

function withTolerance(text: string, valueText: string, toleranceText: string): ParsedQuantity {
  const resistance = parseQuantity(valueText, 'resistance');
  if (!resistance.ok) return resistance;
  const tolerance = parseQuantity(toleranceText, 'tolerance');
  if (!tolerance.ok) return tolerance;
  if (resistance.tolerance !== undefined)
    return { ok: false, message: `${quoteInput(text)} states two tolerances.` };
  return accepted({ value: resistance.value, lost: false }, 'resistance', tolerance.value);
}
