import fc from 'fast-check';
import { isMember } from './is-member';
import { isSeriesName } from './is-series-name';
import { nearest } from './nearest';
import { neighbours } from './neighbours';
import { seriesNames } from './series';
import { seriesMantissas } from './series-mantissas';
import { seriesOf } from './series-of';
import { usualTolerance } from './usual-tolerance';
import { valuesBetween } from './values-between';

const resistances = fc.double({ min: 1e-5, max: 1e12, noNaN: true });
const anySeries = fc.constantFrom(...seriesNames);

describe('the series of IEC 60063', () => {
  // Preferred values, IEC 60063: E6 adds to E3, E12 to E6, E24 to E12.
  const e3 = [1.0, 2.2, 4.7];
  const e6 = [...e3, 1.5, 3.3, 6.8];
  const e12 = [...e6, 1.2, 1.8, 2.7, 3.9, 5.6, 8.2];
  const e24 = [...e12, 1.1, 1.3, 1.6, 2.0, 2.4, 3.0, 3.6, 4.3, 5.1, 6.2, 7.5, 9.1];
  const ascending = (values: number[]): number[] => [...values].sort((one, other) => one - other);

  it.each([
    ['E3', e3],
    ['E6', e6],
    ['E12', e12],
    ['E24', e24],
  ] as const)('%s is the printed table', (series, values) => {
    expect(valuesBetween(1, 9.9, series)).toEqual(ascending(values));
  });

  it('E48, E96 and E192 are round(10^(n/N), 2 decimals)', () => {
    for (const [series, steps] of [['E48', 48] as const, ['E96', 96] as const, ['E192', 192] as const]) {
      const values = Array.from({ length: steps }, (_, n) => Number((10 ** (n / steps)).toFixed(2)));
      // One exception: E192 n = 185 is 9.20, not 9.19.
      if (series === 'E192') values[185] = 9.2;
      expect(valuesBetween(1, 9.99, series)).toEqual(values);
      expect(new Set(values).size).toBe(steps);
    }
    expect(isMember(9.2, 'E192')).toBe(true);
    expect(isMember(9.19, 'E192')).toBe(false);
  });

  it('each coarser series is contained in the finer, but E24 is in neither E96 nor E192', () => {
    const contained = (inner: (typeof seriesNames)[number], outer: (typeof seriesNames)[number]): boolean =>
      seriesMantissas(inner).every((value) => seriesMantissas(outer).includes(value));
    for (const [inner, outer] of [
      ['E3', 'E6'],
      ['E6', 'E12'],
      ['E12', 'E24'],
      ['E48', 'E96'],
      ['E96', 'E192'],
    ] as const) {
      expect(contained(inner, outer)).toBe(true);
    }
    // Only 1.0 1.1 1.3 1.5 2.0 7.5 are common with E96.
    const common = seriesMantissas('E24').filter((value) => seriesMantissas('E96').includes(value));
    expect(common).toEqual([100, 110, 130, 150, 200, 750]);
    expect(contained('E24', 'E192')).toBe(false);
  });

  it('has the usual tolerances', () => {
    expect(seriesNames.map(usualTolerance)).toEqual([null, 0.2, 0.1, 0.05, 0.02, 0.01, 0.005]);
  });

  it('knows its names', () => {
    expect(isSeriesName('E96')).toBe(true);
    expect(['e96', 'E97', '', 'constructor'].some(isSeriesName)).toBe(false);
  });
});

