/** One reason why a duty cannot be held by any part: the fields that clash (JSON pointers into the duty) and words. */
export interface Conflict {
  pointers: readonly string[];
  message: string;
}

/** Thrown for a duty that is contradictory, empty or impossible; lists every conflict found. */
export class DutyConflict extends Error {
  constructor(readonly conflicts: readonly Conflict[]) {
    super(conflicts.map((conflict) => conflict.message).join(' '));
    this.name = 'DutyConflict';
  }
}
