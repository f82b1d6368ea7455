import { decimalValue } from '../notation/decimal-value';
import { colourCode } from './colour-code';
import type { Colour } from './colours';
import type { MarkingReading } from './reading';

export type ReadBands =
  | { readonly ok: true; readonly reading: MarkingReading }
  /** `band` counts from 1; 0 where the number of bands is wrong. */
  | { readonly ok: false; readonly band: number; readonly message: string };

/**
 * Reads colour bands in the order given (IEC 60062): three bands are two digits and multiplier (±20 %), four add the
 * tolerance, five have three digits, six add the temperature coefficient. A single black band is a zero-ohm link.
 *
 * @returns the reading, or which band has no meaning in its place
 */
export function readBands(bands: readonly Colour[]): ReadBands {
  if (bands.length === 1 && bands[0] === 'black')
    return { ok: true, reading: { kind: 'link', resistance: 0 } };
  if (bands.length < 3 || bands.length > 6) {
    return {
      ok: false,
      band: 0,
      message: `A value is marked by three to six bands, not by ${bands.length}.`,
    };
  }
  const digitCount = bands.length >= 5 ? 3 : 2;
  let digits = '';
  for (const [place, colour] of bands.slice(0, digitCount).entries()) {
    const { digit } = colourCode[colour];
    if (digit === null) return meaningless(place, colour, 'is no digit');
    if (place === 0 && digit === 0) return meaningless(place, colour, 'cannot be the first digit');
    digits += String(digit);
  }
  const multiplierColour = bands[digitCount];
  const toleranceColour = bands[digitCount + 1];
  const tcrColour = bands[digitCount + 2];
  const multiplier = multiplierColour === undefined ? null : colourCode[multiplierColour].multiplier;
  if (multiplier === null) return meaningless(digitCount, multiplierColour, 'is no multiplier');
  const tolerance = toleranceColour === undefined ? 0.2 : colourCode[toleranceColour].tolerance;
  if (tolerance === null) return meaningless(digitCount + 1, toleranceColour, 'is no tolerance');
  const reading = { kind: 'colour-bands', resistance: decimalValue(digits, multiplier), tolerance } as const;
  if (tcrColour === undefined) return { ok: true, reading };
  const { tcr } = colourCode[tcrColour];
  if (tcr === null) return meaningless(digitCount + 2, tcrColour, 'is no temperature coefficient');
  return { ok: true, reading: { ...reading, tcr } };
}

function meaningless(place: number, colour: Colour | undefined, reason: string): ReadBands {
  return { ok: false, band: place + 1, message: `Band ${place + 1}: ${colour ?? 'nothing'} ${reason}.` };
}
