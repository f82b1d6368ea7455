import { quantityDefinitions } from '../notation/quantity-definitions';
import { decadePosition } from './decade-position';
import type { SeriesName } from './series';
import { valueAt } from './value-at';

/**
 * The resistances of a series from one value to another, both ends included where they belong to it.
 * Rounding noise at the ends is forgiven: nine significant digits count.
 *
 * @param from Ω, from 1 µΩ
 * @param to Ω, not below `from`, up to 10 TΩ; so that no more than 19 decades can be asked for
 * @returns ascending, exact decimals; empty where no value lies between
 * @throws RangeError naming the argument that is not finite or out of bounds, or saying that `from` is above `to`
 */
export function valuesBetween(from: number, to: number, series: SeriesName): number[] {
  const { smallest, highest } = quantityDefinitions.resistance;
  for (const [name, value] of [['from', from] as const, ['to', to] as const]) {
    if (!Number.isFinite(value) || value < smallest || value > highest) {
      throw new RangeError(`${name} must be a resistance from ${smallest} Ω to ${highest} Ω, not ${value}`);
    }
  }
  if (from > to) throw new RangeError(`from (${from}) must not be above to (${to})`);
  const first = decadePosition(from, series);
  const last = decadePosition(to, series);
  const perDecade = Number(series.slice(1));
  const start = first.index + (first.member ? 0 : 1);
  const end = (last.decade - first.decade) * perDecade + last.index;
  return Array.from({ length: Math.max(0, end - start + 1) }, (_, step) =>
    valueAt(first.decade, start + step, series),
  );
}
