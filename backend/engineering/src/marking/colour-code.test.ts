import { toleranceLetter } from '../notation/tolerance-letter';
import { toleranceLetters } from '../notation/tolerance-letters';
import { colourCode } from './colour-code';
import { colours, type Colour } from './colours';
import { colourSrgb } from './colour-srgb';
import { tcrLetters } from './tcr-letters';

// Marking, IEC 60062: colour, digit, power of ten, tolerance in % with its letter, TCR in ppm/K with its letter.
type Row = [Colour, number | null, number, number | null, string | null, number | null, string | null];
const table: Row[] = [
  ['pink', null, -3, null, null, null, null],
  ['silver', null, -2, 10, 'K', null, null],
  ['gold', null, -1, 5, 'J', null, null],
  ['black', 0, 0, null, null, 250, 'U'],
  ['brown', 1, 1, 1, 'F', 100, 'S'],
  ['red', 2, 2, 2, 'G', 50, 'R'],
  ['orange', 3, 3, 0.05, 'W', 15, 'P'],
  ['yellow', 4, 4, 0.02, 'P', 25, 'Q'],
  ['green', 5, 5, 0.5, 'D', 20, 'Z'],
  ['blue', 6, 6, 0.25, 'C', 10, 'Z'],
  ['violet', 7, 7, 0.1, 'B', 5, 'M'],
  ['grey', 8, 8, 0.01, 'L', 1, 'K'],
  ['white', 9, 9, null, null, null, null],
];

describe('the colour table of IEC 60062', () => {
  it.each(table)('%s', (colour, digit, multiplier, tolerance, letter, tcr, tcrLetter) => {
    const meaning = colourCode[colour];
    expect(meaning.digit).toBe(digit);
    expect(meaning.multiplier).toBe(multiplier);
    if (tolerance === null || letter === null) expect(meaning.tolerance).toBeNull();
    else {
      expect(meaning.tolerance).toBeCloseTo(tolerance / 100, 12);
      expect(toleranceLetter(tolerance / 100)).toBe(letter);
      expect(toleranceLetters.get(letter)).toBe(meaning.tolerance);
    }
    if (tcr === null) expect(meaning.tcr).toBeNull();
    else {
      expect(meaning.tcr).toBeCloseTo(tcr / 1e6, 12);
      expect(tcrLetters).toContainEqual({ letter: tcrLetter, tcr: meaning.tcr });
    }
  });

  it('is complete, and every colour can be drawn in an sRGB of its own', () => {
    expect(table.map(([colour]) => colour)).toEqual([...colours]);
    expect(new Set(Object.values(colourSrgb)).size).toBe(colours.length);
    for (const srgb of Object.values(colourSrgb)) expect(srgb).toMatch(/^#[0-9a-f]{6}$/);
  });

  it('has the letters of all tolerances', () => {
    // IEC 60062: E 0.005, L 0.01, P 0.02, W 0.05, B 0.1, C 0.25, D 0.5, F 1, G 2, J 5, K 10, M 20 %.
    const percent = {
      E: 0.005,
      L: 0.01,
      P: 0.02,
      W: 0.05,
      B: 0.1,
      C: 0.25,
      D: 0.5,
      F: 1,
      G: 2,
      J: 5,
      K: 10,
      M: 20,
    };
    for (const [letter, tolerance] of Object.entries(percent))
      expect(toleranceLetter(tolerance / 100)).toBe(letter);
    expect(toleranceLetters.size).toBe(12);
    expect([0.03, 0, NaN, Infinity].map(toleranceLetter)).toEqual([null, null, null, null]);
  });
});
