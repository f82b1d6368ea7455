import { intervalAround } from './interval-around';
import { intervalBetween } from './interval-between';
import { normaliseText } from './normalise-text';
import type { ParsedInterval } from './parsed-interval';
import { parseQuantity } from './parse-quantity';
import type { Quantity } from './quantity';

const separators = [
  /^(.+?) ?(?:…|\.{2,3}| to |[\u2013\u2014]) ?(.+)$/,
  // A hyphen between two numbers; not the sign of a power of ten, nor that of the first number.
  /^(.*[^\seE-]) ?- ?(-?[^-]+)$/,
];

/**
 * Reads an interval as engineers type it: `0…24`, `0..24 V`, `-20 to 70 °C`, `10-20`, `±15`, `24 V ± 10 %`.
 * One value alone is returned as `single`, so that the caller decides what its interval is.
 *
 * @returns SI values with min ≤ max, or a refusal that names the input
 * @example parseInterval('-20 to 70 °C', 'temperature') // { ok: true, min: -20, max: 70, text: '−20 °C…70 °C' }
 */
export function parseInterval(text: string, quantity: Quantity): ParsedInterval {
  const normal = normaliseText(text);
  if (normal.length <= 128) {
    const [, centre, spread] = /^(.*?) ?± ?(.+)$/.exec(normal) ?? [];
    if (centre !== undefined && spread !== undefined && quantity !== 'tolerance') {
      return intervalAround(text, centre, spread, quantity);
    }
    for (const separator of separators) {
      const [, first, second] = separator.exec(normal) ?? [];
      if (first !== undefined && second !== undefined) return intervalBetween(text, first, second, quantity);
    }
  }
  const parsed = parseQuantity(text, quantity);
  if (!parsed.ok) return parsed;
  const single = { ok: true, single: parsed.value, text: parsed.text } as const;
  return parsed.tolerance === undefined ? single : { ...single, tolerance: parsed.tolerance };
}
