import { electricalQuantities } from './electrical-quantities';
import { otherQuantities } from './other-quantities';
import type { Quantity } from './quantity';
import type { QuantityDefinition } from './quantity-definition';

/** Units, limits and printed form of every quantity. */
export const quantityDefinitions: Readonly<Record<Quantity, QuantityDefinition>> = {
  ...electricalQuantities,
  ...otherQuantities,
};
