import { carryUnit } from './carry-unit';
import { formatInterval } from './format-interval';
import type { ParsedInterval } from './parsed-interval';
import { type ParsedQuantity, parseQuantity } from './parse-quantity';
import type { Quantity } from './quantity';
import { quoteInput } from './quote-input';

interface Ends {
  readonly first: ParsedQuantity;
  readonly second: ParsedQuantity;
}

/**
 * The interval between two typed ends. A unit in full at one end counts for both (`1…10 kΩ`) unless only the bare number
 * gives an ascending interval (`100…1 kΩ`); a prefix alone leaves two readings open (`1…10k`), which is refused.
 *
 * @param text the whole input, for messages
 */
export function intervalBetween(
  text: string,
  firstText: string,
  secondText: string,
  quantity: Quantity,
): ParsedInterval {
  const asTyped: Ends = {
    first: parseQuantity(firstText, quantity),
    second: parseQuantity(secondText, quantity),
  };
  const carried = carryUnit(firstText, secondText, quantity);
  const candidates = carried ? [carried, asTyped] : [asTyped];
  const [best, other] = candidates.flatMap((ends) => ascending(ends));

  if (best && other && carried?.doubtful && (best.min !== other.min || best.max !== other.max)) {
    const words = [best, other].map(({ min, max }) => formatInterval(min, max, quantity)).join(' or ');
    const readings = [...new Set([best.min, other.min, best.max, other.max])];
    return {
      ok: false,
      message: `${quoteInput(text)} can mean ${words}. Write the unit at both ends.`,
      readings,
    };
  }
  if (best) return { ok: true, ...best, text: formatInterval(best.min, best.max, quantity) };
  if (candidates.some(({ first, second }) => first.ok && second.ok)) {
    return { ok: false, message: `${quoteInput(text)} runs backwards: its first end is above its second.` };
  }
  if (!asTyped.first.ok) return asTyped.first;
  if (!asTyped.second.ok) return asTyped.second;
  return { ok: false, message: `${quoteInput(text)} cannot be read as an interval.` };
}

function ascending({ first, second }: Ends): { min: number; max: number }[] {
  if (!first.ok || !second.ok || first.value > second.value) return [];
  return [{ min: first.value, max: second.value }];
}
