import type { DeratingCurve } from '../ratings/ratings';
import { thickFilmChip } from '../test-support/thick-film-chip';
import { milStd975, nasaEeeInst002, rlTr9211 } from './agency-policies';
import { altitudeFactor } from './altitude-factor';
import { faultOfCurve, fractionAt, kneeOf, zeroOf } from './curve';
import { entryFor } from './policy-entry';
import { allowedFraction, lineOf } from './policy-line';

const curveTo150: DeratingCurve = {
  axis: 'ambient',
  points: [
    [70, 1],
    [150, 0],
  ],
};

describe("the manufacturer's curve", () => {
  it('is 1 below its first point, linear between, 0 beyond its end', () => {
    expect(fractionAt(curveTo150, -55)).toBe(1);
    expect(fractionAt(curveTo150, 70)).toBe(1);
    expect(fractionAt(curveTo150, 85)).toBeCloseTo(65 / 80, 12); // arithmetic: (150 − 85) / (150 − 70)
    expect(fractionAt(curveTo150, 150)).toBe(0);
    expect(fractionAt(curveTo150, 150.001)).toBe(0);
  });

  it('keeps its last value at its end and has nothing beyond', () => {
    const cut: DeratingCurve = {
      axis: 'ambient',
      points: [
        [70, 1],
        [125, 0.5],
      ],
    };
    expect(fractionAt(cut, 125)).toBe(0.5);
    expect(fractionAt(cut, 125.0001)).toBe(0);
    expect(zeroOf(cut)).toBe(125);
  });

  it('finds the knee behind a flat stretch', () => {
    expect(
      kneeOf({
        axis: 'ambient',
        points: [
          [-55, 1],
          [70, 1],
          [155, 0],
        ],
      }),
    ).toBe(70);
  });

  it.each([
    [[], 'no point'],
    [
      [
        [70, 1],
        [70, 0],
      ],
      'rise in temperature',
    ],
    [[[70, 1.2]], 'outside 0 to 1'],
    [[[NaN, 1]], 'not finite'],
  ] as const)('names what is wrong with %j', (points, words) => {
    expect(faultOfCurve({ axis: 'ambient', points })).toContain(words);
  });
});

describe('derating policies', () => {
  const rm = entryFor(nasaEeeInst002.entries, { ...thickFilmChip, failureRateStyle: 'RM' })!;

  it('parallel reading: RM at 85 °C leaves 0.4125 (NASA EEE-INST-002, section R2, Table 4)', () => {
    expect(allowedFraction(curveTo150, rm, 85)).toBeCloseTo(0.4125, 12);
  });

  it('multiplied reading of the same ratio leaves 0.4875 (references.md: 0.6 × 65/80 with T3 = 150)', () => {
    expect(
      allowedFraction(
        curveTo150,
        { match: {}, powerRatio: 0.6, reading: 'multiplied', voltageRatio: 0.8 },
        85,
      ),
    ).toBeCloseTo(0.4875, 12);
  });

  it.each([
    // style, T1, T2, T3, factor: rows of NASA EEE-INST-002, section R2, Table 4, T2 printed as a whole degree
    ['RM', 70, 118, 150, 0.6],
    ['RLR-350', 70, 103, 125, 0.6],
    ['RNX', 125, 155, 175, 0.6],
    ['RZ', 70, 103, 125, 0.6],
    ['RWR', 25, 160, 250, 0.6],
  ])('%s: T2 = factor·(T3 − T1) + T1 to the whole degree', (style, t1, t2, t3, factor) => {
    const entry = nasaEeeInst002.entries.find((candidate) => candidate.match.style === style)!;
    expect([entry.from, entry.zero, entry.maxTemperature, entry.powerRatio]).toEqual([t1, t2, t3, factor]);
    expect(Math.abs(factor * (t3 - t1) + t1 - t2)).toBeLessThanOrEqual(0.5);
  });

  it('takes T2 of "others" by the formula from the manufacturer’s own curve', () => {
    const other = entryFor(nasaEeeInst002.entries, thickFilmChip)!;
    expect(other.powerRatio).toBe(0.5);
    expect(lineOf(other, curveTo150)).toEqual({ from: 70, zero: 110 }); // arithmetic: 0.5·(150 − 70) + 70
  });

  it('tells wirewound accurate parts apart by tolerance (RBR 0.1 %: 0.25, T2 130; 0.5 %: 0.35, 132; 1 %: 0.6, 137)', () => {
    const at = (tolerance: number): unknown => {
      const entry = entryFor(nasaEeeInst002.entries, {
        ...thickFilmChip,
        failureRateStyle: 'RBR',
        tolerance,
      });
      return [entry?.powerRatio, entry?.zero];
    };
    expect([at(0.001), at(0.005), at(0.01)]).toEqual([
      [0.25, 130],
      [0.35, 132],
      [0.6, 137],
    ]);
  });

  it('MIL-STD-975M, Appendix A 3.11: RLR 0.30, 70/94; RCR 70/110', () => {
    const row = (style: string): unknown => {
      const entry = milStd975.entries.find((candidate) => candidate.match.style === style);
      return [entry?.powerRatio, entry?.from, entry?.zero];
    };
    expect([row('RLR'), row('RCR'), row('RNC')]).toEqual([
      [0.3, 70, 94],
      [0.6, 70, 110],
      [0.6, 125, 155],
    ]);
  });

  it('RL-TR-92-11, Table 9-2, chip RM: power 50 %, voltage 75 %', () => {
    expect(rlTr9211.entries[0]).toMatchObject({ powerRatio: 0.5, voltageRatio: 0.75 });
  });

  it('is never above the manufacturer’s own curve and nothing past its maximum temperature', () => {
    const generous = {
      match: {},
      powerRatio: 1,
      reading: 'parallel',
      from: 100,
      zero: 200,
      voltageRatio: 1,
      maxTemperature: 120,
    } as const;
    expect(allowedFraction(curveTo150, generous, 110)).toBeCloseTo(0.5, 12); // the curve: 40/80
    expect(allowedFraction(curveTo150, generous, 120.1)).toBe(0);
  });
});

describe('altitude', () => {
  // Guidance beside MIL-R-39017: from 5000 ft, 10 % less per further 10 000 ft; 5000 m = 16 404 ft → 0.886
  const table = [
    [1524, 1],
    [4572, 0.9],
    [7620, 0.8],
  ] as const;
  const entry = {
    match: {},
    powerRatio: 1,
    reading: 'multiplied',
    voltageRatio: 1,
    altitude: table,
  } as const;

  it('interpolates the table: 5000 m leaves 0.886', () => {
    expect(altitudeFactor(entry, 5000)).toMatchObject({
      known: true,
      factor: expect.closeTo(0.886, 3) as number,
    });
  });

  it('is not known above the table or without one, and 1 at sea level or without a policy', () => {
    expect(altitudeFactor(entry, 9000).known).toBe(false);
    expect(altitudeFactor({ ...entry, altitude: undefined }, 3000).known).toBe(false);
    expect(altitudeFactor(entry, 0)).toEqual({ known: true, factor: 1 });
    expect(altitudeFactor(undefined, 9000)).toEqual({ known: true, factor: 1 });
  });
});
