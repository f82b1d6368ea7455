import type { Colour } from './colours';

/** What a colour means in each place; null where it has no meaning there. */
export interface ColourMeaning {
  readonly digit: number | null;
  /** Power of ten. */
  readonly multiplier: number | null;
  /** Symmetrical, as a fraction. */
  readonly tolerance: number | null;
  /** Temperature coefficient in 1/K, a limit of both signs. */
  readonly tcr: number | null;
}

/** The colour table of IEC 60062. No tolerance band at all stands for ±20 %. */
export const colourCode: Readonly<Record<Colour, ColourMeaning>> = {
  pink: { digit: null, multiplier: -3, tolerance: null, tcr: null },
  silver: { digit: null, multiplier: -2, tolerance: 0.1, tcr: null },
  gold: { digit: null, multiplier: -1, tolerance: 0.05, tcr: null },
  black: { digit: 0, multiplier: 0, tolerance: null, tcr: 250e-6 },
  brown: { digit: 1, multiplier: 1, tolerance: 0.01, tcr: 100e-6 },
  red: { digit: 2, multiplier: 2, tolerance: 0.02, tcr: 50e-6 },
  orange: { digit: 3, multiplier: 3, tolerance: 0.0005, tcr: 15e-6 },
  yellow: { digit: 4, multiplier: 4, tolerance: 0.0002, tcr: 25e-6 },
  green: { digit: 5, multiplier: 5, tolerance: 0.005, tcr: 20e-6 },
  blue: { digit: 6, multiplier: 6, tolerance: 0.0025, tcr: 10e-6 },
  violet: { digit: 7, multiplier: 7, tolerance: 0.001, tcr: 5e-6 },
  grey: { digit: 8, multiplier: 8, tolerance: 0.0001, tcr: 1e-6 },
  white: { digit: 9, multiplier: 9, tolerance: null, tcr: null },
};
