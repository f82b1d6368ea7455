import { typedPrefixes } from './prefixes';
import type { QuantityDefinition, UnitDefinition } from './quantity-definition';

/** How a unit was typed: not at all, as a prefix alone (4.7k), or in full (4.7 kΩ). */
export interface WrittenUnit {
  readonly form: 'none' | 'prefix' | 'unit';
  /** More than one where a bare number can stand for several units. */
  readonly scales: readonly Scale[];
}

/** SI value = figure × 10^exponent × factor + offset. */
export interface Scale {
  readonly exponent: number;
  readonly factor: number;
  readonly offset: number;
}

/**
 * Reads the unit behind a figure.
 *
 * @param text normalised text after the figure, possibly empty
 * @returns null where it is no unit of this quantity
 */
export function readUnit(text: string, definition: QuantityDefinition): WrittenUnit | null {
  const unit = text.replace(/ /g, '');
  if (unit === '') {
    return {
      form: 'none',
      scales: definition.bareExponents.map((exponent) => ({ exponent, factor: 1, offset: 0 })),
    };
  }
  for (const candidate of definition.units) {
    if (!spells(candidate, unit)) continue;
    // Meg and L are prefixes of the ohm that happen to be spelt otherwise.
    const form = candidate.exponent !== 0 && definition.prefixAlone ? 'prefix' : 'unit';
    return { form, scales: [scaleOf(candidate, 0)] };
  }
  // A spelling in full goes before a prefixed one: `min` is the minute, `cd` no centiday.
  const prefixExponent = typedPrefixes.get(unit.charAt(0));
  if (prefixExponent === undefined) return null;
  const rest = unit.slice(1);
  for (const candidate of definition.units) {
    if (candidate.prefixes && spells(candidate, rest))
      return { form: 'unit', scales: [scaleOf(candidate, prefixExponent)] };
  }
  // A capital K alone is the kelvin to everything but a resistance.
  if (rest === '' && definition.prefixAlone && (unit !== 'K' || definition.capitalKiloAlone)) {
    return { form: 'prefix', scales: [{ exponent: prefixExponent, factor: 1, offset: 0 }] };
  }
  return null;
}

function spells(unit: UnitDefinition, text: string): boolean {
  return unit.spellings.some((spelling) => spelling.replace(/ /g, '') === text);
}

function scaleOf(unit: UnitDefinition, prefixExponent: number): Scale {
  return { exponent: unit.exponent + prefixExponent, factor: unit.factor ?? 1, offset: unit.offset ?? 0 };
}
