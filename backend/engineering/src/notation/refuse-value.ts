import { formatQuantity } from './format-quantity';
import type { Quantity } from './quantity';
import { quantityDefinitions } from './quantity-definitions';

/**
 * Whether a value lies outside what a quantity can be.
 *
 * @param reading `lost` marks a figure other than zero that underflowed to 0
 * @returns the reason, to follow the quoted input; null where the value is possible
 */
export function refuseValue(
  reading: { readonly value: number; readonly lost: boolean },
  quantity: Quantity,
): string | null {
  const definition = quantityDefinitions[quantity];
  const { value, lost } = reading;
  const print = (limit: number): string => formatQuantity(limit, quantity);
  if (Number.isNaN(value)) return `is not ${definition.name}`;
  if (value < 0 && definition.lowest === 0) return `is negative, which ${definition.name} cannot be`;
  if (value > definition.highest)
    return `is beyond the highest value accepted for ${definition.name}, ${print(definition.highest)}`;
  if (value < definition.lowest)
    return `is below the lowest value accepted for ${definition.name}, ${print(definition.lowest)}`;
  if (lost || (value !== 0 && Math.abs(value) < definition.smallest)) {
    return `is smaller than the smallest ${definition.name.replace(/^an? /, '')} accepted, ${print(definition.smallest)}`;
  }
  if (value === 0 && definition.zeroRefused) return `is zero, which ${definition.name} cannot be`;
  return null;
}
