import { quoteInput } from '../notation/quote-input';
import { colours, type Colour } from './colours';
import { readBands } from './read-bands';
import { readChipMarking } from './read-chip-marking';
import { readLetterMarking } from './read-letter-marking';
import { readPositionMarking } from './read-position-marking';
import type { MarkingReading } from './reading';

export type ReadMarking =
  | { readonly ok: true; readonly readings: readonly MarkingReading[] }
  | { readonly ok: false; readonly message: string };

const otherNames: ReadonlyMap<string, Colour> = new Map([
  ['gray', 'grey'],
  ['purple', 'violet'],
]);

/**
 * Reads what stands on a component in every way that IEC 60062 allows: characters (`471`, `1R5`, `68X`, `4K7J`, `000`)
 * or colours from one end to the other (`yellow violet red gold`). Several readings come where several are possible:
 * `10R` is 10 Ω in letter code and 1.24 Ω as a position in E96; bands may be read from either end.
 *
 * @param text capitals or small letters; a small m is refused, since it may stand for milli or mega
 */
export function readMarking(text: string): ReadMarking {
  const words = text
    .trim()
    .toLowerCase()
    .split(/[\s,;/-]+/);
  const bands = words.map(colourNamed);
  if (text.length <= 64 && bands.some((colour) => colour !== null)) return readColours(text, words, bands);

  const code = text.trim();
  if (/[ml]/.test(code))
    return {
      ok: false,
      message: `${quoteInput(text)}: write M (mega) or L (milliohm) as it stands on the component.`,
    };
  const capitals = code.toUpperCase();
  const readings = distinct([
    readLetterMarking(capitals),
    readChipMarking(capitals),
    readPositionMarking(capitals),
  ]);
  if (readings.length > 0) return { ok: true, readings };
  return {
    ok: false,
    message: `${quoteInput(text)} is no marking of IEC 60062. Write characters such as 471, 4K7J or 68X, or colours from one end to the other.`,
  };
}

function readColours(text: string, words: readonly string[], bands: readonly (Colour | null)[]): ReadMarking {
  const known = bands.filter((colour) => colour !== null);
  const strange = words.find((_, place) => bands[place] === null);
  if (strange !== undefined)
    return { ok: false, message: `${quoteInput(text)}: ${quoteInput(strange)} is no colour of IEC 60062.` };
  const forwards = readBands(known);
  const backwards = readBands([...known].reverse());
  const readings = distinct([forwards, backwards].map((read) => (read.ok ? read.reading : null)));
  if (readings.length > 0) return { ok: true, readings };
  return { ok: false, message: `${quoteInput(text)}: ${forwards.ok ? '' : forwards.message}` };
}

function colourNamed(word: string): Colour | null {
  return otherNames.get(word) ?? colours.find((colour) => colour === word) ?? null;
}

/** Two codes that say the same (R47 in letters and on a chip) are one reading, of the first kind. */
function distinct(readings: readonly (MarkingReading | null)[]): MarkingReading[] {
  const kept: MarkingReading[] = [];
  for (const reading of readings) {
    if (reading === null) continue;
    const known = kept.some(
      ({ resistance, tolerance, tcr }) =>
        resistance === reading.resistance && tolerance === reading.tolerance && tcr === reading.tcr,
    );
    if (!known) kept.push(reading);
  }
  return kept;
}
