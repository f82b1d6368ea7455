import * as fc from 'fast-check';
import type { Policy } from '../derating/policy-entry';
import type { Duty } from '../duty/duty';
import type { Ratings } from '../ratings/ratings';
import { twoThirds } from './thick-film-chip';

const magnitude = (from: number, to: number): fc.Arbitrary<number> =>
  fc
    .double({ min: Math.log10(from), max: Math.log10(to), noNaN: true })
    .map((exponent) => Number((10 ** exponent).toPrecision(3)));

const optional = <T>(arbitrary: fc.Arbitrary<T>): fc.Arbitrary<T | undefined> =>
  fc.option(arbitrary, { nil: undefined });

/** Policies of every kind: none, both readings, one that matches no wirewound part. */
export const arbitraryPolicy: fc.Arbitrary<Policy> = fc.constantFrom<Policy[]>(
  'none',
  { entries: [twoThirds] },
  {
    entries: [
      {
        match: {},
        powerRatio: 0.6,
        reading: 'parallel',
        voltageRatio: 0.8,
        reserve: 20,
        altitude: [
          [0, 1],
          [5000, 0.8],
        ],
      },
    ],
  },
  {
    entries: [
      {
        match: { technology: ['thick-film', 'thin-film'] },
        powerRatio: 0.5,
        reading: 'parallel',
        from: 60,
        zero: 120,
        voltageRatio: 0.7,
        maxTemperature: 110,
      },
    ],
  },
);

/** Duties over wide spans of every steady field; some ask for little, some for the impossible. */
export const arbitraryDuty: fc.Arbitrary<Duty> = fc
  .record({
    window: optional(fc.record({ lower: magnitude(0.01, 1e7), span: magnitude(1.001, 1e6) })),
    voltage: optional(magnitude(0.1, 2000)),
    current: optional(magnitude(1e-5, 10)),
    power: optional(magnitude(1e-3, 20)),
    ambient: optional(
      fc.record({
        min: fc.integer({ min: -65, max: 25 }),
        max: fc.integer({ min: 25, max: 160 }),
        terminal: optional(fc.integer({ min: 30, max: 150 })),
        altitude: optional(fc.integer({ min: 0, max: 7000 })),
      }),
    ),
    hours: optional(magnitude(10, 300_000)),
    rule: fc.constantFrom<Duty['deviation'][]>(undefined, 'worst-case', 'root-sum-square'),
    insulation: optional(magnitude(10, 1000)),
  })
  .map(({ window, voltage, current, power, ambient, hours, rule, insulation }) => {
    const load = {
      ...(voltage === undefined ? {} : { voltage: { min: 0, max: voltage } }),
      ...(current === undefined ? {} : { current: { min: 0, max: current } }),
      ...(power === undefined ? {} : { power: { max: power } }),
    };
    return {
      ...(window === undefined ? {} : { window: { lower: window.lower, upper: window.lower * window.span } }),
      ...(Object.keys(load).length === 0 ? {} : { load }),
      ...(ambient === undefined ? {} : { ambient }),
      ...(hours === undefined ? {} : { life: { hours } }),
      ...(rule === undefined ? {} : { deviation: rule }),
      ...(insulation === undefined ? {} : { insulation: { voltage: insulation } }),
    };
  });

/** Ratings with and without the data that checks need, including coefficients large enough to run away. */
export const arbitraryRatings: fc.Arbitrary<Ratings> = fc.record({
  technology: fc.constantFrom<Ratings['technology'][]>('thick-film', 'thin-film', 'wirewound', 'carbon-film'),
  resistance: fc.constant(1),
  tolerance: optional(fc.constantFrom(0.0001, 0.001, 0.01, 0.05, 0.2)),
  tcr: optional(fc.constantFrom(2e-6, 25e-6, 100e-6, 1500e-6)),
  ratedDissipation: optional(fc.constantFrom(0.05, 0.1, 0.25, 1, 5)),
  derating: optional(
    fc.constantFrom<NonNullable<Ratings['derating']>[]>(
      {
        axis: 'ambient',
        points: [
          [70, 1],
          [155, 0],
        ],
      },
      {
        axis: 'ambient',
        points: [
          [25, 1],
          [125, 0.4],
        ],
      },
      {
        axis: 'ambient',
        points: [
          [-55, 1],
          [70, 1],
          [100, 0.8],
          [170, 0],
        ],
      },
      {
        axis: 'terminal',
        points: [
          [110, 1],
          [170, 0],
        ],
      },
      { axis: 'ambient', points: [[70, 1]] },
    ),
  ),
  limitingElementVoltage: optional(fc.constantFrom(25, 75, 200, 1000)),
  category: optional(fc.constant({ min: -55, max: 155 })),
  maxElementTemperature: optional(fc.constantFrom(125, 155, 175)),
  thermalResistance: optional(fc.constantFrom(0, 30, 300)),
  voltageCoefficient: optional(fc.constantFrom(0, 10e-6, 100e-6)),
  drift: optional(
    fc.constantFrom(
      { fraction: 0.0025, hours: 1000, temperature: 125 },
      { fraction: 0.01, hours: 87600, temperature: 155 },
    ),
  ),
  solderShift: optional(fc.constantFrom(0.0005, 0.01)),
  insulationVoltage: optional(fc.constantFrom(100, 500)),
  link: fc.constant(undefined),
});
