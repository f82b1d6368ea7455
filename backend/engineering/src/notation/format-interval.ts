import { formatQuantity } from './format-quantity';
import type { Quantity } from './quantity';

/**
 * Prints an interval with the unit at both ends: `−20 °C…70 °C`.
 *
 * @throws RangeError for NaN and infinities
 */
export function formatInterval(min: number, max: number, quantity: Quantity): string {
  return `${formatQuantity(min, quantity)}…${formatQuantity(max, quantity)}`;
}
