/** What may be bound to a statement; truth values as 0 and 1, moments as ISO 8601 text, sets as JSON text. */
export type BindValue = string | number | null;
export type BindValues = Readonly<Record<string, BindValue>>;

/** @throws RangeError for a number that SQLite would keep as NULL or infinity */
export function checkBindValues(values: BindValues): void {
  for (const [name, value] of Object.entries(values)) {
    if (typeof value === 'number' && !Number.isFinite(value)) {
      throw new RangeError(`$${name} is ${value}, which cannot be bound to a statement`);
    }
  }
}
