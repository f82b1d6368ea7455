/** What parseInterval answers. All values in the SI unit of the quantity. */
export type ParsedInterval = ParsedSingle | ParsedEnds | RefusedInterval;

/** One value was typed; what its interval is stays with the caller. */
export interface ParsedSingle {
  readonly ok: true;
  readonly single: number;
  readonly text: string;
  /** Fraction; only for a resistance typed with its tolerance letter. */
  readonly tolerance?: number;
}

export interface ParsedEnds {
  readonly ok: true;
  /** Never above `max`. */
  readonly min: number;
  readonly max: number;
  /** The centre, where one was typed: 4.7 kΩ ± 1 %. */
  readonly nominal?: number;
  readonly text: string;
}

export interface RefusedInterval {
  readonly ok: false;
  /** Names the input and says what to do. */
  readonly message: string;
  readonly readings?: readonly number[];
}
