import {
  type PolicyEntry,
  type PolicyMatch,
  policyReadings,
} from '@resistry/engineering/derating/policy-entry';
import { mountings, technologies } from '@resistry/engineering/ratings/technology';
import type { Deed } from '../family';
import { Fields } from './fields';
import { readDeed } from './read-revision';

export interface SeedPolicyVersion {
  readonly number: number;
  readonly note: string;
  readonly entered: Deed;
  readonly published: Deed | null;
  readonly entries: readonly PolicyEntry[];
}

export interface SeedPolicy {
  readonly name: string;
  readonly source: string;
  readonly versions: readonly SeedPolicyVersion[];
}

/** Reads the company's derating policy; its entries as the API takes them, temperatures in °C, altitudes in m. */
export function readPolicy(file: string, content: unknown): SeedPolicy {
  return Fields.read(file, '', content, (fields) => ({
    name: fields.text('name'),
    source: fields.text('source'),
    versions: fields.list('versions', (inner) => {
      const entered = inner.one('entered', readDeed);
      const published = inner.optional('published', () => inner.one('published', readDeed)) ?? null;
      if (published?.by === entered.by)
        throw inner.refusal('published.by', 'nobody publishes what he or she entered');
      return {
        number: inner.whole('number', 1),
        note: inner.text('note'),
        entered,
        published,
        entries: inner.list('entries', readEntry),
      };
    }),
  }));
}

function readEntry(fields: Fields): PolicyEntry {
  const number = (name: string, least: number, most: number): number | undefined =>
    fields.optional(name, () => fields.number(name, least, most));
  return {
    match: fields.one('match', readMatch),
    powerRatio: fields.number('powerRatio', 0, 1),
    reading: fields.choice('reading', policyReadings),
    from: number('from', -100, 500),
    zero: number('zero', -100, 500),
    voltageRatio: fields.number('voltageRatio', 0, 1),
    pulseRatio: number('pulseRatio', 0, 1),
    maxTemperature: number('maxTemperature', -100, 500),
    reserve: number('reserve', 0, 200),
    altitude: fields.optional('altitude', () => fields.pairs('altitude', 'ratio', 'ratio')),
  };
}

function readMatch(fields: Fields): PolicyMatch {
  return {
    technology: fields.optional('technology', () => fields.choice('technology', technologies)),
    mounting: fields.optional('mounting', () => fields.choice('mounting', mountings)),
    style: fields.optional('style', () => fields.text('style')),
    tolerance: fields.optional('tolerance', () => fields.quantity('tolerance', 'tolerance')),
  };
}
