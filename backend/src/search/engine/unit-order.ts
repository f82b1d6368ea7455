import type { CatalogueIndex } from '../index/catalogue-index';
import { judgedSources } from './company-numbers';
import type { PartOrder } from './part-order';
import type { Sort } from './search-plan';

type Compare = (first: number, second: number) => number;

/** Keys that order a part or a company part number. */
interface Keys {
  column(position: number): number;
  preference(position: number): number;
  price(position: number): number;
  excess(position: number): number;
  id(position: number): number;
}

/** Total order of parts: the column asked for, then preference, price (none last), least excess, id. */
export function orderOfParts(index: CatalogueIndex, order: PartOrder, sort: Sort): Compare {
  return orderBy(sort, {
    column: (position) => order.key(sort.by, position),
    preference: (position) => order.preference(position),
    price: (position) => order.price(position),
    excess: (position) => order.excess(position),
    id: (position) => index.columns.partId[position] ?? 0,
  });
}

/** Total order of company part numbers: each by the best that its judged sources offer. */
export function orderOfNumbers(index: CatalogueIndex, order: PartOrder, sort: Sort): Compare {
  const best = (number: number, key: (position: number) => number): number =>
    Math.min(...judgedSources(index, number).map(key));
  return orderBy(sort, {
    column: (number) =>
      sort.by === 'company-part-number' ? number : best(number, (position) => order.key(sort.by, position)),
    preference: (number) => best(number, (position) => order.preference(position)),
    price: (number) => best(number, (position) => order.price(position)),
    excess: (number) => best(number, (position) => order.excess(position)),
    id: (number) => index.companyNumbers.id[number] ?? 0,
  });
}

function orderBy(sort: Sort, keys: Keys): Compare {
  return (first, second) => {
    if (sort.by !== 'preference') {
      const difference = compareKeys(keys.column(first), keys.column(second), sort.descending);
      if (difference !== 0) return difference;
    }
    return (
      compareKeys(
        keys.preference(first),
        keys.preference(second),
        sort.by === 'preference' && sort.descending,
      ) ||
      compareKeys(keys.price(first), keys.price(second), false) ||
      compareKeys(keys.excess(first), keys.excess(second), false) ||
      keys.id(first) - keys.id(second)
    );
  };
}

/** Infinity stands for "none" and comes last whichever way the column is sorted. */
function compareKeys(first: number, second: number, descending: boolean): number {
  if (first === second) return 0;
  if (first === Infinity) return 1;
  if (second === Infinity) return -1;
  return descending ? second - first : first - second;
}
