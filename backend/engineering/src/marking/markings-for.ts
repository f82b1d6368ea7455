import type { Colour } from './colours';
import type { MarkingKind } from './reading';
import { writeBands } from './write-bands';
import { writeChipMarking } from './write-chip-marking';
import { writeLetterMarking } from './write-letter-marking';
import { writePositionMarking } from './write-position-marking';

/** A form in which a value can be marked. */
export type MarkingForm =
  | { readonly kind: 'colour-bands'; readonly bands: readonly Colour[] }
  | { readonly kind: Exclude<MarkingKind, 'colour-bands' | 'link'>; readonly text: string }
  | { readonly kind: 'link'; readonly text: string }
  | { readonly kind: 'link'; readonly bands: readonly Colour[] };

export type MarkingsFor =
  | { readonly ok: true; readonly forms: readonly MarkingForm[] }
  | { readonly ok: false; readonly message: string };

/**
 * All forms of IEC 60062 in which a value can be marked without losing a digit.
 *
 * @param value resistance Ω (0 for a link); tolerance as a fraction, without which no bands and no 1 % code can be given; tcr 1/K
 * @returns the forms, at least one, or why there is none
 */
export function markingsFor(value: { resistance: number; tolerance?: number; tcr?: number }): MarkingsFor {
  const { resistance, tolerance, tcr } = value;
  if (!Number.isFinite(resistance) || resistance < 0) {
    return { ok: false, message: `resistance must be 0 Ω or more and finite, not ${resistance}.` };
  }
  if (tolerance !== undefined && !(tolerance > 0 && tolerance < 1)) {
    return { ok: false, message: `tolerance must be a fraction above 0 and below 1, not ${tolerance}.` };
  }
  if (tcr !== undefined && !(tcr > 0 && tcr < 1)) {
    return { ok: false, message: `tcr must be above 0 and below 1 per kelvin, not ${tcr}.` };
  }
  if (resistance === 0) return { ok: true, forms: linkForms };

  const forms: MarkingForm[] = [];
  if (tolerance !== undefined) {
    for (const count of [3, 4, 5, 6] as const) {
      const written = writeBands({ resistance, tolerance, tcr }, count);
      if (written.ok) forms.push({ kind: 'colour-bands', bands: written.bands });
    }
  }
  const add = (kind: Exclude<MarkingKind, 'colour-bands' | 'link'>, text: string | null): void => {
    if (text !== null) forms.push({ kind, text });
  };
  add('letter-code', writeLetterMarking(resistance, tolerance));
  add('three-character', writeChipMarking(resistance, 3));
  add('four-character', writeChipMarking(resistance, 4));
  if (tolerance !== undefined && Math.abs(tolerance - 0.01) < 1e-9) {
    add('two-digit-and-letter', writePositionMarking(resistance));
  }
  if (forms.length === 0)
    return { ok: false, message: `${resistance} Ω with this tolerance cannot be marked in any form.` };
  return { ok: true, forms };
}

const linkForms: readonly MarkingForm[] = [
  { kind: 'link', bands: ['black'] },
  { kind: 'link', text: '0' },
  { kind: 'link', text: '000' },
  { kind: 'link', text: '0000' },
];
