import { writeChipMarking } from '@resistry/engineering/marking/write-chip-marking';
import { tcrLetters } from '@resistry/engineering/marking/tcr-letters';
import { formatRkm } from '@resistry/engineering/notation/format-rkm';
import { roundSignificant } from '@resistry/engineering/notation/round-significant';
import { toleranceLetter } from '@resistry/engineering/notation/tolerance-letter';
import type { OrderingCodeTemplate, ResistanceForm } from './ordering-code-template';

/** What an ordering code is made of. */
export interface OrderedPart {
  readonly familyCode: string;
  readonly sizeCode: string;
  /** Ω; 0 for a zero-ohm link. */
  readonly resistance: number;
  /** Fraction; null for a link. */
  readonly tolerance: number | null;
  /** 1/K; null for a link, or where the family states none. */
  readonly tcr: number | null;
  /** Left open in the manufacturer part number that the catalogue keeps. */
  readonly packagingCode?: string;
}

/** Thrown where a template has no way to write a part. */
export class OrderingCodeError extends Error {
  override readonly name = 'OrderingCodeError';
}

/**
 * The manufacturer part number of a part: its ordering code with the packaging left open.
 *
 * @throws OrderingCodeError where the template cannot write the part's tolerance, temperature coefficient or resistance
 */
export function manufacturerPartNumber(
  template: OrderingCodeTemplate,
  part: Omit<OrderedPart, 'packagingCode'>,
): string {
  return orderingCode(template, { ...part, packagingCode: undefined });
}

/**
 * The full ordering code of a part in a packaging; without a packaging, its manufacturer part number.
 *
 * @throws OrderingCodeError as manufacturerPartNumber
 */
export function orderingCode(template: OrderingCodeTemplate, part: OrderedPart): string {
  return template
    .map((piece) => {
      switch (piece.kind) {
        case 'text':
          return piece.text;
        case 'family':
          return part.familyCode;
        case 'size':
          return part.sizeCode;
        case 'tolerance':
          return toleranceText(part, piece.table);
        case 'tcr':
          return tcrText(part, piece.form);
        case 'resistance':
          return resistanceText(part.resistance, piece.form);
        case 'packaging':
          return part.packagingCode === undefined ? '' : `${piece.before}${part.packagingCode}${piece.after}`;
      }
    })
    .join('');
}

function toleranceText(part: OrderedPart, table: ReadonlyMap<number, string> | undefined): string {
  if (part.resistance === 0) return '0';
  if (part.tolerance === null) throw new OrderingCodeError('The ordering code needs a tolerance.');
  const text = table ? table.get(roundSignificant(part.tolerance, 9)) : toleranceLetter(part.tolerance);
  if (typeof text === 'string') return text;
  throw new OrderingCodeError(`The template has no text for a tolerance of ${part.tolerance * 100} %.`);
}

function tcrText(part: OrderedPart, form: 'letter' | 'ppm' | ReadonlyMap<number, string>): string {
  if (part.resistance === 0) return form === 'ppm' ? '000' : '0';
  if (part.tcr === null) throw new OrderingCodeError('The ordering code needs a temperature coefficient.');
  const wanted = roundSignificant(part.tcr, 9);
  const partsPerMillion = roundSignificant(part.tcr * 1e6, 9);
  const text =
    form === 'ppm'
      ? threeDigits(partsPerMillion)
      : form === 'letter'
        ? tcrLetters.find(({ tcr }) => roundSignificant(tcr, 9) === wanted)?.letter
        : form.get(wanted);
  if (text !== undefined) return text;
  throw new OrderingCodeError(
    `The template has no text for a temperature coefficient of ${partsPerMillion} ppm/K.`,
  );
}

/** 50 → 050, 0.2 → R20, 2.5 → 2R5. */
function threeDigits(partsPerMillion: number): string | undefined {
  if (Number.isInteger(partsPerMillion) && partsPerMillion < 1000) {
    return String(partsPerMillion).padStart(3, '0');
  }
  const text = String(partsPerMillion).replace(/^0/, '').replace('.', 'R').padEnd(3, '0');
  return text.length === 3 ? text : undefined;
}

function resistanceText(resistance: number, form: ResistanceForm): string {
  if (form === 'rkm') return formatRkm(resistance);
  const characters = form === 'three' ? 3 : 4;
  if (resistance === 0) return '0'.repeat(characters);
  const text = writeChipMarking(resistance, characters);
  if (text !== null) return text;
  throw new OrderingCodeError(`${resistance} Ω cannot be written in ${characters} characters.`);
}
