import fc from 'fast-check';
import { colours } from './colours';
import { markingsFor } from './markings-for';
import { readMarking } from './read-marking';

describe('readMarking', () => {
  // IEC 60062; 68X: position 68 of E96 is 499, X is 10⁻¹.
  it.each([
    ['68X', [{ kind: 'two-digit-and-letter', resistance: 49.9, tolerance: 0.01 }]],
    ['68x', [{ kind: 'two-digit-and-letter', resistance: 49.9, tolerance: 0.01 }]],
    ['R47', [{ kind: 'letter-code', resistance: 0.47 }]],
    [' 4K7J ', [{ kind: 'letter-code', resistance: 4700, tolerance: 0.05 }]],
    ['471', [{ kind: 'three-character', resistance: 470 }]],
    ['1073', [{ kind: 'four-character', resistance: 107_000 }]],
    ['000', [{ kind: 'link', resistance: 0 }]],
    ['0R0', [{ kind: 'link', resistance: 0 }]],
    // Position 10 is 124, R is 10⁻².
    [
      '10R',
      [
        { kind: 'letter-code', resistance: 10 },
        { kind: 'two-digit-and-letter', resistance: 1.24, tolerance: 0.01 },
      ],
    ],
    ['yellow violet red gold', [{ kind: 'colour-bands', resistance: 4700, tolerance: 0.05 }]],
    ['Yellow, Violet, Red, Gold', [{ kind: 'colour-bands', resistance: 4700, tolerance: 0.05 }]],
    // From the other end.
    ['gold red violet yellow', [{ kind: 'colour-bands', resistance: 4700, tolerance: 0.05 }]],
    ['black', [{ kind: 'link', resistance: 0 }]],
    // 820 × 10 at 1 %, or from the other end 110 × 10² at 0.01 %.
    [
      'gray red black brown brown',
      [
        { kind: 'colour-bands', resistance: 8200, tolerance: 0.01 },
        { kind: 'colour-bands', resistance: 11_000, tolerance: 0.0001 },
      ],
    ],
  ])('%j', (text, readings) => {
    expect(readMarking(text)).toEqual({ ok: true, readings });
  });

  it.each([
    ['', /no marking of IEC 60062/],
    ['hello', /write M \(mega\)/],
    ['4m7', /write M \(mega\)/],
    ['99Z', /“99Z” is no marking/],
    ['12345678', /no marking/],
    ['yellow violet pinkish', /“pinkish” is no colour/],
    ['black violet white white', /Band 1: black cannot be the first digit/],
    ['red red', /not by 2/],
    ["' OR 1=1", /no marking/],
    ['%', /no marking/],
  ])('refuses %j', (text, message) => {
    const read = readMarking(text);
    expect(read.ok).toBe(false);
    expect(read).toHaveProperty('message', expect.stringMatching(message));
  });

  it('reads every form that markingsFor gives back to its value', () => {
    const tolerances = [0.2, 0.1, 0.05, 0.02, 0.01, 0.005, 0.001, 0.0001];
    fc.assert(
      fc.property(
        fc.integer({ min: 10, max: 999 }),
        fc.integer({ min: -3, max: 7 }),
        fc.constantFrom(...tolerances),
        fc.constantFrom(undefined, 100e-6, 50e-6, 25e-6),
        (mantissa, exponent, tolerance, tcr) => {
          const resistance = Number(`${mantissa}e${exponent}`);
          const marked = markingsFor({ resistance, tolerance, tcr });
          if (!marked.ok) throw new Error(marked.message);
          for (const form of marked.forms) {
            const read = readMarking('bands' in form ? form.bands.join(' ') : form.text);
            const readings = read.ok ? read.readings.map((reading) => reading.resistance) : [];
            expect(readings).toContain(resistance);
          }
        },
      ),
    );
  });

  it('never throws', () => {
    fc.assert(
      fc.property(
        fc.oneof(
          fc.string({ maxLength: 6 }),
          fc.array(fc.constantFrom(...colours)).map((list) => list.join(' ')),
        ),
        (text) => {
          const read = readMarking(text);
          if (read.ok) expect(read.readings.length).toBeGreaterThan(0);
          else expect(read.message).not.toBe('');
        },
      ),
      { numRuns: 2000 },
    );
  });
});

describe('markingsFor', () => {
  it('gives all forms of a 1 % value', () => {
    expect(markingsFor({ resistance: 49.9, tolerance: 0.01, tcr: 50e-6 })).toEqual({
      ok: true,
      forms: [
        { kind: 'colour-bands', bands: ['yellow', 'white', 'white', 'gold', 'brown'] },
        { kind: 'colour-bands', bands: ['yellow', 'white', 'white', 'gold', 'brown', 'red'] },
        { kind: 'letter-code', text: '49R9F' },
        { kind: 'four-character', text: '49R9' },
        { kind: 'two-digit-and-letter', text: '68X' },
      ],
    });
  });

  it('gives neither bands nor the 1 % code without a tolerance', () => {
    expect(markingsFor({ resistance: 1000 })).toEqual({
      ok: true,
      forms: [
        { kind: 'letter-code', text: '1K0' },
        { kind: 'three-character', text: '102' },
        { kind: 'four-character', text: '1001' },
      ],
    });
  });

  it('gives the forms of a link', () => {
    const marked = markingsFor({ resistance: 0 });
    expect(marked.ok && marked.forms.map((form) => ('text' in form ? form.text : form.bands))).toEqual([
      ['black'],
      '0',
      '000',
      '0000',
    ]);
  });

  it.each([
    [{ resistance: -1 }, /resistance/],
    [{ resistance: NaN }, /resistance/],
    [{ resistance: 100, tolerance: 5 }, /tolerance/],
    [{ resistance: 100, tolerance: 0 }, /tolerance/],
    [{ resistance: 100, tcr: 50 }, /tcr/],
    [{ resistance: 123_456.7, tolerance: 0.03 }, /cannot be marked/],
  ])('refuses %j', (value, message) => {
    const marked = markingsFor(value);
    expect(marked.ok).toBe(false);
    expect(marked).toHaveProperty('message', expect.stringMatching(message));
  });
});
