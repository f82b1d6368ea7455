import { parseInterval } from '@resistry/engineering/notation/parse-interval';
import { parseQuantity } from '@resistry/engineering/notation/parse-quantity';
import type { Interval } from '@resistry/engineering/duty/duty';
import { endsOfSingle } from '../../../components/interval-field';
import { type EntryName, entryDefinitions } from './duty-entry';

export type EntryErrors = Partial<Record<EntryName, string>>;

/** Reads typed entries into SI values and gathers what cannot be read, by entry. */
export class EntryReader {
  readonly errors: EntryErrors = {};

  constructor(private readonly entries: Partial<Record<EntryName, string>>) {}

  has(...names: readonly EntryName[]): boolean {
    return names.some((name) => this.text(name) !== '');
  }

  /** The SI value of an entry; undefined where it is empty or cannot be read. */
  value(name: EntryName): number | undefined {
    return this.parsed(name)?.value;
  }

  /** The value with the tolerance that was typed behind it (4k7 5 %), if any. */
  parsed(name: EntryName): { value: number; tolerance?: number } | undefined {
    const text = this.text(name);
    if (text === '') return undefined;
    const parsed = parseQuantity(text, entryDefinitions[name].quantity);
    if (parsed.ok) return parsed;
    this.errors[name] = parsed.message;
    return undefined;
  }

  interval(name: EntryName): Interval | undefined {
    const text = this.text(name);
    if (text === '') return undefined;
    const { quantity, interval = 'exact' } = entryDefinitions[name];
    const parsed = parseInterval(text, quantity);
    if (!parsed.ok) {
      this.errors[name] = parsed.message;
      return undefined;
    }
    return 'single' in parsed ? endsOfSingle(parsed.single, interval) : { min: parsed.min, max: parsed.max };
  }

  /** Says at an empty entry that others make no sense without it. */
  demand(name: EntryName, message: string): void {
    if (this.text(name) === '') this.errors[name] = message;
  }

  private text(name: EntryName): string {
    return this.entries[name]?.trim() ?? '';
  }
}
