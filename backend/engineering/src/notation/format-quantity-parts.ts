import { plainFigure } from './plain-figure';
import { printedPrefixes } from './prefixes';
import type { Quantity } from './quantity';
import { quantityDefinitions } from './quantity-definitions';
import { significantDecimal, type SignificantDecimal } from './significant-decimal';

export interface FormatOptions {
  /** Whole, 1 to 15; 9 by default, which keeps whatever was typed and drops rounding noise. */
  readonly significantDigits?: number;
}

/** A printed quantity; `figure` bears any sign, `unit` may be empty (ratios). */
export interface QuantityParts {
  readonly figure: string;
  readonly unit: string;
}

const hour = 3600;
const year = 8760 * hour;

/**
 * Prints a quantity with SI prefix, figure and unit apart: 4700 Ω gives `{ figure: '4.7', unit: 'kΩ' }`.
 * Times from one hour are printed in hours, or in years of 8760 h where three digits say it exactly.
 *
 * @param value SI unit of the quantity (temperature in °C, tolerance as a fraction)
 * @throws RangeError for NaN and infinities, which are no values to print
 */
export function formatQuantityParts(
  value: number,
  quantity: Quantity,
  options: FormatOptions = {},
): QuantityParts {
  if (!Number.isFinite(value)) throw new RangeError(`${quantity} to be printed must be finite, not ${value}`);
  const digits = options.significantDigits ?? 9;
  const printed = quantityDefinitions[quantity].printed;
  const decimal = significantDecimal(value, digits);
  switch (printed.kind) {
    case 'prefixed':
      return prefixed(decimal, printed.unit, printed.lowest, printed.highest);
    case 'fixed': {
      const figure = plainFigure(decimal, printed.exponent);
      return { figure: `${printed.sign ?? ''}${figure}`, unit: printed.unit };
    }
    case 'time':
      return timeParts(value, digits, decimal);
    case 'length':
      // Bodies are given in millimetres down to a tenth: 0.45 mm rather than 450 µm, 254 mm rather than 0.254 m.
      if (decimal.exponent >= -4 && decimal.exponent < 0)
        return { figure: plainFigure(decimal, -3), unit: 'mm' };
      return prefixed(decimal, 'm', -9, 0);
  }
}

function prefixed(decimal: SignificantDecimal, unit: string, lowest: number, highest: number): QuantityParts {
  const ownExponent = decimal.digits === '0' ? 0 : Math.floor(decimal.exponent / 3) * 3;
  const exponent = Math.min(Math.max(ownExponent, lowest), highest);
  return { figure: plainFigure(decimal, exponent), unit: `${printedPrefixes.get(exponent) ?? ''}${unit}` };
}

function timeParts(seconds: number, digits: number, decimal: SignificantDecimal): QuantityParts {
  const years = significantDecimal(seconds / year, digits);
  if (years.exponent >= 0 && years.digits.length <= 3 && Math.abs(seconds) >= hour) {
    const figure = plainFigure(years, 0);
    return { figure, unit: figure === '1' ? 'year' : 'years' };
  }
  if (Math.abs(seconds) >= hour)
    return { figure: plainFigure(significantDecimal(seconds / hour, digits), 0), unit: 'h' };
  return prefixed(decimal, 's', -15, 0);
}
