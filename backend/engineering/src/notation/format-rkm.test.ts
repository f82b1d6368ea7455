import { formatRkm } from './format-rkm';
import { parseQuantity } from './parse-quantity';

describe('formatRkm', () => {
  // The letter stands for the point: L 10⁻³, R 1, K 10³, M 10⁶, G 10⁹ (IEC 60062).
  it.each([
    [0.0005, 'L50'],
    [0.005, '5L0'],
    [0.047, '47L'],
    [0.0475, '47L5'],
    [0.1, 'R10'],
    [0.47, 'R47'],
    [0.332, 'R332'],
    [1, '1R0'],
    [4.7, '4R7'],
    [10, '10R'],
    [470, '470R'],
    [4700, '4K7'],
    [47_300, '47K3'],
    [100_000, '100K'],
    [4.7e6, '4M7'],
    [1e9, '1G0'],
    [1e11, '100G'],
    [0, '0R0'],
    [999.9999999999, '1K0'],
  ])('writes %d Ω as %s', (resistance, expected) => {
    expect(formatRkm(resistance)).toBe(expected);
  });

  it('is read back exactly for every E192 and E24 value from 1 mΩ to 100 GΩ', () => {
    // Preferred values formed here from their definition (IEC 60063), with the one exception 9.20.
    const e192 = Array.from({ length: 192 }, (_, index) =>
      index === 185 ? 920 : Math.round(100 * 10 ** (index / 192)),
    );
    const e24 = [
      100, 110, 120, 130, 150, 160, 180, 200, 220, 240, 270, 300, 330, 360, 390, 430, 470, 510, 560, 620, 680,
      750, 820, 910,
    ];
    let count = 0;
    for (const mantissa of [...e192, ...e24]) {
      for (let exponent = -5; exponent <= 8; exponent += 1) {
        const resistance = Number(`${mantissa}e${exponent}`);
        const parsed = parseQuantity(formatRkm(resistance), 'resistance');
        expect(parsed).toMatchObject({ ok: true, value: resistance });
        count += 1;
      }
    }
    expect(count).toBe(216 * 14);
    expect(parseQuantity(formatRkm(1e11), 'resistance')).toMatchObject({ ok: true, value: 1e11 });
  });

  it.each([-1, NaN, Infinity])('refuses %d', (resistance) => {
    expect(() => formatRkm(resistance)).toThrow(RangeError);
  });
});
