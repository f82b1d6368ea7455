/** The figure as plain decimals with a point, one for each way it can be read, and the power of ten after it. */
export type WrittenNumber =
  | { readonly ok: true; readonly figures: readonly string[]; readonly exponent: number }
  | { readonly ok: false; readonly reason: string };

const groupedBySpace = /^[1-9]\d{0,2}(?: \d{3})+(?:[.,]\d+)?$/;
const groupedByComma = /^[1-9]\d{0,2}(?:,\d{3})+(?:\.\d+)?$/;
const groupedByPoint = /^[1-9]\d{0,2}(?:\.\d{3})+,\d+$/;
const plain = /^(?:\d+(?:[.,]\d*)?|[.,]\d+)$/;

/**
 * Reads the figure of a quantity: decimal point or comma, thousands set apart by spaces, commas or points, power of ten after e.
 * One comma before exactly three digits can be read in two ways, and both are given: `4,700` gives 4.7 and 4700.
 *
 * @param text figure without sign and unit
 */
export function readNumber(text: string): WrittenNumber {
  const [, mantissa = '', power = '0'] = /^(.*?)(?:[eE]([+-]?\d+))?$/.exec(text) ?? [];
  // Beyond four digits no power of ten is in the range of a double, so that its exact size is of no interest.
  const exponent = Math.max(-9999, Math.min(9999, Number(power)));
  const figures = figuresOf(mantissa);
  if (figures === null) return { ok: false, reason: reasonOf(mantissa) };
  return { ok: true, figures, exponent };
}

function figuresOf(mantissa: string): string[] | null {
  const commas = mantissa.split(',').length - 1;
  if (groupedBySpace.test(mantissa)) return [tidy(mantissa.replace(/ /g, '').replace(',', '.'))];
  if (groupedByComma.test(mantissa)) {
    const thousands = mantissa.replace(/,/g, '');
    const couldBeDecimal = commas === 1 && !mantissa.includes('.');
    return couldBeDecimal ? [tidy(mantissa.replace(',', '.')), tidy(thousands)] : [tidy(thousands)];
  }
  if (groupedByPoint.test(mantissa)) return [tidy(mantissa.replace(/\./g, '').replace(',', '.'))];
  if (plain.test(mantissa)) return [tidy(mantissa.replace(',', '.'))];
  return null;
}

/** "007.50" to "7.5", so that messages show what was understood. */
function tidy(figure: string): string {
  const [whole = '', part = ''] = figure.split('.');
  const wholeDigits = whole.replace(/^0+(?=\d)/, '') || '0';
  const partDigits = part.replace(/0+$/, '');
  return partDigits === '' ? wholeDigits : `${wholeDigits}.${partDigits}`;
}

function reasonOf(mantissa: string): string {
  if (mantissa.split('.').length > 2 || mantissa.split(',').length > 2)
    return 'has more than one decimal sign';
  if (mantissa.includes('.') && mantissa.includes(',')) return 'mixes point and comma';
  if (mantissa.includes(' ')) return 'holds more than one number';
  return 'holds no number that can be read';
}
