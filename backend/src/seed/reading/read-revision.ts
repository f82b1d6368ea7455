import { seriesNames } from '@resistry/engineering/preferred-values/series';
import { features } from '@resistry/engineering/ratings/technology';
import { parseOrderingCodeTemplate } from '../../parts/ordering-code-template';
import type {
  Deed,
  FamilyCitation,
  FamilyPackaging,
  FamilyRange,
  FamilyRevision,
  FamilySizeRatings,
} from '../family';
import { Fields, isPlain } from './fields';
import { checkLacks, readLacks } from './lacks';
import { sizeOver } from './merge-revisions';
import { citableFields } from './rating-fields';
import { readSizeRatings } from './read-size-ratings';

/** What a revision may point at. */
export interface FamilyFrame {
  readonly sizes: readonly string[];
  /** `document revision` → pages. */
  readonly datasheets: ReadonlyMap<string, number>;
}

export function readDeed(fields: Fields): Deed {
  return { by: fields.text('by'), on: fields.day('on') };
}

/** Reads a revision whose `basedOn` has been written out. */
export function readRevision(fields: Fields, frame: FamilyFrame): FamilyRevision {
  if (fields.has('basedOn')) fields.whole('basedOn', 1);
  const datasheet = fields.text('datasheet');
  const pages = frame.datasheets.get(datasheet);
  if (pages === undefined)
    throw fields.refusal('datasheet', `“${datasheet}” is not a datasheet of the family`);
  const orderingCodeTemplate = fields.text('orderingCode');
  const parsed = parseOrderingCodeTemplate(orderingCodeTemplate);
  if (!parsed.ok) throw fields.refusal('orderingCode', parsed.message);
  const revision: FamilyRevision = {
    number: fields.whole('number', 1),
    description: fields.text('description'),
    datasheet,
    entered: fields.one('entered', readDeed),
    published: fields.one('published', readDeed),
    referenceTemperature:
      fields.optional('referenceTemperature', () => fields.quantity('referenceTemperature', 'temperature')) ??
      null,
    failureRateStyle: fields.optional('failureRateStyle', () => fields.text('failureRateStyle')) ?? null,
    features: fields.texts('features').map((text) => {
      const feature = features.find((candidate) => candidate === text);
      if (feature === undefined)
        throw fields.refusal('features', `“${text}” is not one of ${features.join(', ')}`);
      return feature;
    }),
    orderingCodeTemplate,
    orderingCode: parsed.template,
    sizes: readSizes(fields, frame),
    ranges: fields.list('ranges', (inner) => readRange(inner, frame)),
    packagings: fields.list('packagings', (inner) => readPackaging(inner, frame)),
    citations: fields.list('citations', (inner) => readCitation(inner, frame, pages)),
  };
  const { entered, published } = revision;
  if (published.by === entered.by)
    throw fields.refusal('published.by', 'nobody publishes what he or she entered');
  if (published.on < entered.on) throw fields.refusal('published.on', 'comes before it was entered');
  refuseOverlaps(fields, revision.ranges);
  checkLacks(fields, readLacks(fields), revision);
  return revision;
}

function readSizes(fields: Fields, frame: FamilyFrame): Map<string, FamilySizeRatings> {
  const common = fields.object('common');
  const given = fields.object('sizes');
  const stranger = Object.keys(given).find((code) => !frame.sizes.includes(code));
  if (stranger !== undefined) throw fields.refusal(`sizes.${stranger}`, 'is not a size of the family');
  return new Map(
    frame.sizes.map((code) => {
      const own = given[code];
      if (!isPlain(own)) throw fields.refusal(`sizes.${code}`, 'must be an object');
      const path = `${fields.path}.sizes.${code}`;
      return [code, Fields.read(fields.file, path, sizeOver(common, own), readSizeRatings)];
    }),
  );
}

function readRange(fields: Fields, frame: FamilyFrame): FamilyRange {
  const [min = NaN, max = NaN] = fields.quantities('span', 'resistance', 2);
  if (min > max) throw fields.refusal('span', 'must rise');
  return {
    sizes: sizesIn(fields, frame),
    tolerance: fields.quantity('tolerance', 'tolerance'),
    tcr: fields.optional('tcr', () => fields.quantity('tcr', 'temperature-coefficient')) ?? null,
    min,
    max,
    series: fields.texts('series').map((text) => {
      const series = seriesNames.find((candidate) => candidate === text);
      if (series === undefined)
        throw fields.refusal('series', `“${text}” is not one of ${seriesNames.join(', ')}`);
      return series;
    }),
  };
}

function readPackaging(fields: Fields, frame: FamilyFrame): FamilyPackaging {
  return {
    sizes: sizesIn(fields, frame),
    code: fields.text('code'),
    description: fields.text('description'),
    quantity: fields.whole('quantity', 1),
  };
}

function readCitation(fields: Fields, frame: FamilyFrame, pages: number): FamilyCitation {
  const cited = fields.texts('fields');
  const stranger = cited.find((field) => !citableFields.includes(field));
  if (stranger !== undefined) throw fields.refusal('fields', `“${stranger}” is no rating`);
  const page = fields.whole('page', 1);
  if (page > pages) throw fields.refusal('page', `the datasheet has only ${pages} pages`);
  const size = fields.optional('size', () => fields.text('size')) ?? null;
  if (size !== null && !frame.sizes.includes(size))
    throw fields.refusal('size', 'is not a size of the family');
  return { fields: cited, page, size, note: fields.optional('note', () => fields.text('note')) ?? null };
}

function sizesIn(fields: Fields, frame: FamilyFrame): string[] {
  const sizes = fields.texts('sizes');
  const stranger = sizes.find((size) => !frame.sizes.includes(size));
  if (stranger !== undefined) throw fields.refusal('sizes', `“${stranger}” is not a size of the family`);
  return sizes;
}

/** A part must find its row of the range table, so rows of equal size, tolerance and TCR keep apart. */
function refuseOverlaps(fields: Fields, ranges: readonly FamilyRange[]): void {
  for (const [place, range] of ranges.entries()) {
    for (const other of ranges.slice(0, place)) {
      const same = range.tolerance === other.tolerance && range.tcr === other.tcr;
      const meet = range.min <= other.max && other.min <= range.max;
      if (same && meet && range.sizes.some((size) => other.sizes.includes(size))) {
        throw fields.refusal(`ranges[${place}]`, 'overlaps another row of the same size, tolerance and TCR');
      }
    }
  }
}
