/** The codes in which a resistor can bear its value. */
export type MarkingKind =
  'colour-bands' | 'letter-code' | 'three-character' | 'four-character' | 'two-digit-and-letter' | 'link';

/** One way to read a marking. */
export interface MarkingReading {
  readonly kind: MarkingKind;
  /** Ω; 0 for a zero-ohm link. */
  readonly resistance: number;
  /** Symmetrical, as a fraction; absent where the marking says nothing of it. */
  readonly tolerance?: number;
  /** 1/K; absent where the marking says nothing of it. */
  readonly tcr?: number;
}
