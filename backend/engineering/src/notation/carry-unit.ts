import { type ParsedQuantity, parseQuantity } from './parse-quantity';
import type { Quantity } from './quantity';
import { readQuantity } from './read-quantity';

/** Two numbers after the unit of the one was given to the other. */
export interface CarriedUnit {
  readonly first: ParsedQuantity;
  readonly second: ParsedQuantity;
  /** Whether only a prefix was carried: `1…10k` may as well mean 1 Ω. */
  readonly doubtful: boolean;
}

/** Gives the unit that only one of two numbers bears to the other; null where both bear one, none does, or one cannot be read. */
export function carryUnit(firstText: string, secondText: string, quantity: Quantity): CarriedUnit | null {
  const first = readQuantity(firstText, quantity);
  const second = readQuantity(secondText, quantity);
  if (!first.ok || !second.ok || (first.form === 'none') === (second.form === 'none')) return null;
  const bearer = first.form === 'none' ? second : first;
  return {
    first: parseQuantity(first.form === 'none' ? `${firstText} ${bearer.unitText}` : firstText, quantity),
    second: parseQuantity(second.form === 'none' ? `${secondText} ${bearer.unitText}` : secondText, quantity),
    doubtful: bearer.form === 'prefix',
  };
}
