import fc from 'fast-check';
import { colourCode } from './colour-code';
import { colours, type Colour } from './colours';
import { readBands } from './read-bands';
import { writeBands } from './write-bands';

const list = (text: string): Colour[] =>
  text.split(' ').map((word) => colours.find((colour) => colour === word) ?? 'pink');

describe('colour bands, IEC 60062', () => {
  // 3 bands = two digits, multiplier (20 %); 4 adds tolerance; 5 = three digits, multiplier, tolerance; 6 adds TCR.
  it.each([
    ['yellow violet red', 4700, 0.2, undefined, 3],
    ['yellow violet red gold', 4700, 0.05, undefined, 4],
    ['brown black pink silver', 0.01, 0.1, undefined, 4],
    ['red red silver gold', 0.22, 0.05, undefined, 4],
    ['yellow white white silver brown', 4.99, 0.01, undefined, 5],
    ['yellow white white brown brown', 4990, 0.01, undefined, 5],
    ['yellow violet black orange violet', 470_000, 0.001, undefined, 5],
    ['brown black black red grey grey', 10_000, 0.0001, 1e-6, 6],
    ['yellow white white brown brown red', 4990, 0.01, 50e-6, 6],
    ['white white white white green black', 999e9, 0.005, 250e-6, 6],
  ] as const)('%s is %d Ω', (text, resistance, tolerance, tcr, count) => {
    const bands = list(text);
    const expected = tcr === undefined ? { resistance, tolerance } : { resistance, tolerance, tcr };
    expect(readBands(bands)).toEqual({ ok: true, reading: { kind: 'colour-bands', ...expected } });
    expect(writeBands({ resistance, tolerance, tcr }, count)).toEqual({ ok: true, bands });
  });

  it('a single black band is a link', () => {
    expect(readBands(['black'])).toEqual({ ok: true, reading: { kind: 'link', resistance: 0 } });
  });

  it.each([
    ['gold violet red', 1, /gold is no digit/],
    ['black violet red', 1, /cannot be the first digit/],
    ['yellow silver red', 2, /silver is no digit/],
    ['yellow violet red white', 4, /white is no tolerance/],
    ['yellow violet red pink', 4, /pink is no tolerance/],
    ['yellow violet black red black', 5, /black is no tolerance/],
    ['yellow violet black red brown gold', 6, /gold is no temperature coefficient/],
    ['yellow violet', 0, /not by 2/],
    ['red', 0, /not by 1/],
    ['red red red red red red red', 0, /not by 7/],
  ])('%s: band %d has no meaning', (text, band, message) => {
    const read = readBands(list(text));
    expect(read).toMatchObject({ ok: false, band });
    expect(read).toHaveProperty('message', expect.stringMatching(message));
  });

  it.each([
    [{ resistance: 4990, tolerance: 0.05 }, 4, /more than the 2 digits/],
    [{ resistance: 4700, tolerance: 0.05 }, 3, /±20 % and no other/],
    [{ resistance: 4700, tolerance: 0.2 }, 4, /no colour/],
    [{ resistance: 4700, tolerance: 0.00005 }, 5, /no colour/],
    [{ resistance: 4700, tolerance: NaN }, 5, /no colour/],
    [{ resistance: 0.001, tolerance: 0.01 }, 5, /outside/],
    [{ resistance: 1e12, tolerance: 0.01 }, 5, /outside/],
    [{ resistance: 4700, tolerance: 0.01 }, 6, /unknown size has no colour/],
    [{ resistance: 4700, tolerance: 0.01, tcr: 75e-6 }, 6, /has no colour/],
    [{ resistance: 0, tolerance: 0.01 }, 5, /cannot be written/],
    [{ resistance: NaN, tolerance: 0.01 }, 5, /cannot be written/],
  ] as const)('%j cannot be said in %d bands', (value, count, message) => {
    const written = writeBands(value, count);
    expect(written.ok).toBe(false);
    expect(written).toHaveProperty('message', expect.stringMatching(message));
  });

  it('reads what it writes', () => {
    const tolerances = colours.flatMap((colour) => colourCode[colour].tolerance ?? []);
    const tcrs = colours.flatMap((colour) => colourCode[colour].tcr ?? []);
    fc.assert(
      fc.property(
        fc.integer({ min: 100, max: 999 }),
        fc.integer({ min: -3, max: 9 }),
        fc.constantFrom(...tolerances),
        fc.constantFrom(...tcrs),
        (mantissa, exponent, tolerance, tcr) => {
          const resistance = Number(`${mantissa}e${exponent}`);
          const written = writeBands({ resistance, tolerance, tcr }, 6);
          expect(written.ok && readBands(written.bands)).toEqual({
            ok: true,
            reading: { kind: 'colour-bands', resistance, tolerance, tcr },
          });
        },
      ),
    );
  });
});
