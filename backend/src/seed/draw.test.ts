import { draw, drawWeighted, drawWhole } from './draw';

const keys = Array.from({ length: 4000 }, (_, place) => `BRIM0603F100${place}/price`);

describe('a draw', () => {
  it('is the same for the same key, and spreads evenly over keys that are alike', () => {
    expect(draw('BRIM0603F1004701/price')).toBe(draw('BRIM0603F1004701/price'));
    const tenths = new Array<number>(10).fill(0);
    for (const key of keys) tenths[Math.floor(draw(key) * 10)]! += 1;
    // 400 are expected in each; the standard deviation of a fair draw is √(4000 · 0.1 · 0.9) = 19, five of it are allowed.
    for (const tenth of tenths) expect(Math.abs(tenth - 400)).toBeLessThan(95);
  });

  it('gives whole numbers from end to end', () => {
    expect(new Set(keys.map((key) => drawWhole(key, 2, 4)))).toEqual(new Set([2, 3, 4]));
    expect(drawWhole('any', 3, 3)).toBe(3);
  });

  it('follows the weights', () => {
    const choices = [
      { name: 'often', weight: 3 },
      { name: 'seldom', weight: 1 },
      { name: 'never', weight: 0 },
    ];
    const drawn = keys.map((key) => drawWeighted(key, choices, ({ weight }) => weight).name);
    // Three of four: 3000 expected, standard deviation √(4000 · 0.75 · 0.25) = 27, five of it are allowed.
    expect(Math.abs(drawn.filter((name) => name === 'often').length - 3000)).toBeLessThan(135);
    expect(drawn).not.toContain('never');
    expect(() => drawWeighted('any', [], () => 1)).toThrow(RangeError);
  });
});
