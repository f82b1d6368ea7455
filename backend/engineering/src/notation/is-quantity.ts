import { quantities, type Quantity } from './quantity';

/** Whether a text names one of the quantities that notation knows; anything else must be refused by the caller. */
export function isQuantity(text: string): text is Quantity {
  return quantities.some((quantity) => quantity === text);
}
