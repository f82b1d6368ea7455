import type { BindValue } from '../../database/bind-values';
import type { FamilyRevision, FamilySizeRatings } from '../family';
import type { Fields } from './fields';
import {
  completeRatings,
  type CompleteRating,
  modeQuantities,
  sizeQuantities,
  sizeTexts,
} from './rating-fields';

/** Rating → sizes whose datasheet does not give it; `all` stands for every size. */
export type Lacks = ReadonlyMap<CompleteRating, 'all' | readonly string[]>;

export function readLacks(fields: Fields): Lacks {
  return fields.one('lacks', (inner) => {
    const lacks = new Map<CompleteRating, 'all' | readonly string[]>();
    for (const rating of completeRatings) {
      if (!inner.has(rating)) continue;
      lacks.set(rating, inner.raw(rating) === 'all' ? 'all' : inner.texts(rating));
    }
    return lacks;
  });
}

/** What a revision does not give, rating by rating with the sizes concerned. */
export function lacksOf(revision: FamilyRevision): Map<CompleteRating, string[]> {
  const lacks = new Map<CompleteRating, string[]>();
  for (const [size, ratings] of revision.sizes) {
    for (const rating of completeRatings) {
      if (gives(revision, size, ratings, rating)) continue;
      lacks.set(rating, [...(lacks.get(rating) ?? []), size]);
    }
  }
  return lacks;
}

/** Holds what a revision says it lacks against what it does lack. */
export function checkLacks(fields: Fields, said: Lacks, revision: FamilyRevision): void {
  const sizes = [...revision.sizes.keys()];
  const found = lacksOf(revision);
  for (const rating of completeRatings) {
    const missing = found.get(rating) ?? [];
    const stated = said.get(rating) ?? [];
    const statedSizes = stated === 'all' ? sizes : stated;
    const silent = missing.find((size) => !statedSizes.includes(size));
    if (silent !== undefined)
      throw fields.refusal(`sizes.${silent}.${rating}`, 'is missing and not listed under lacks');
    const wrong = statedSizes.find((size) => !missing.includes(size));
    if (wrong !== undefined) throw fields.refusal(`lacks.${rating}`, `${wrong} does give it`);
  }
}

const sizeColumns: Readonly<Record<string, string>> = {
  ...Object.fromEntries(Object.entries(sizeQuantities).map(([name, [column]]) => [name, column])),
  ...sizeTexts,
  body: 'body_length_metre',
  category: 'category_min_celsius',
  mounting: 'mounting',
  pulses: 'pulses',
};
const modeColumns: Readonly<Record<string, string>> = {
  ...Object.fromEntries(Object.entries(modeQuantities).map(([name, [column]]) => [name, column])),
  derating: 'derating_axis',
  drift: 'drift_fraction',
};

function gives(
  revision: FamilyRevision,
  size: string,
  ratings: FamilySizeRatings,
  rating: CompleteRating,
): boolean {
  if (rating === 'failureRateStyle') return revision.failureRateStyle !== null;
  if (rating === 'tcr')
    return revision.ranges.every((range) => range.tcr !== null || !range.sizes.includes(size));
  const modeColumn = modeColumns[rating];
  if (modeColumn !== undefined) return ratings.modes.every((mode) => isGiven(mode[modeColumn]));
  return isGiven(ratings.columns[sizeColumns[rating] ?? '']);
}

function isGiven(value: BindValue | undefined): boolean {
  return value !== undefined && value !== null;
}
