import fc from 'fast-check';
import { formatQuantity } from './format-quantity';
import { parseQuantity } from './parse-quantity';
import { quantities, type Quantity } from './quantity';
import { quantityDefinitions } from './quantity-definitions';

function valueOf(text: string, quantity: Quantity): number {
  const parsed = parseQuantity(text, quantity);
  if (!parsed.ok) throw new Error(parsed.message);
  return parsed.value;
}

function refusalOf(text: string, quantity: Quantity): { message: string; readings?: readonly number[] } {
  const parsed = parseQuantity(text, quantity);
  if (parsed.ok) throw new Error(`${text} was read as ${parsed.value}`);
  return parsed;
}

describe('parseQuantity', () => {
  // Expected values follow from the meaning of prefix and letter; toBe: the double nearest to the written decimal.
  it.each<[string, Quantity, number]>([
    ['4700', 'resistance', 4700],
    ['4.7k', 'resistance', 4700],
    ['4.7K', 'resistance', 4700],
    ['4k7', 'resistance', 4700],
    ['4R7', 'resistance', 4.7],
    ['0R22', 'resistance', 0.22],
    ['R10', 'resistance', 0.1],
    ['K47', 'resistance', 470],
    ['5L0', 'resistance', 0.005],
    ['5L', 'resistance', 0.005],
    ['L50', 'resistance', 0.0005],
    ['220m', 'resistance', 0.22],
    ['4m7', 'resistance', 0.0047],
    ['1M', 'resistance', 1e6],
    ['1m', 'resistance', 0.001],
    ['1Meg', 'resistance', 1e6],
    ['4,7k', 'resistance', 4700],
    ['47R', 'resistance', 47],
    ['47 R', 'resistance', 47],
    ['4k7Ω', 'resistance', 4700],
    ['4k7 ohm', 'resistance', 4700],
    ['4.7 kΩ', 'resistance', 4700],
    ['4.7 k\u2126', 'resistance', 4700],
    ['4.7\u00a0kOhm', 'resistance', 4700],
    ['  4.7   k Ω ', 'resistance', 4700],
    ['1e3', 'resistance', 1000],
    ['4.7E3', 'resistance', 4700],
    ['4.7E+03', 'resistance', 4700],
    ['1E-3', 'resistance', 0.001],
    ['10 000', 'resistance', 10_000],
    ['1\u202f000\u202f000', 'resistance', 1e6],
    ['1,234,567', 'resistance', 1_234_567],
    ['4,700.5', 'resistance', 4700.5],
    ['4.700,5', 'resistance', 4700.5],
    ['0,470', 'resistance', 0.47],
    ['4.700', 'resistance', 4.7],
    ['.47', 'resistance', 0.47],
    ['0', 'resistance', 0],
    ['0R', 'resistance', 0],
    ['-0', 'resistance', 0],
    ['24', 'voltage', 24],
    ['3V3', 'voltage', 3.3],
    ['24 VDC', 'voltage', 24],
    ['\u221212 V', 'voltage', -12],
    ['\u201312 V', 'voltage', -12],
    ['1.5 kV', 'voltage', 1500],
    ['10 mA', 'current', 0.01],
    ['1/4 W', 'power', 0.25],
    ['0W25', 'power', 0.25],
    ['100 mW', 'power', 0.1],
    ['50 mJ', 'energy', 0.05],
    ['250 \u00b5s', 'time', 0.00025],
    ['250 \u03bcs', 'time', 0.00025],
    ['250us', 'time', 0.00025],
    ['5 min', 'time', 300],
    ['10 years', 'time', 315_360_000],
    ['10 a', 'time', 315_360_000],
    ['87600 h', 'time', 315_360_000],
    ['-20 °C', 'temperature', -20],
    ['70\u2103', 'temperature', 70],
    ['300 K', 'temperature', 26.85],
    ['77 °F', 'temperature', 25],
    ['15 K', 'temperature-difference', 15],
    ['50 ppm/K', 'temperature-coefficient', 0.00005],
    ['±50 ppm/°C', 'temperature-coefficient', 0.00005],
    ['50 ppm', 'temperature-coefficient', 0.00005],
    ['50', 'temperature-coefficient', 0.00005],
    ['0.00005', 'temperature-coefficient', 0.00005],
    ['-150 ppm/K', 'temperature-coefficient', -0.00015],
    ['−10 ppm/V', 'voltage-coefficient', -0.00001],
    ['±1 %', 'tolerance', 0.01],
    ['+/-1%', 'tolerance', 0.01],
    ['1%', 'tolerance', 0.01],
    ['0,1 %', 'tolerance', 0.001],
    ['5', 'tolerance', 0.05],
    ['J', 'tolerance', 0.05],
    ['-0.25 %', 'fraction', -0.0025],
    ['1:10', 'ratio', 0.1],
    ['60 %', 'ratio', 0.6],
    ['4n7', 'capacitance', 4.7e-9],
    ['4u7F', 'capacitance', 4.7e-6],
    ['10 nH', 'inductance', 1e-8],
    ['1.6 mm', 'length', 0.0016],
    ['1 in', 'length', 0.0254],
    ['10 mil', 'length', 0.000254],
    ['10000 ft', 'altitude', 3048],
    ['100 KHz', 'frequency', 1e5],
    ['180 K/W', 'thermal-resistance', 180],
    ['-20 dB', 'noise-index', -20],
  ])('reads %j as %s', (text, quantity, expected) => {
    expect(valueOf(text, quantity)).toBe(expected);
  });

  it('tells milli from mega', () => {
    expect(valueOf('10 mW', 'power')).toBe(0.01);
    expect(valueOf('1 MW', 'power')).toBe(1e6);
  });

  // Letters of IEC 60062.
  it.each([
    ['4K7J', 4700, 0.05, '4.7 kΩ ±5 %'],
    ['4k7J', 4700, 0.05, '4.7 kΩ ±5 %'],
    ['100KK', 100_000, 0.1, '100 kΩ ±10 %'],
    ['R47F', 0.47, 0.01, '470 mΩ ±1 %'],
    ['10MM', 10_000_000, 0.2, '10 MΩ ±20 %'],
    ['4k7 1%', 4700, 0.01, '4.7 kΩ ±1 %'],
    ['4.7 kΩ ±0.1 %', 4700, 0.001, '4.7 kΩ ±0.1 %'],
  ])('reads the tolerance in %j', (text, value, tolerance, printed) => {
    expect(parseQuantity(text, 'resistance')).toEqual({ ok: true, value, tolerance, text: printed });
    expect(parseQuantity(printed, 'resistance')).toEqual({ ok: true, value, tolerance, text: printed });
  });

  it.each<[string, Quantity, number[], string]>([
    ['4,700', 'resistance', [4.7, 4700], '“4,700” can mean 4.7 Ω or 4.7 kΩ. Write 4.7 or 4700 instead.'],
    ['4,700 V', 'voltage', [4.7, 4700], '“4,700 V” can mean 4.7 V or 4.7 kV. Write 4.7 or 4700 instead.'],
    ['4E7', 'resistance', [4.7, 4e7], '“4E7” can mean 4.7 Ω or 40 MΩ. Write 4R7 or 4e7 instead.'],
    ['0.1', 'tolerance', [0.001, 0.1], '“0.1” can mean ±0.1 % or ±10 %. Write the unit, for example ±1 %.'],
    ['3', 'length', [0.003, 3], '“3” can mean 3 mm or 3 m. Write the unit, for example 1.6 mm.'],
  ])('refuses the ambiguous %j as %s with all readings', (text, quantity, readings, message) => {
    expect(refusalOf(text, quantity)).toEqual({ ok: false, readings, message });
  });

  it.each<[string, Quantity, RegExp]>([
    ['', 'resistance', /^Enter a resistance/],
    ['\u00a0 ', 'voltage', /^Enter a voltage/],
    ['4k7 V', 'resistance', /“4k7 V” ends in a unit of a voltage/],
    ['10 mA', 'resistance', /unit of a current/],
    ['10kW', 'resistance', /unit of a power/],
    ['300 K', 'voltage', /unit of a temperature/],
    ['5 W', 'voltage', /unit of a power/],
    ['10 kΩ', 'voltage', /unit of a resistance/],
    ['-5', 'resistance', /“-5” is negative/],
    ['±15', 'voltage', /states a spread/],
    ['NaN', 'resistance', /“NaN” is not a resistance/],
    ['Infinity', 'resistance', /“Infinity” is not/],
    ['-∞', 'voltage', /is not a voltage/],
    ['1e999', 'resistance', /beyond the highest value accepted for a resistance, 10 TΩ/],
    ['1e-999', 'voltage', /smaller than the smallest/],
    ['1e99999999999999999999', 'current', /beyond the highest/],
    ['4.7.0', 'resistance', /more than one decimal sign/],
    ['4..7', 'resistance', /more than one decimal sign/],
    ['4,7.5', 'resistance', /mixes point and comma/],
    ['4 7', 'resistance', /“4 7” is not a resistance/],
    ['4k7k', 'resistance', /no unit of it/],
    ['4k7 kΩ', 'resistance', /no unit of it/],
    ['k', 'resistance', /is not a resistance/],
    ['10²', 'resistance', /no unit of it/],
    ['½', 'power', /is not a power/],
    ['1/0 W', 'power', /divides by zero/],
    ['100 GW', 'power', /beyond the highest/],
    ['1e14', 'resistance', /beyond the highest/],
    ['1 nΩ', 'resistance', /smaller than the smallest resistance accepted, 1 µΩ/],
    ['5 m', 'time', /no unit of it|unit of a length/],
    ['0 %', 'tolerance', /is zero/],
    ['40 %', 'tolerance', /beyond the highest value accepted for a tolerance, ±30 %/],
    ['-1 %', 'tolerance', /is negative/],
    ['-300 °C', 'temperature', /below the lowest value accepted for a temperature, −273.15 °C/],
    ['2000 ppm/K 5', 'temperature-coefficient', /no unit of it/],
    ['50000 ppm/K', 'temperature-coefficient', /beyond the highest/],
    ['4K7J 1 %', 'resistance', /two tolerances/],
    ['0x10', 'resistance', /is not a resistance|no unit of it/],
    ['<b>4k7</b>', 'resistance', /is not a resistance/],
    [`1${'0'.repeat(200)}`, 'resistance', /too long/],
  ])('refuses %j as %s', (text, quantity, message) => {
    const refusal = refusalOf(text, quantity);
    expect(refusal.message).toMatch(message);
    expect(refusal.readings).toBeUndefined();
  });

  it('reads the example that the messages give of every quantity', () => {
    for (const quantity of quantities) {
      const { example } = quantityDefinitions[quantity];
      expect(valueOf(example, quantity)).not.toBeNaN();
    }
  });

  it('reads what formatQuantity prints, to nine significant digits', () => {
    const decimal = fc.tuple(
      fc.integer({ min: 1, max: 999_999_999 }),
      fc.boolean(),
      fc.integer({ min: -14, max: 12 }),
    );
    for (const quantity of quantities) {
      const definition = quantityDefinitions[quantity];
      fc.assert(
        fc.property(decimal, ([digits, negative, exponent]) => {
          const value = Number(`${negative ? '-' : ''}${digits}e${exponent - 8}`);
          const size = Math.abs(value);
          fc.pre(value >= definition.lowest && value <= definition.highest && size >= definition.smallest);
          const printed = formatQuantity(value, quantity);
          const difference = Math.abs(valueOf(printed, quantity) - value);
          // Half a unit of the ninth digit, and the rounding of hours and years.
          expect(difference).toBeLessThanOrEqual(size * 5.1e-9);
        }),
        { numRuns: 300 },
      );
    }
  });

  it('never throws, whatever is typed', () => {
    const pieces = fc.array(
      fc.oneof(
        fc.constantFrom(
          '4',
          '7',
          '0',
          'k',
          'K',
          'M',
          'm',
          'R',
          'L',
          'E',
          'e',
          '.',
          ',',
          ' ',
          '-',
          '±',
          '%',
          'Ω',
          'V',
          '/',
          'ppm',
          '…',
          '9',
        ),
        fc.string({ maxLength: 3, unit: 'binary' }),
      ),
      { maxLength: 10 },
    );
    fc.assert(
      fc.property(pieces, fc.constantFrom(...quantities), (parts, quantity) => {
        const parsed = parseQuantity(parts.join(''), quantity);
        if (parsed.ok) {
          expect(Number.isFinite(parsed.value)).toBe(true);
          expect(parsed.value).toBeGreaterThanOrEqual(quantityDefinitions[quantity].lowest);
        } else expect(parsed.message).not.toBe('');
      }),
      { numRuns: 3000 },
    );
  });
});
