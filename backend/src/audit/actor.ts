/** Who changed something. A signed-in `Person` is one. */
export interface Actor {
  /** Null where no person acted. */
  readonly id: number | null;
  readonly name: string;
}

/** The application itself: nightly work, what a command on the machine does. */
export const SYSTEM: Actor = { id: null, name: 'Resistry' };
