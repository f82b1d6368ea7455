import type { Quantity } from '@resistry/engineering/notation/quantity';
import { parseQuantity } from '@resistry/engineering/notation/parse-quantity';
import { SeedDataError } from './seed-data-error';

/** An object of a file as JSON gives it. */
export type Plain = Readonly<Record<string, unknown>>;

export function isPlain(value: unknown): value is Plain {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

/**
 * One object of a seed file, read field by field. Quantities are written with their units as engineers write them and come
 * out in SI. Every refusal names the file and the field; a field that nobody asked for is refused too.
 */
export class Fields {
  private readonly asked = new Set<string>();
  private readonly plain: Plain;

  private constructor(
    readonly file: string,
    readonly path: string,
    value: unknown,
  ) {
    if (!isPlain(value)) throw new SeedDataError(file, path, 'must be an object');
    this.plain = value;
  }

  /** Reads an object as a whole: what `read` does not ask for is refused. */
  static read<Result>(file: string, path: string, value: unknown, read: (fields: Fields) => Result): Result {
    const fields = new Fields(file, path, value);
    const result = read(fields);
    const unknown = Object.keys(fields.plain).filter((name) => !fields.asked.has(name));
    if (unknown.length > 0) throw fields.refusal(unknown[0] ?? '', 'is not a known field');
    return result;
  }

  refusal(name: string, words: string): SeedDataError {
    return new SeedDataError(this.file, this.path === '' ? name : `${this.path}.${name}`, words);
  }

  has(name: string): boolean {
    return this.plain[name] !== undefined;
  }

  /** The names given, for objects whose names are data. */
  names(): string[] {
    return Object.keys(this.plain);
  }

  raw(name: string): unknown {
    this.asked.add(name);
    const value = this.plain[name];
    if (value === undefined) throw this.refusal(name, 'is missing');
    return value;
  }

  /** An object that is not read field by field. */
  object(name: string): Plain {
    const value = this.raw(name);
    if (isPlain(value)) return value;
    throw this.refusal(name, 'must be an object');
  }

  objects(name: string): Plain[] {
    const values = this.raw(name);
    if (Array.isArray(values) && values.every(isPlain)) return values;
    throw this.refusal(name, 'must be a list of objects');
  }

  text(name: string): string {
    const value = this.raw(name);
    if (typeof value !== 'string' || value.trim() === '') throw this.refusal(name, 'must be a text');
    return value;
  }

  whole(name: string, least: number): number {
    const value = this.raw(name);
    if (typeof value === 'number' && Number.isInteger(value) && value >= least) return value;
    throw this.refusal(name, `must be a whole number of at least ${least}`);
  }

  number(name: string, least: number, most: number): number {
    const value = this.raw(name);
    if (typeof value === 'number' && value >= least && value <= most) return value;
    throw this.refusal(name, `must be a number from ${least} to ${most}`);
  }

  boolean(name: string): boolean {
    const value = this.raw(name);
    if (typeof value === 'boolean') return value;
    throw this.refusal(name, 'must be true or false');
  }

  choice<Choice extends string>(name: string, choices: readonly Choice[]): Choice {
    const value = this.raw(name);
    const choice = choices.find((candidate) => candidate === value);
    if (choice !== undefined) return choice;
    throw this.refusal(name, `must be one of ${choices.join(', ')}`);
  }

  /** A day as 2026-12-01. */
  day(name: string): string {
    const value = this.text(name);
    const moment = new Date(`${value}T00:00:00Z`);
    // 2026-02-30 would be read as the second of March.
    if (!Number.isNaN(moment.getTime()) && moment.toISOString().slice(0, 10) === value) return value;
    throw this.refusal(name, `must be a day such as 2026-12-01, not “${value}”`);
  }

  /** A quantity with its unit; in SI. */
  quantity(name: string, quantity: Quantity): number {
    return this.parse(name, this.raw(name), quantity);
  }

  quantities(name: string, quantity: Quantity, count: number): number[] {
    const texts = this.texts(name);
    if (texts.length !== count) throw this.refusal(name, `must have ${count} entries`);
    return texts.map((text, index) => this.parse(`${name}[${index}]`, text, quantity));
  }

  texts(name: string): string[] {
    const values = this.raw(name);
    if (Array.isArray(values)) {
      const texts = values.filter((value): value is string => typeof value === 'string');
      if (texts.length === values.length) return texts;
    }
    throw this.refusal(name, 'must be a list of texts');
  }

  /** Pairs such as a curve's points, each number as `parse` takes it. */
  pairs(name: string, first: Quantity, second: Quantity): [number, number][] {
    const values = this.raw(name);
    if (!Array.isArray(values) || values.length === 0) throw this.refusal(name, 'must be a list of pairs');
    return values.map((pair: unknown, index) => {
      const at = `${name}[${index}]`;
      if (!Array.isArray(pair) || pair.length !== 2) throw this.refusal(at, 'must be a pair');
      return [this.parse(at, pair[0], first), this.parse(at, pair[1], second)];
    });
  }

  one<Result>(name: string, read: (fields: Fields) => Result): Result {
    return Fields.read(this.file, this.path === '' ? name : `${this.path}.${name}`, this.raw(name), read);
  }

  list<Result>(name: string, read: (fields: Fields) => Result): Result[] {
    const values = this.raw(name);
    if (!Array.isArray(values)) throw this.refusal(name, 'must be a list');
    return values.map((value: unknown, index) =>
      Fields.read(this.file, `${this.path === '' ? name : `${this.path}.${name}`}[${index}]`, value, read),
    );
  }

  /** The names in an object whose entries are read one by one. */
  entries<Result>(name: string, read: (key: string, fields: Fields) => Result): Map<string, Result> {
    return this.one(
      name,
      (object) => new Map(object.names().map((key) => [key, object.one(key, (fields) => read(key, fields))])),
    );
  }

  /** What `read` gives, or undefined where the field is absent. */
  optional<Result>(name: string, read: () => Result): Result | undefined {
    return this.has(name) ? read() : undefined;
  }

  private parse(name: string, value: unknown, quantity: Quantity): number {
    if (typeof value === 'number' && quantity === 'ratio') return value;
    if (typeof value !== 'string') throw this.refusal(name, 'must be a text with its unit, such as 0.1 W');
    const parsed = parseQuantity(value, quantity);
    if (parsed.ok) return parsed.value;
    throw this.refusal(name, parsed.message);
  }
}
