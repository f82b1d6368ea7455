import { roundSignificant } from '../notation/round-significant';
import { significantDecimal } from '../notation/significant-decimal';
import { colourCode, type ColourMeaning } from './colour-code';
import { colours, type Colour } from './colours';

/** Numbers to be marked. */
export interface MarkedValue {
  /** Ω, above 0. */
  readonly resistance: number;
  /** Symmetrical, as a fraction. */
  readonly tolerance: number;
  /** 1/K, as a magnitude; only six bands show it. */
  readonly tcr?: number;
}

export type WrittenBands =
  { readonly ok: true; readonly bands: readonly Colour[] } | { readonly ok: false; readonly message: string };

/**
 * Writes a value in a given number of colour bands (IEC 60062); see readBands for what they mean.
 * Nothing is rounded: a value, tolerance or temperature coefficient that the bands cannot say is refused.
 * Three bands say ±20 % and nothing else; four or more cannot say it.
 */
export function writeBands(value: MarkedValue, bandCount: 3 | 4 | 5 | 6): WrittenBands {
  const { resistance, tolerance, tcr } = value;
  if (!Number.isFinite(resistance) || resistance <= 0) {
    return { ok: false, message: `A resistance of ${resistance} Ω cannot be written in bands.` };
  }
  const digitCount = bandCount >= 5 ? 3 : 2;
  const decimal = significantDecimal(resistance, 9);
  const multiplier = decimal.exponent - digitCount + 1;
  const multiplierColour = colourOf('multiplier', multiplier);
  if (decimal.digits.length > digitCount) {
    return {
      ok: false,
      message: `${resistance} Ω has more than the ${digitCount} digits of ${bandCount} bands.`,
    };
  }
  if (multiplierColour === null)
    return { ok: false, message: `${resistance} Ω is outside what ${bandCount} bands can say.` };

  const bands: Colour[] = [];
  for (const digit of decimal.digits.padEnd(digitCount, '0')) {
    const colour = colourOf('digit', Number(digit));
    if (colour !== null) bands.push(colour);
  }
  bands.push(multiplierColour);

  const toleranceColour = colourOf('tolerance', tolerance);
  if (bandCount === 3) {
    if (!sameNumber(tolerance, 0.2))
      return { ok: false, message: 'Three bands say a tolerance of ±20 % and no other.' };
    return { ok: true, bands };
  }
  if (toleranceColour === null) return { ok: false, message: `A tolerance of ${tolerance} has no colour.` };
  bands.push(toleranceColour);
  if (bandCount < 6) return { ok: true, bands };

  const tcrColour = tcr === undefined ? null : colourOf('tcr', tcr);
  if (tcrColour === null)
    return { ok: false, message: `A temperature coefficient of ${tcr ?? 'unknown size'} has no colour.` };
  return { ok: true, bands: [...bands, tcrColour] };
}

function colourOf(meaning: keyof ColourMeaning, wanted: number): Colour | null {
  return colours.find((colour) => sameNumber(colourCode[colour][meaning], wanted)) ?? null;
}

function sameNumber(listed: number | null, wanted: number): boolean {
  return (
    listed !== null && Number.isFinite(wanted) && roundSignificant(listed, 9) === roundSignificant(wanted, 9)
  );
}
