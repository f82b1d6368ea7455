/** Multiplier letters of the two-digit-and-letter code of 1 % chips (IEC 60062), the one that is written first. */
export const multiplierLetters: readonly {
  readonly letters: readonly string[];
  readonly exponent: number;
}[] = [
  { letters: ['Z'], exponent: -3 },
  { letters: ['Y', 'R'], exponent: -2 },
  { letters: ['X', 'S'], exponent: -1 },
  { letters: ['A'], exponent: 0 },
  { letters: ['B', 'H'], exponent: 1 },
  { letters: ['C'], exponent: 2 },
  { letters: ['D'], exponent: 3 },
  { letters: ['E'], exponent: 4 },
  { letters: ['F'], exponent: 5 },
];
