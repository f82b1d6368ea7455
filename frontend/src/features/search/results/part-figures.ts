import { formatQuantity } from '@resistry/engineering/notation/format-quantity';
import { type DrawnBody } from '../../../components/drawn-part/drawn-body';
import { drawnBodyOf } from '../../../components/drawn-part/body-of-part';
import type { SearchPart } from '../search-part';

const euro = new Intl.NumberFormat('en', { minimumFractionDigits: 4, maximumFractionDigits: 4 });

/** € a piece, or what is said where no offer is in force. */
export const priceWords = (price: number | undefined): string =>
  price === undefined ? 'no offer' : euro.format(price);

/** Inch and metric code, both, because 0402 and 0603 name two sizes each. */
export const sizeCode = ({ size }: SearchPart): string =>
  size.metricCode !== undefined ? `${size.code}/${size.metricCode}` : size.code;

export function bodyOfPart(part: SearchPart): DrawnBody | undefined {
  return drawnBodyOf({
    style: part.bodyStyle,
    length: part.body?.length,
    width: part.body?.width,
    sizeCode: sizeCode(part),
    resistance: part.resistance,
    tolerance: part.tolerance,
    tcr: part.tcr,
  });
}

/** `4.7 kΩ ±1 % 100 ppm/K`: what one says of a part in a line. */
export function valueWords({ resistance, tolerance, tcr }: SearchPart): string {
  if (resistance === 0) return 'zero-ohm link';
  return [
    formatQuantity(resistance, 'resistance'),
    ...(tolerance !== undefined ? [formatQuantity(tolerance, 'tolerance')] : []),
    ...(tcr !== undefined ? [formatQuantity(tcr, 'temperature-coefficient')] : []),
  ]
    .map((figure) => figure.replaceAll(' ', '\u00a0'))
    .join(' ');
}
