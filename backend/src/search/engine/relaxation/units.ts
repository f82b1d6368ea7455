/** Many units, left in the lists that they stand in: of a million a copy for every demand that is tried would be too much. */
export class Units {
  readonly size: number;

  constructor(private readonly lists: readonly (readonly number[])[]) {
    this.size = lists.reduce((sum, list) => sum + list.length, 0);
  }

  countWhere(holds: (unit: number) => boolean): number {
    let count = 0;
    for (const list of this.lists) for (const unit of list) if (holds(unit)) count += 1;
    return count;
  }

  /** At most about `count` of them, evenly spread. */
  sample(count: number): number[] {
    const step = Math.max(1, Math.ceil(this.size / count));
    return this.lists.flatMap((list) => list.filter((_, place) => place % step === 0));
  }

  toArray(): number[] {
    return this.lists.flat();
  }
}
