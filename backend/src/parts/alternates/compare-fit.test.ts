import { compareFit, type Fit } from './compare-fit';

const chip: Fit = {
  resistance: 4700,
  mounting: 'surface',
  landPattern: 'rect-chip 1608 nominal',
  bodyStyle: 'chip',
  sizeCode: '0603',
  metricCode: '1608M',
};
const unnamed = { ...chip, landPattern: undefined };

describe('the fit of a replacement', () => {
  it.each<[string, Fit, Fit]>([
    ['the same', chip, chip],
    [
      'the same land pattern, whatever the size is called',
      chip,
      { ...chip, sizeCode: 'CHIP3', metricCode: undefined },
    ],
    ['no land pattern, but the same body and size', unnamed, unnamed],
    ['the same nominal but for the noise of decimals', chip, { ...chip, resistance: 4700 * (1 + 1e-12) }],
  ])('lacks nothing with %s', (_name, own, other) => {
    expect(compareFit(own, other)).toEqual([]);
  });

  it('names resistance, mounting and land pattern where they differ', () => {
    const other: Fit = {
      ...chip,
      resistance: 4750,
      mounting: 'through-hole',
      landPattern: 'rect-chip 2012 nominal',
    };
    expect(compareFit(chip, other)).toEqual([
      { field: 'resistance', sense: 'different', own: '4.7 kΩ', alternate: '4.75 kΩ' },
      { field: 'mounting', sense: 'different', own: 'surface', alternate: 'through-hole' },
      {
        field: 'landPattern',
        sense: 'different',
        own: 'rect-chip 1608 nominal',
        alternate: 'rect-chip 2012 nominal',
      },
    ]);
  });

  it('is unknown where only one of the two names a land pattern', () => {
    const missing = { field: 'landPattern', sense: 'unknown', own: 'rect-chip 1608 nominal' };
    expect(compareFit(chip, unnamed)).toEqual([missing]);
    expect(compareFit(chip, { ...unnamed, sizeCode: '0805', metricCode: '2012M' })).toEqual([
      { field: 'size', sense: 'different', own: '0603 (1608M)', alternate: '0805 (2012M)' },
      missing,
    ]);
  });

  it('is the body where neither does', () => {
    expect(compareFit(unnamed, { ...unnamed, bodyStyle: 'melf' })).toEqual([
      { field: 'bodyStyle', sense: 'different', own: 'chip', alternate: 'melf' },
    ]);
  });

  it('is unknown where a mounting is not stated', () => {
    expect(compareFit(chip, { ...chip, mounting: undefined })).toEqual([
      { field: 'mounting', sense: 'unknown', own: 'surface' },
    ]);
  });
});
