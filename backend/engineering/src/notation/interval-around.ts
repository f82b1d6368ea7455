import { carryUnit } from './carry-unit';
import { formatInterval } from './format-interval';
import type { ParsedInterval, RefusedInterval } from './parsed-interval';
import { parseQuantity } from './parse-quantity';
import type { Quantity } from './quantity';
import { quoteInput } from './quote-input';
import { refuseValue } from './refuse-value';
import { roundSignificant } from './round-significant';

/**
 * The interval around a typed centre: `24 V ± 10 %`, `24 ± 2 V`, `25 °C ± 5 K`; around zero where the centre is empty: `±15`.
 *
 * @param text the whole input, for messages
 */
export function intervalAround(
  text: string,
  centreText: string,
  spreadText: string,
  quantity: Quantity,
): ParsedInterval {
  const hasCentre = centreText !== '';
  const relative =
    hasCentre && /(?:%|ppm)$/.test(spreadText) && quantity !== 'fraction' && quantity !== 'ratio';
  // Degrees above and below a temperature are a difference: 5 K there is no temperature near absolute zero.
  const difference = quantity === 'temperature' ? 'temperature-difference' : quantity;
  const carried =
    hasCentre && !relative && difference === quantity ? carryUnit(centreText, spreadText, quantity) : null;
  if (carried?.doubtful) return refusal(text, 'leaves open which unit its bare number has; write it at both');

  const centre = hasCentre ? (carried?.first ?? parseQuantity(centreText, quantity)) : null;
  const spread = carried?.second ?? parseQuantity(spreadText, relative ? 'fraction' : difference);
  if (centre && !centre.ok) return centre;
  if (!spread.ok) return spread;
  if (spread.value < 0) return refusal(text, 'has a negative spread');

  const middle = centre?.value ?? 0;
  const distance = relative ? Math.abs(middle) * spread.value : spread.value;
  const min = roundSignificant(middle - distance);
  const max = roundSignificant(middle + distance);
  for (const [end, value] of [['lower', min] as const, ['upper', max] as const]) {
    const reason = refuseValue({ value, lost: false }, quantity);
    if (reason !== null) return refusal(text, `is impossible: its ${end} end ${reason}`);
  }
  const ends = { min, max, text: formatInterval(min, max, quantity) };
  return hasCentre ? { ok: true, ...ends, nominal: middle } : { ok: true, ...ends };
}

function refusal(text: string, reason: string): RefusedInterval {
  return { ok: false, message: `${quoteInput(text)} ${reason}.` };
}
