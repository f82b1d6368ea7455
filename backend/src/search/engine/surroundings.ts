import type { Policy } from '@resistry/engineering/derating/policy-entry';
import type { Duty } from '@resistry/engineering/duty/duty';
import type { Conditions } from '@resistry/engineering/operating/conditions';

/** What most of the conditions of a row follow from, beside its ratings; of equal ones one stands for all. */
export interface Surroundings {
  ambient: Duty['ambient'];
  life: Duty['life'];
  policy: Policy;
  /** Conditions of every row in each operating mode, by the number of the row, as an earlier search left them. */
  conditions: (Conditions[] | undefined)[];
}

const remembered = 4;

/**
 * The surroundings that were searched under last. Designers change windows and loads all day and their surroundings seldom,
 * and company policies even less, so what follows from these alone is worked out once.
 */
export class SurroundingsMemory {
  private readonly known = new Map<string, Surroundings>();

  of({ ambient, life }: Duty, policy: Policy): Surroundings {
    const key = JSON.stringify([ambient, life, policy]);
    const found = this.known.get(key) ?? { ambient, life, policy, conditions: [] };
    // The one used last stands last, and the first goes.
    this.known.delete(key);
    this.known.set(key, found);
    const [oldest] = this.known.keys();
    if (this.known.size > remembered && oldest !== undefined) this.known.delete(oldest);
    return found;
  }
}