describe('membership and neighbours', () => {
  it('lists the series of a value', () => {
    expect(seriesOf(5100)).toEqual(['E24']);
    // 10^(129/192) = 4.6978, rounded 4.70: one of the E24 values that E192 has by chance.
    expect(seriesOf(4700)).toEqual(['E3', 'E6', 'E12', 'E24', 'E192']);
    expect(seriesOf(4.99e-3)).toEqual(['E96', 'E192']);
    expect(seriesOf(1e5)).toEqual([...seriesNames]);
    expect(seriesOf(4.71)).toEqual([]);
  });

  it('forgives rounding noise, not a wrong digit', () => {
    expect(isMember(4700.000000001, 'E24')).toBe(true);
    expect(isMember(3 * 1.1, 'E24')).toBe(true);
    expect(isMember(999.9999999999, 'E24')).toBe(true);
    expect(isMember(4700.001, 'E24')).toBe(false);
  });

  it('goes over the decade at both ends', () => {
    expect(neighbours(1000, 'E24')).toEqual({ below: 910, member: 1000, above: 1100 });
    expect(neighbours(950, 'E24')).toEqual({ below: 910, member: null, above: 1000 });
    expect(neighbours(988, 'E192')).toEqual({ below: 976, member: 988, above: 1000 });
  });

  it('finds the nearest by ratio', () => {
    // √(2.2 × 4.7) = 3.2156 parts the two by ratio, (2.2 + 4.7)/2 = 3.45 by difference.
    expect(nearest(3.21, 'E3')).toBe(2.2);
    expect(nearest(3.22, 'E3')).toBe(4.7);
    expect(nearest(4711, 'E96')).toBe(4750);
    expect(nearest(4700, 'E24')).toBe(4700);
    expect(nearest(960, 'E24')).toBe(1000);
  });

  it('no other value of the series is nearer', () => {
    fc.assert(
      fc.property(resistances, anySeries, (value, series) => {
        const found = nearest(value, series);
        const distance = (candidate: number): number => Math.abs(Math.log(candidate / value));
        const others = valuesBetween(Math.max(value / 20, 1e-6), Math.min(value * 20, 1e13), series);
        expect(others).toContain(found);
        for (const other of others) expect(distance(found)).toBeLessThanOrEqual(distance(other) + 1e-9);
      }),
    );
  });

  it.each([0, -4700, NaN, Infinity])('refuses %d', (value) => {
    expect(() => isMember(value, 'E24')).toThrow(RangeError);
    expect(() => nearest(value, 'E24')).toThrow(RangeError);
    expect(() => neighbours(value, 'E24')).toThrow(RangeError);
    expect(() => seriesOf(value)).toThrow(RangeError);
  });
});

describe('valuesBetween', () => {
  it('includes both ends, exactly', () => {
    expect(valuesBetween(4300, 5600, 'E24')).toEqual([4300, 4700, 5100, 5600]);
    expect(valuesBetween(3 * 1.1, 4.7, 'E12')).toEqual([3.3, 3.9, 4.7]);
    expect(valuesBetween(0.91, 1.1, 'E24')).toEqual([0.91, 1, 1.1]);
    expect(valuesBetween(4.8, 9.9, 'E3')).toEqual([]);
    expect(valuesBetween(4.7, 4.7, 'E3')).toEqual([4.7]);
  });

  it('counts the whole span: N a decade and the last end', () => {
    // 14 decades from 1 mΩ to 100 GΩ.
    expect(valuesBetween(0.001, 1e11, 'E192')).toHaveLength(14 * 192 + 1);
  });

  it('gives ascending decimals of at most three digits inside the span, all of them members', () => {
    fc.assert(
      fc.property(
        resistances,
        fc.double({ min: 1, max: 10, noNaN: true }),
        anySeries,
        (from, factor, series) => {
          const values = valuesBetween(from, from * factor, series);
          values.forEach((value, place) => {
            expect(value).toBe(Number(value.toPrecision(3)));
            expect(isMember(value, series)).toBe(true);
            expect(value).toBeGreaterThanOrEqual(from * (1 - 1e-8));
            expect(value).toBeLessThanOrEqual(from * factor * (1 + 1e-8));
            if (place > 0) expect(value).toBeGreaterThan(values[place - 1] ?? Infinity);
          });
          // Nothing missing: the neighbours of the ends lie outside.
          const first = values[0];
          const last = values[values.length - 1];
          if (first !== undefined) expect(neighbours(first, series).below).toBeLessThan(from);
          if (last !== undefined) expect(neighbours(last, series).above).toBeGreaterThan(from * factor);
        },
      ),
    );
  });

  it.each([
    [0, 10, /from must be a resistance/],
    [-1, 10, /from must be/],
    [NaN, 10, /from must be/],
    [1, Infinity, /to must be/],
    [1, 1e300, /to must be/],
    [1e-300, 1, /from must be/],
    [10, 1, /from \(10\) must not be above to \(1\)/],
  ])('refuses %d to %d', (from, to, message) => {
    expect(() => valuesBetween(from, to, 'E96')).toThrow(message);
  });
});
