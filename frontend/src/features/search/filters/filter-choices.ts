import { formatQuantity } from '@resistry/engineering/notation/format-quantity';
import { technologyWords } from '../../../wording/technology-words';
import type { FilterName, FindState, FlagName } from '../find-address';
import type { Facets } from '../requests/get-facets';

/** One value that a filter can take, as it stands in the address and as it is called. */
export interface FilterChoice {
  value: string;
  words: string;
  /** Parts of the whole catalogue that have it. */
  parts: number;
}

export const filterWords: Record<FilterName, string> = {
  manufacturer: 'Manufacturer',
  family: 'Family',
  technology: 'Technology',
  size: 'Size',
  series: 'Series',
  tolerance: 'Tolerance',
  tcr: 'TCR',
};

export const flagWords: Record<FlagName, string> = {
  certificate: 'Safety certificate in date',
  numbered: 'Has a company part number',
  offered: 'Has an offer in force',
};

/** In an address a figure stands without spaces that a mail program would break it at. */
const inAddress = (words: string): string => words.replaceAll(/[\s\u202f\u00a0±]/g, '');

const figureChoices = (
  facet: readonly { value: number; parts: number }[],
  quantity: 'tolerance' | 'temperature-coefficient',
): FilterChoice[] =>
  facet.map(({ value, parts }) => {
    const words = formatQuantity(value, quantity);
    return { value: inAddress(words), words, parts };
  });

/** The families of the chosen manufacturers, or all of them where none is chosen. */
function familyChoices(facets: Facets, manufacturers: readonly string[]): FilterChoice[] {
  return facets.families
    .filter(
      ({ manufacturerId }) => manufacturers.length === 0 || manufacturers.includes(String(manufacturerId)),
    )
    .map(({ id, code, name, parts }) => ({ value: String(id), words: `${code}, ${name}`, parts }));
}

/** What each filter can be set to. */
export function filterChoices(
  facets: Facets,
  chosen: FindState['filters'],
): Record<FilterName, FilterChoice[]> {
  return {
    manufacturer: facets.manufacturers.map(({ id, name, parts }) => ({
      value: String(id),
      words: name,
      parts,
    })),
    family: familyChoices(facets, chosen.manufacturer),
    technology: facets.technologies
      .map(({ value, parts }) => ({ value, words: technologyWords[value], parts }))
      .sort((first, second) => first.words.localeCompare(second.words, 'en')),
    size: facets.sizes.map(({ code, metricCodes, parts }) => ({
      value: code,
      words: [code, ...metricCodes].join('/'),
      parts,
    })),
    series: facets.series.map(({ value, parts }) => ({ value, words: value, parts })),
    tolerance: figureChoices(facets.tolerances, 'tolerance'),
    tcr: figureChoices(facets.tcrs, 'temperature-coefficient'),
  };
}
