import type { Deed } from '../family';
import { Fields } from './fields';
import { readDeed } from './read-revision';

export interface SeedManufacturer {
  readonly code: string;
  readonly name: string;
  readonly country: string | null;
  readonly note: string | null;
  readonly entered: Deed;
}

export interface SeedSupplier {
  readonly code: string;
  readonly name: string;
  /** Weight with which an offer is this supplier's. */
  readonly share: number;
  readonly leadTimeDays: readonly [least: number, most: number];
}

export function readManufacturers(file: string, content: unknown): SeedManufacturer[] {
  return Fields.read(file, '', content, (fields) =>
    fields.list('manufacturers', (inner) => ({
      code: inner.text('code'),
      name: inner.text('name'),
      country: inner.optional('country', () => inner.text('country')) ?? null,
      note: inner.optional('note', () => inner.text('note')) ?? null,
      entered: inner.one('entered', readDeed),
    })),
  );
}

export function readSuppliers(file: string, content: unknown): SeedSupplier[] {
  return Fields.read(file, '', content, (fields) =>
    fields.list('suppliers', (inner) => ({
      code: inner.text('code'),
      name: inner.text('name'),
      share: inner.whole('share', 1),
      leadTimeDays: readSpan(inner, 'leadTimeDays'),
    })),
  );
}

/** Two whole numbers, the second not below the first. */
export function readSpan(fields: Fields, name: string): [number, number] {
  const value = fields.raw(name);
  if (Array.isArray(value) && value.length === 2) {
    const [least, most] = value as unknown[];
    if (
      Number.isInteger(least) &&
      Number.isInteger(most) &&
      Number(least) >= 0 &&
      Number(most) >= Number(least)
    ) {
      return [Number(least), Number(most)];
    }
  }
  throw fields.refusal(name, 'must be two whole numbers, the least and the most');
}
