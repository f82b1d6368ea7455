import { formatQuantityParts, type FormatOptions } from './format-quantity-parts';
import type { Quantity } from './quantity';

/**
 * Prints a quantity as one text: `4.7 kΩ`, `250 µs`, `±1 %`, `50 ppm/K`, `10 years`.
 *
 * @param value SI unit of the quantity (temperature in °C, tolerance as a fraction)
 * @throws RangeError for NaN and infinities
 */
export function formatQuantity(value: number, quantity: Quantity, options?: FormatOptions): string {
  const { figure, unit } = formatQuantityParts(value, quantity, options);
  return unit === '' ? figure : `${figure} ${unit}`;
}
