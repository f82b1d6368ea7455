interface Counted {
  parts: number;
}

interface Group<Value, Row> {
  value: Value;
  parts: number;
  first: Row;
  rows: Row[];
}

/** Rows put together by a value, with the sum of their parts; in the order in which the values first appear. */
export class Tally<Value, Row extends Counted> {
  private constructor(private readonly groups: ReadonlyMap<Value, Group<Value, Row>>) {}

  /** @param valueOf null leaves the row out */
  static of<Value, Row extends Counted>(
    rows: readonly Row[],
    valueOf: (row: Row) => Value | null,
  ): Tally<Value, Row> {
    const groups = new Map<Value, Group<Value, Row>>();
    for (const row of rows) {
      const value = valueOf(row);
      if (value === null) continue;
      const group = groups.get(value);
      if (group) {
        group.parts += row.parts;
        group.rows.push(row);
      } else {
        groups.set(value, { value, parts: row.parts, first: row, rows: [row] });
      }
    }
    return new Tally(groups);
  }

  values(): { value: Value; parts: number }[] {
    return this.entries(({ value, parts }) => ({ value, parts }));
  }

  entries<Entry>(present: (group: Group<Value, Row>) => Entry): Entry[] {
    return [...this.groups.values()].map(present);
  }
}
