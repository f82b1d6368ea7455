import type { Schema } from '../../api/schema';

type PriceBreak = Schema<'PriceBreakForm'>;

export type ReadPrices = { ok: true; breaks: PriceBreak[] } | { ok: false; message: string };

const count = new Intl.NumberFormat('en');
const line = /^([^\s:]+)(?:\s*:\s*|\s+)€?\s*(\S+)$/;

/** Prices as they are typed, one a line: `1000 0.0069`, pieces and € a piece; a comma may be the decimal point. */
export function readPrices(text: string): ReadPrices {
  const lines = text
    .split('\n')
    .map((each) => each.trim())
    .filter((each) => each !== '');
  if (lines.length === 0) return { ok: false, message: 'Give at least one price, such as 1000 0.0069.' };
  const breaks: PriceBreak[] = [];
  for (const each of lines) {
    const [, pieces = '', price = ''] = line.exec(each) ?? [];
    if (!/^[1-9]\d{0,8}$/.test(pieces)) {
      return { ok: false, message: `“${each}” does not begin with a whole number of pieces, such as 1000.` };
    }
    if (!/^\d+([.,]\d{1,6})?$/.test(price) || !(Number(price.replace(',', '.')) > 0)) {
      return { ok: false, message: `“${each}” does not end with a price above 0 of at most six decimals.` };
    }
    breaks.push({ quantity: Number(pieces), unitPrice: Number(price.replace(',', '.')) });
  }
  return { ok: true, breaks };
}

/** As `readPrices` takes them. */
export const writePrices = (breaks: readonly PriceBreak[]): string =>
  breaks.map(({ quantity, unitPrice }) => `${quantity} ${plain(unitPrice)}`).join('\n');

/** What was understood, said while it is being typed. */
export function priceEcho(text: string): string | undefined {
  const read = readPrices(text);
  return read.ok
    ? read.breaks
        .map(({ quantity, unitPrice }) => `from ${count.format(quantity)}: € ${plain(unitPrice)}`)
        .join('; ')
    : undefined;
}

/** Without an exponent, however small: the least is a millionth. */
const plain = (price: number): string => price.toFixed(6).replace(/\.?0+$/, '');
