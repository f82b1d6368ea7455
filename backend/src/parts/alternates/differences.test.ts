import type { Ratings } from '@resistry/engineering/ratings/ratings';
import { differencesBetween } from './differences';

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
