import type { Ratings } from '@resistry/engineering/ratings/ratings';
import { compareFunction } from './compare-function';
import { judgementOf } from './shortfall';

const chip: Ratings = {
  technology: 'thick-film',
  resistance: 4700,
  tolerance: 0.01,
  tcr: 1e-4,
  ratedDissipation: 0.1,
  derating: {
    axis: 'ambient',
    points: [
      [70, 1],
      [155, 0],
    ],
  },
  limitingElementVoltage: 75,
  category: { min: -55, max: 155 },
  features: ['automotive'],
};
const without = (field: keyof Ratings): Ratings =>
  Object.fromEntries(Object.entries(chip).filter(([name]) => name !== field)) as unknown as Ratings;
const judged = (own: Ratings, other: Ratings): string | undefined => {
  const comparison = compareFunction([{ ratings: own }], [{ ratings: other }]);
  return comparison && judgementOf(comparison.shortfalls);
};

describe('equal function', () => {
  it.each<[string, Partial<Ratings>, string]>([
    ['the same', {}, 'equal'],
    ['a tighter tolerance', { tolerance: 0.005 }, 'equal'],
    ['a wider tolerance', { tolerance: 0.02 }, 'lesser'],
    ['a lower coefficient', { tcr: 5e-5 }, 'equal'],
    ['a higher coefficient', { tcr: 2e-4 }, 'lesser'],
    ['more dissipation', { ratedDissipation: 0.125 }, 'equal'],
    ['less dissipation', { ratedDissipation: 0.0625 }, 'lesser'],
    ['more voltage', { limitingElementVoltage: 150 }, 'equal'],
    ['less voltage', { limitingElementVoltage: 50 }, 'lesser'],
    ['another feature', { features: ['automotive', 'fusible'] }, 'equal'],
    ['a lost feature', { features: [] }, 'lesser'],
    ['a wider category', { category: { min: -65, max: 175 } }, 'equal'],
    ['a category that is warmer at the cold end', { category: { min: -40, max: 155 } }, 'lesser'],
    ['a category that is colder at the hot end', { category: { min: -55, max: 125 } }, 'lesser'],
    // At 100 °C: 0.1 W · 55/85 = 64.7 mW against 0.125 W · 25/55 = 56.8 mW, although more is rated.
    [
      'more dissipation that ends at 125 °C',
      {
        ratedDissipation: 0.125,
        derating: {
          axis: 'ambient',
          points: [
            [70, 1],
            [125, 0],
          ],
        },
      },
      'lesser',
    ],
    // At 85 °C: 0.1 W · 70/85 = 82.4 mW against 0.2 W · 40/85 = 94 mW; at 70 °C 0.1 W against 0.2 W · 55/85 = 129 mW.
    [
      'twice the dissipation to 40 °C only',
      {
        ratedDissipation: 0.2,
        derating: {
          axis: 'ambient',
          points: [
            [40, 1],
            [155, 0],
          ],
        },
      },
      'equal',
    ],
    // Its curve stops at 0.5 without a fall to nothing, so beyond 110 °C nothing is rated.
    [
      'a curve that breaks off early',
      {
        ratedDissipation: 0.2,
        derating: {
          axis: 'ambient',
          points: [
            [70, 1],
            [110, 0.5],
          ],
        },
      },
      'lesser',
    ],
    [
      'a curve on another axis',
      {
        derating: {
          axis: 'terminal',
          points: [
            [105, 1],
            [155, 0],
          ],
        },
      },
      'equal',
    ],
  ])('judges a part with %s', (_name, change, expected) => {
    expect(judged(chip, { ...chip, ...change })).toBe(expected);
  });

  it.each([
    'tolerance',
    'tcr',
    'ratedDissipation',
    'derating',
    'limitingElementVoltage',
    'category',
  ] as const)('cannot be said where the replacement does not state its %s', (field) => {
    expect(judged(chip, without(field))).toBe('undecided');
    expect(judged(without(field), chip)).toBe('equal');
  });

  it('needs a mode for every mode, and tells which stands for the first', () => {
    const standard = { name: 'standard', ratings: chip };
    const power = { name: 'power', ratings: { ...chip, ratedDissipation: 0.15 } };
    expect(compareFunction([standard, power], [standard])).toEqual({
      mode: standard,
      shortfalls: [
        { field: 'ratedDissipation', mode: 'power', sense: 'worse', own: '150 mW', alternate: '100 mW' },
      ],
    });
    expect(compareFunction([standard], [power])).toEqual({ mode: power, shortfalls: [] });
    expect(compareFunction([power], [standard, power])).toEqual({ mode: power, shortfalls: [] });
    expect(compareFunction([standard, power], [standard, power])).toEqual({ mode: standard, shortfalls: [] });
    expect(compareFunction([standard], [])).toBeUndefined();
    expect(compareFunction([], [standard])).toBeUndefined();
  });

  it('takes a mode that lacks a rating before one that is known to bear less', () => {
    const small = { name: 'small', ratings: { ...chip, ratedDissipation: 0.05 } };
    const unsaid = { name: 'unsaid', ratings: without('derating') };
    expect(compareFunction([{ ratings: chip }], [small, unsaid])).toEqual({
      mode: unsaid,
      shortfalls: [{ field: 'derating', sense: 'unknown', own: 'stated' }],
    });
  });

  it('names where along the curves there is less', () => {
    const early: Ratings = {
      ...chip,
      ratedDissipation: 0.125,
      derating: {
        axis: 'ambient',
        points: [
          [70, 1],
          [125, 0],
        ],
      },
    };
    // The gap is widest at 125 °C: 0.1 W · 30/85 = 35.294 mW against nothing.
    expect(compareFunction([{ ratings: chip }], [{ ratings: early }])?.shortfalls).toEqual([
      { field: 'derating', sense: 'worse', own: '35.294 mW at 125 °C', alternate: '0 W at 125 °C' },
    ]);
  });

  it('holds links by their current and residual resistance', () => {
    const link = (ratedCurrent: number, residualResistance: number): Ratings => ({
      technology: 'thick-film',
      resistance: 0,
      link: { ratedCurrent, residualResistance },
    });
    expect(judged(link(1, 0.05), link(2, 0.02))).toBe('equal');
    expect(judged(link(1, 0.05), link(0.5, 0.02))).toBe('lesser');
    expect(judged(link(1, 0.05), link(2, 0.1))).toBe('lesser');
    expect(judged(link(1, 0.05), { technology: 'thick-film', resistance: 0 })).toBe('undecided');
  });
});
