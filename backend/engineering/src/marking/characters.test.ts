import { seriesNames } from '../preferred-values/series';
import { valuesBetween } from '../preferred-values/values-between';
import { readChipMarking } from './read-chip-marking';
import { readLetterMarking } from './read-letter-marking';
import { readPositionMarking } from './read-position-marking';
import { writeChipMarking } from './write-chip-marking';
import { writeLetterMarking } from './write-letter-marking';
import { writePositionMarking } from './write-position-marking';

describe('letter code, IEC 60062', () => {
  it.each([
    ['R47', 0.47, undefined],
    ['4R7', 4.7, undefined],
    ['4K7', 4700, undefined],
    ['47K3', 47_300, undefined],
    ['4M7', 4.7e6, undefined],
    ['5L0', 0.005, undefined],
    ['1G0', 1e9, undefined],
    ['4K7J', 4700, 0.05],
    ['100KK', 100_000, 0.1],
    ['R10M', 0.1, 0.2],
    ['10RE', 10, 0.00005],
  ])('%s is %d Ω', (text, resistance, tolerance) => {
    const reading = tolerance === undefined ? { resistance } : { resistance, tolerance };
    expect(readLetterMarking(text)).toEqual({ kind: 'letter-code', ...reading });
    expect(writeLetterMarking(resistance, tolerance)).toBe(text);
  });

  it.each(['', 'R', 'K', '4K7X', '4K7JJ', '4k7', '4K7.', '47', '02R'])('%j is none', (text) => {
    expect(readLetterMarking(text)).toBeNull();
  });

  it('has no letter for a tolerance of 3 %, and no code for nothing', () => {
    expect(writeLetterMarking(4700, 0.03)).toBeNull();
    expect([0, -1, NaN, Infinity].map((resistance) => writeLetterMarking(resistance))).toEqual([
      null,
      null,
      null,
      null,
    ]);
  });
});

describe('three- and four-character codes, IEC 60062', () => {
  it.each([
    ['471', 470, 3],
    ['1R5', 1.5, 3],
    ['103', 10_000, 3],
    ['100', 10, 3],
    ['R47', 0.47, 3],
    ['R05', 0.05, 3],
    ['1073', 107_000, 4],
    ['4701', 4700, 4],
    ['10R0', 10, 4],
    ['4R99', 4.99, 4],
    ['R100', 0.1, 4],
    ['R005', 0.005, 4],
  ] as const)('%s is %d Ω', (text, resistance, characters) => {
    const kind = characters === 3 ? 'three-character' : 'four-character';
    expect(readChipMarking(text)).toEqual({ kind, resistance });
    expect(writeChipMarking(resistance, characters)).toBe(text);
  });

  it.each(['0', '00', '000', '0000', 'R000', '0R00'])('%s is a link', (text) => {
    expect(readChipMarking(text)).toEqual({ kind: 'link', resistance: 0 });
  });

  it.each(['', '12', '012', '12345', 'R', '1R', '4K7', '1RR', '00000'])('%j is none', (text) => {
    expect(readChipMarking(text)).toBeNull();
  });

  it.each([
    [4990, 3],
    [0.0475, 4],
    [0.005, 3],
    [1e12, 4],
    [0, 3],
    [NaN, 3],
  ] as const)('%d Ω has no code of %d characters', (resistance, characters) => {
    expect(writeChipMarking(resistance, characters)).toBeNull();
  });

  it('every value of every series that has a code is read back exactly, and from 1 Ω all have one', () => {
    for (const series of seriesNames) {
      for (const resistance of valuesBetween(0.001, 1e9, series)) {
        const code = writeChipMarking(resistance, 4);
        if (resistance >= 1) expect(code).not.toBeNull();
        if (code !== null) expect(readChipMarking(code)?.resistance).toBe(resistance);
      }
    }
  });
});

describe('two-digit-and-letter code, IEC 60062', () => {
  // Position in E96 (01 = 100 … 96 = 976), letters Z 10⁻³ … F 10⁵; position 68 = round(100 × 10^(67/96)) = 499.
  it.each([
    ['01A', 100],
    ['96A', 976],
    ['68X', 49.9],
    ['68Y', 4.99],
    ['68Z', 0.499],
    ['01B', 1000],
    ['01C', 10_000],
    ['01D', 100_000],
    ['01E', 1e6],
    ['96F', 97.6e6],
  ])('%s is %d Ω ±1 %%', (text, resistance) => {
    expect(readPositionMarking(text)).toEqual({ kind: 'two-digit-and-letter', resistance, tolerance: 0.01 });
    expect(writePositionMarking(resistance)).toBe(text);
  });

  it.each([
    ['68R', 4.99],
    ['68S', 49.9],
    ['68H', 4990],
  ])('%s uses a second letter of its multiplier', (text, resistance) => {
    expect(readPositionMarking(text)?.resistance).toBe(resistance);
  });

  it.each(['00A', '97A', '1A', '01G', '01', '01AA', ''])('%j is none', (text) => {
    expect(readPositionMarking(text)).toBeNull();
  });

  it('exists for E96 values from 0.1 Ω to 97.6 MΩ only', () => {
    for (const resistance of valuesBetween(0.1, 97.6e6, 'E96')) {
      expect(readPositionMarking(writePositionMarking(resistance) ?? '')?.resistance).toBe(resistance);
    }
    expect([4700, 0.0976, 1e8, 0, -1, NaN].map(writePositionMarking)).toEqual([
      null,
      null,
      null,
      null,
      null,
      null,
    ]);
  });
});
