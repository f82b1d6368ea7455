import { formatQuantityParts } from '@resistry/engineering/notation/format-quantity-parts';
import { formatQuantity } from '@resistry/engineering/notation/format-quantity';
import { parseInterval } from '@resistry/engineering/notation/parse-interval';
import { parseQuantity } from '@resistry/engineering/notation/parse-quantity';
import type { Quantity } from '@resistry/engineering/notation/quantity';
import { endsOfSingle } from '../../../components/interval-field';
import { type EntryName, entryDefinitions } from './duty-entry';

/** Two ends as one says them: the unit once where both have the same. */
export function intervalWords(min: number, max: number, quantity: Quantity): string {
  if (min === max) return formatQuantity(min, quantity);
  const low = formatQuantityParts(min, quantity);
  const high = formatQuantityParts(max, quantity);
  if (low.unit === high.unit) return `${low.figure} to ${high.figure} ${high.unit}`;
  return `${formatQuantity(min, quantity)} to ${formatQuantity(max, quantity)}`;
}

/** An entry as it was understood, for the sentence; what cannot be read stands as it was typed. */
export function entryWords(name: EntryName, text: string): string {
  const { quantity, interval } = entryDefinitions[name];
  if (interval === undefined) {
    const parsed = parseQuantity(text, quantity);
    return parsed.ok ? parsed.text : text;
  }
  const parsed = parseInterval(text, quantity);
  if (!parsed.ok) return text;
  const { min, max } = 'single' in parsed ? endsOfSingle(parsed.single, interval) : parsed;
  if (interval === 'from-zero' && min === 0) return formatQuantity(max, quantity);
  return intervalWords(min, max, quantity);
}

/** Whether an interval reaches up from nothing, so that only its upper end needs saying. */
export function reachesFromZero(name: EntryName, text: string): boolean {
  const { quantity, interval } = entryDefinitions[name];
  const parsed = parseInterval(text, quantity);
  if (!parsed.ok || interval !== 'from-zero') return false;
  return ('single' in parsed ? endsOfSingle(parsed.single, interval) : parsed).min === 0;
}
