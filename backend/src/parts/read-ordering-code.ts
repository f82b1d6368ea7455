import { readChipMarking } from '@resistry/engineering/marking/read-chip-marking';
import { readLetterMarking } from '@resistry/engineering/marking/read-letter-marking';
import { decimalValue } from '@resistry/engineering/notation/decimal-value';
import { toleranceLetters } from '@resistry/engineering/notation/tolerance-letters';
import { tcrLetters } from '@resistry/engineering/marking/tcr-letters';
import type { LetterTable, OrderingCodePiece, OrderingCodeTemplate } from './ordering-code-template';

/** The codes among which a reader chooses. */
export interface CodeVocabulary {
  readonly familyCode: string;
  readonly sizeCodes: readonly string[];
  readonly packagingCodes: readonly string[];
}

/** What an ordering code says; null where it says nothing of it, or nothing certain. */
export interface ReadCode {
  readonly sizeCode: string | null;
  /** Ω; 0 for a zero-ohm link. */
  readonly resistance: number;
  /** Fraction. */
  readonly tolerance: number | null;
  /** 1/K; null also for Z of IEC 60062, which stands for 20 and for 10 ppm/K. */
  readonly tcr: number | null;
  readonly packagingCode: string | null;
}

/**
 * Reads an ordering code, with or without packaging, by the template that made it.
 *
 * @returns null where the text is no code of this template
 */
export function readOrderingCode(
  template: OrderingCodeTemplate,
  text: string,
  vocabulary: CodeVocabulary,
): ReadCode | null {
  const pattern = template.map((piece) => patternOf(piece, vocabulary)).join('');
  const groups = new RegExp(`^${pattern}$`).exec(text)?.groups;
  if (!groups) return null;
  const form = template.find((piece) => piece.kind === 'resistance')?.form;
  const written = groups['resistance'] ?? '';
  const reading = form === 'rkm' ? readLetterMarking(written) : readChipMarking(written);
  if (reading === null) return null;
  const isLink = reading.resistance === 0;
  return {
    sizeCode: groups['size'] ?? null,
    resistance: reading.resistance,
    tolerance: isLink ? null : toleranceOf(template, groups['tolerance']),
    tcr: isLink ? null : tcrOf(template, groups['tcr']),
    packagingCode: groups['packaging'] ?? null,
  };
}

function patternOf(piece: OrderingCodePiece, vocabulary: CodeVocabulary): string {
  switch (piece.kind) {
    case 'text':
      return escaped(piece.text);
    case 'family':
      return escaped(vocabulary.familyCode);
    case 'size':
      return `(?<size>${oneOf(vocabulary.sizeCodes)})`;
    case 'tolerance':
      return `(?<tolerance>0|${oneOf(piece.table ? [...piece.table.values()] : [...toleranceLetters.keys()])})`;
    case 'tcr':
      if (piece.form === 'ppm') return '(?<tcr>\\d{3}|\\d{0,2}R\\d{1,2})';
      return `(?<tcr>0|${oneOf(piece.form === 'letter' ? tcrLetters.map(({ letter }) => letter) : [...piece.form.values()])})`;
    case 'resistance':
      if (piece.form === 'rkm') return '(?<resistance>\\d{0,4}[LRKMG]\\d{0,5})';
      return `(?<resistance>[0-9R]{${piece.form === 'three' ? 3 : 4}})`;
    case 'packaging':
      return `(?:${escaped(piece.before)}(?<packaging>${oneOf(vocabulary.packagingCodes)})${escaped(piece.after)})?`;
  }
}

function toleranceOf(template: OrderingCodeTemplate, text: string | undefined): number | null {
  if (text === undefined) return null;
  const table = template.find((piece) => piece.kind === 'tolerance')?.table;
  return (table ? keyOf(table, text) : toleranceLetters.get(text)) ?? null;
}

function tcrOf(template: OrderingCodeTemplate, text: string | undefined): number | null {
  const form = template.find((piece) => piece.kind === 'tcr')?.form;
  if (text === undefined || form === undefined) return null;
  if (form === 'ppm') return decimalValue(`0${text.replace('R', '.')}`, -6);
  if (form !== 'letter') return keyOf(form, text) ?? null;
  const [only, other] = tcrLetters.filter(({ letter }) => letter === text);
  return only && !other ? only.tcr : null;
}

function keyOf(table: LetterTable, text: string): number | undefined {
  return [...table].find(([, letters]) => letters === text)?.[0];
}

/** The longest first, so that none is taken for the beginning of another. */
function oneOf(texts: readonly string[]): string {
  return [...texts]
    .sort((one, other) => other.length - one.length)
    .map(escaped)
    .join('|');
}

function escaped(text: string): string {
  return text.replace(/[.*+?^${}()|[\]\\/-]/g, '\\$&');
}
