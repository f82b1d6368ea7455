import { isMember } from '@resistry/engineering/preferred-values/is-member';
import { type SeriesName, seriesNames } from '@resistry/engineering/preferred-values/series';
import type { PlacedPart } from '../family-rows';
import type { Fields } from './fields';

/** Which parts a decision is about: named ones, or all of a family that fulfil every condition given. */
export type PartSelection =
  | { readonly parts: readonly string[] }
  | {
      readonly family: string;
      readonly sizes?: readonly string[];
      readonly tolerance?: number;
      readonly span?: readonly [min: number, max: number];
      readonly series?: SeriesName;
      /** True: the zero-ohm links; absent: the resistors. */
      readonly links?: boolean;
    };

export function readSelection(fields: Fields): PartSelection {
  if (fields.has('parts')) return { parts: fields.texts('parts') };
  return {
    family: fields.text('family'),
    sizes: fields.optional('sizes', () => fields.texts('sizes')),
    tolerance: fields.optional('tolerance', () => fields.quantity('tolerance', 'tolerance')),
    span: fields.optional('span', () => {
      const [min = NaN, max = NaN] = fields.quantities('span', 'resistance', 2);
      return [min, max] as const;
    }),
    series: fields.optional('series', () => fields.choice('series', seriesNames)),
    links: fields.optional('links', () => fields.boolean('links')),
  };
}

/** Parts by their number and by their family, to be selected from. */
export class PartIndex {
  private readonly byNumber: ReadonlyMap<string, PlacedPart>;
  private readonly byFamily = new Map<string, PlacedPart[]>();

  constructor(parts: readonly PlacedPart[]) {
    this.byNumber = new Map(parts.map((part) => [part.manufacturerPartNumber, part]));
    for (const part of parts) {
      const known = this.byFamily.get(part.family.code);
      if (known) known.push(part);
      else this.byFamily.set(part.family.code, [part]);
    }
  }

  /** @throws RangeError for a number that no family makes */
  get(manufacturerPartNumber: string): PlacedPart {
    const part = this.byNumber.get(manufacturerPartNumber);
    if (!part) throw new RangeError(`no family makes a part ${manufacturerPartNumber}`);
    return part;
  }

  /** @throws RangeError where nothing is selected: then the file and the families have grown apart */
  select(selection: PartSelection): PlacedPart[] {
    if ('parts' in selection) return selection.parts.map((number) => this.get(number));
    const { sizes, tolerance, span, series, links = false } = selection;
    const selected = (this.byFamily.get(selection.family) ?? []).filter(
      (part) =>
        (part.resistance === 0) === links &&
        (sizes === undefined || sizes.includes(part.size)) &&
        (tolerance === undefined || part.tolerance === tolerance) &&
        (span === undefined || (part.resistance >= span[0] && part.resistance <= span[1])) &&
        (series === undefined || isMember(part.resistance, series)),
    );
    if (selected.length === 0) throw new RangeError(`no part of ${selection.family} fulfils the conditions`);
    return selected;
  }
}
