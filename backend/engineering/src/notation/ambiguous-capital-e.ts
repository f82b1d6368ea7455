import { decimalValue } from './decimal-value';
import { formatQuantity } from './format-quantity';
import { normaliseText } from './normalise-text';
import { quoteInput } from './quote-input';

/**
 * Some drawings write E for ohm: 4E7 for 4.7 Ω. As a power of ten it would be 40 MΩ, so both readings are given.
 * Only whole digits on both sides without a sign are in doubt: 1e3, 4.7E3 and 4.7E+03 are powers of ten.
 *
 * @returns null where nothing is in doubt
 */
export function ambiguousCapitalE(
  text: string,
): { readonly ok: false; readonly message: string; readonly readings: readonly number[] } | null {
  const [, whole, part] = /^(\d{1,12})E(\d{1,2}) ?(?:\u03a9|[Oo]hms?)?$/.exec(normaliseText(text)) ?? [];
  if (whole === undefined || part === undefined) return null;
  const point = decimalValue(`${whole}.${part}`, 0);
  const power = decimalValue(whole, Number(part));
  if (point === power) return null;
  const words = `${formatQuantity(point, 'resistance')} or ${formatQuantity(power, 'resistance')}`;
  return {
    ok: false,
    message: `${quoteInput(text)} can mean ${words}. Write ${whole}R${part} or ${whole}e${part} instead.`,
    readings: [point, power],
  };
}
