import type { Ratings } from '@resistry/engineering/ratings/ratings';
import { differencesBetween } from './differences';
import { equalMode } from './equal-function';

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
};
const without = (field: keyof Ratings): Ratings =>
  Object.fromEntries(Object.entries(chip).filter(([name]) => name !== field)) as unknown as Ratings;
const equal = (own: Ratings, other: Ratings): boolean =>
  equalMode([{ ratings: own }], [{ ratings: other }]) !== undefined;

describe('equal function', () => {
  it.each<[string, Partial<Ratings>, boolean]>([
    ['the same', {}, true],
    ['a tighter tolerance', { tolerance: 0.005 }, true],
    ['a wider tolerance', { tolerance: 0.02 }, false],
    ['a lower coefficient', { tcr: 5e-5 }, true],
    ['a higher coefficient', { tcr: 2e-4 }, false],
    ['more dissipation', { ratedDissipation: 0.125 }, true],
    ['less dissipation', { ratedDissipation: 0.0625 }, false],
    ['more voltage', { limitingElementVoltage: 150 }, true],
    ['less voltage', { limitingElementVoltage: 50 }, false],
    ['a wider category', { category: { min: -65, max: 175 } }, true],
    ['a category that is warmer at the cold end', { category: { min: -40, max: 155 } }, false],
    ['a category that is colder at the hot end', { category: { min: -55, max: 125 } }, false],
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
      false,
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
      true,
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
      false,
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
      true,
    ],
  ])('has a part with %s', (_name, change, expected) => {
    expect(equal(chip, { ...chip, ...change })).toBe(expected);
  });

  it.each([
    'tolerance',
    'tcr',
    'ratedDissipation',
    'derating',
    'limitingElementVoltage',
    'category',
  ] as const)('needs what the part states: %s', (field) => {
    expect(equal(chip, without(field))).toBe(false);
    expect(equal(without(field), chip)).toBe(true);
  });

  it('needs a mode for every mode, and tells which stands for the first', () => {
    const standard = { name: 'standard', ratings: chip };
    const power = { name: 'power', ratings: { ...chip, ratedDissipation: 0.15 } };
    expect(equalMode([standard, power], [standard])).toBeUndefined();
    expect(equalMode([standard], [power])?.name).toBe('power');
    expect(equalMode([power], [standard, power])?.name).toBe('power');
    expect(equalMode([standard, power], [standard, power])?.name).toBe('standard');
    expect(equalMode([standard], [])).toBeUndefined();
  });

  it('holds links by their current and residual resistance', () => {
    const link = (ratedCurrent: number, residualResistance: number): Ratings => ({
      technology: 'thick-film',
      resistance: 0,
      link: { ratedCurrent, residualResistance },
    });
    expect(equal(link(1, 0.05), link(2, 0.02))).toBe(true);
    expect(equal(link(1, 0.05), link(0.5, 0.02))).toBe(false);
    expect(equal(link(1, 0.05), link(2, 0.1))).toBe(false);
    expect(equal(link(1, 0.05), { technology: 'thick-film', resistance: 0 })).toBe(false);
  });
});

describe('the differences', () => {
  const form = { bodyStyle: 'chip', termination: 'tin' };

  it('are none between equals', () => {
    expect(differencesBetween({ ratings: chip, form }, { ratings: { ...chip }, form: { ...form } })).toEqual(
      [],
    );
  });

  it('are named with their direction and both values', () => {
    const other: Ratings = {
      ...chip,
      technology: 'thin-film',
      tolerance: 0.001,
      limitingElementVoltage: 150,
      noiseIndex: -30,
      thermalResistance: 500,
      derating: {
        axis: 'terminal',
        points: [
          [105, 1],
          [155, 0],
        ],
      },
      features: ['fusible'],
      certificates: ['IEC 62368-1:2018 N-1'],
    };
    const own: Ratings = { ...chip, thermalResistance: 400, features: ['automotive'] };
    const otherForm = { bodyStyle: 'melf', termination: undefined };
    expect(differencesBetween({ ratings: own, form }, { ratings: other, form: otherForm })).toEqual([
      { field: 'tolerance', sense: 'better', own: '±1 %', alternate: '±0.1 %' },
      { field: 'limitingElementVoltage', sense: 'better', own: '75 V', alternate: '150 V' },
      { field: 'thermalResistance', sense: 'worse', own: '400 K/W', alternate: '500 K/W' },
      { field: 'noiseIndex', sense: 'unknown', own: undefined, alternate: '−30 dB' },
      { field: 'technology', sense: 'different', own: 'thick-film', alternate: 'thin-film' },
      {
        field: 'derating',
        sense: 'different',
        own: 'ambient: 100 % at 70 °C, 0 % at 155 °C',
        alternate: 'terminal: 100 % at 105 °C, 0 % at 155 °C',
      },
      { field: 'features', sense: 'worse', own: 'automotive' },
      { field: 'features', sense: 'different', alternate: 'fusible' },
      { field: 'certificates', sense: 'better', alternate: 'IEC 62368-1:2018 N-1' },
      { field: 'bodyStyle', sense: 'different', own: 'chip', alternate: 'melf' },
      { field: 'termination', sense: 'unknown', own: 'tin', alternate: undefined },
    ]);
  });
});
