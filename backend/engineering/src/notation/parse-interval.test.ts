import { parseInterval } from './parse-interval';
import type { Quantity } from './quantity';

describe('parseInterval', () => {
  it.each<[string, Quantity, number, number]>([
    ['0…24', 'voltage', 0, 24],
    ['0..24 V', 'voltage', 0, 24],
    ['0...24 V', 'voltage', 0, 24],
    ['-20 to 70 °C', 'temperature', -20, 70],
    ['\u221220…70', 'temperature', -20, 70],
    ['-40 - -20 °C', 'temperature', -40, -20],
    ['10-20', 'voltage', 10, 20],
    ['10\u201320 V', 'voltage', 10, 20],
    ['\u201320…70', 'temperature', -20, 70],
    ['1e-3…2e-3', 'current', 0.001, 0.002],
    ['±15', 'voltage', -15, 15],
    ['+/-15 V', 'voltage', -15, 15],
    ['4k7…5k1', 'resistance', 4700, 5100],
    // The unit in full counts for both ends …
    ['1…10 kΩ', 'resistance', 1000, 10_000],
    ['1 mA…10', 'current', 0.001, 0.01],
    ['-5…5 mA', 'current', -0.005, 0.005],
    ['10…15 years', 'time', 315_360_000, 473_040_000],
    // … unless only the bare number ascends.
    ['100…1 kΩ', 'resistance', 100, 1000],
    ['100…1k', 'resistance', 100, 1000],
    ['1k…10', 'resistance', 1000, 10_000],
    ['0…10k', 'resistance', 0, 10_000],
    ['10…22R', 'resistance', 10, 22],
    ['4,7…5,6 kΩ', 'resistance', 4700, 5600],
  ])('reads %j as %s', (text, quantity, min, max) => {
    const parsed = parseInterval(text, quantity);
    expect(parsed).toMatchObject({ ok: true, min, max });
    expect(parsed).not.toHaveProperty('nominal');
  });

  it.each<[string, Quantity, number, number, number]>([
    // 24 × 0.9 and 24 × 1.1; 4700 × 0.99 and 4700 × 1.01; 25 ∓ 5.
    ['24 V ± 10 %', 'voltage', 21.6, 26.4, 24],
    ['4k7 ±1%', 'resistance', 4653, 4747, 4700],
    ['24 ± 2 V', 'voltage', 22, 26, 24],
    ['24 V ± 2', 'voltage', 22, 26, 24],
    ['25 °C ± 5 K', 'temperature', 20, 30, 25],
    ['25 ± 5 °C', 'temperature', 20, 30, 25],
    ['-12 V ± 10 %', 'voltage', -13.2, -10.8, -12],
  ])('reads %j as %s around its nominal', (text, quantity, min, max, nominal) => {
    expect(parseInterval(text, quantity)).toMatchObject({ ok: true, min, max, nominal });
  });

  it.each<[string, Quantity, number]>([
    ['24', 'voltage', 24],
    ['-20 °C', 'temperature', -20],
    ['1e-3 A', 'current', 0.001],
    ['±1 %', 'tolerance', 0.01],
  ])('leaves the interval of the single value %j to the caller', (text, quantity, single) => {
    expect(parseInterval(text, quantity)).toMatchObject({ ok: true, single });
  });

  it('keeps the tolerance of a single resistance', () => {
    expect(parseInterval('4K7J', 'resistance')).toEqual({
      ok: true,
      single: 4700,
      tolerance: 0.05,
      text: '4.7 kΩ ±5 %',
    });
  });

  it('prints both ends', () => {
    expect(parseInterval('-20 to 70 °C', 'temperature')).toMatchObject({ text: '\u221220 °C…70 °C' });
  });

  it('refuses a prefix that may belong to one end or to both', () => {
    expect(parseInterval('1…10k', 'resistance')).toEqual({
      ok: false,
      message: '“1…10k” can mean 1 kΩ…10 kΩ or 1 Ω…10 kΩ. Write the unit at both ends.',
      readings: [1000, 1, 10_000],
    });
  });

  it.each(['1…10 Meg', '0.001…5L0', '0.001…5L'])('refuses %j likewise', (text) => {
    expect(parseInterval(text, 'resistance')).toHaveProperty('message', expect.stringContaining('can mean'));
  });

  it.each<[string, Quantity, RegExp]>([
    ['24..0', 'voltage', /“24\.\.0” runs backwards/],
    ['10 kΩ…1 kΩ', 'resistance', /runs backwards/],
    ['±15', 'resistance', /“±15” is impossible: its lower end is negative/],
    ['1 kΩ ± 200 %', 'resistance', /lower end is negative/],
    ['0…24 mA', 'voltage', /unit of a current/],
    ['0…', 'voltage', /“0…” is not a voltage/],
    ['…24', 'voltage', /“…24” is not a voltage/],
    ['0…10…20', 'voltage', /“10…20” is not a voltage/],
    ['', 'voltage', /^Enter a voltage/],
    ['4,700…5k', 'resistance', /can mean 4.7 Ω or 4.7 kΩ/],
    ['10k ± 1', 'resistance', /leaves open/],
    ['±-5', 'voltage', /negative spread/],
    ['0…1e999', 'voltage', /beyond the highest/],
    ['-300…20', 'temperature', /below the lowest/],
  ])('refuses %j as %s', (text, quantity, message) => {
    const parsed = parseInterval(text, quantity);
    expect(parsed.ok).toBe(false);
    expect(parsed).toHaveProperty('message', expect.stringMatching(message));
  });
});
