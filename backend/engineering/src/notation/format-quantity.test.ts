import { formatQuantity } from './format-quantity';
import { formatQuantityParts } from './format-quantity-parts';
import type { Quantity } from './quantity';

describe('formatQuantity', () => {
  it.each<[number, Quantity, string]>([
    [4700, 'resistance', '4.7 kΩ'],
    [4700.000000001, 'resistance', '4.7 kΩ'],
    [0.1 + 0.2, 'voltage', '300 mV'],
    [4990, 'resistance', '4.99 kΩ'],
    [999.9999999999, 'resistance', '1 kΩ'],
    [0, 'resistance', '0 Ω'],
    [-0, 'voltage', '0 V'],
    [1e-7, 'resistance', '0.1 µΩ'],
    [1e13, 'resistance', '10 TΩ'],
    [0.00025, 'time', '250 µs'],
    [90, 'time', '90 s'],
    [3600, 'time', '1 h'],
    [3_600_000, 'time', '1000 h'],
    [31_536_000, 'time', '1 year'],
    [315_360_000, 'time', '10 years'],
    [72_000_000, 'time', '20000 h'],
    [0.01, 'tolerance', '±1 %'],
    [0.0005, 'tolerance', '±0.05 %'],
    [0.00005, 'temperature-coefficient', '50 ppm/K'],
    [-0.00015, 'temperature-coefficient', '\u2212150 ppm/K'],
    [-20, 'temperature', '\u221220 °C'],
    [0.6, 'ratio', '0.6'],
    [0.0016, 'length', '1.6 mm'],
    [0.00045, 'length', '0.45 mm'],
    [0.254, 'length', '254 mm'],
    [0.00002, 'length', '20 µm'],
    [3048, 'altitude', '3048 m'],
    [2.62e-14, 'capacitance', '26.2 fF'],
  ])('prints %d as %s: %s', (value, quantity, expected) => {
    expect(formatQuantity(value, quantity)).toBe(expected);
  });

  it('rounds to the significant digits asked for, carrying into the next prefix', () => {
    expect(formatQuantity(123_456, 'resistance', { significantDigits: 3 })).toBe('123 kΩ');
    expect(formatQuantity(0.99996, 'power', { significantDigits: 4 })).toBe('1 W');
    expect(formatQuantity(999_960, 'resistance', { significantDigits: 4 })).toBe('1 MΩ');
  });

  it('gives figure and unit apart', () => {
    expect(formatQuantityParts(0.01, 'current')).toEqual({ figure: '10', unit: 'mA' });
    expect(formatQuantityParts(0.6, 'ratio')).toEqual({ figure: '0.6', unit: '' });
  });

  it.each([NaN, Infinity, -Infinity])('refuses %d', (value) => {
    expect(() => formatQuantity(value, 'voltage')).toThrow(RangeError);
  });

  it.each([0, 16, 2.5])('refuses %d significant digits', (significantDigits) => {
    expect(() => formatQuantity(1, 'voltage', { significantDigits })).toThrow(RangeError);
  });
});
