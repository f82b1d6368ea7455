import { chipSize } from './chip-size';
import type { Colour } from './colours';
import { writeBands } from './write-bands';
import { writeChipMarking } from './write-chip-marking';
import { writeLetterMarking } from './write-letter-marking';
import { writePositionMarking } from './write-position-marking';

/** What is known of the component. */
export interface MarkedBody {
  /** Ω; 0 with `isLink`. */
  readonly resistance: number;
  /** Fraction; not needed for links. */
  readonly tolerance?: number;
  /** 1/K. */
  readonly tcr?: number;
  /** `printed` bodies (cemented, housed, shunts) bear characters. */
  readonly style: 'chip' | 'axial' | 'melf' | 'printed';
  /** For chips: inch code 0603, metric code 1608M, or both 0603/1608M. */
  readonly size: string;
  readonly isLink: boolean;
}

export type BodyMarking =
  | { readonly kind: 'characters'; readonly text: string }
  | { readonly kind: 'bands'; readonly bands: readonly Colour[] }
  /** The body bears nothing. */
  | { readonly kind: 'none'; readonly reason: string }
  /** What the body bears cannot be told. */
  | { readonly kind: 'unknown'; readonly reason: string };

const largestUnmarkedLength = 0.00105;

/**
 * What a component bears by the usual practice of IEC 60062; its datasheet decides. Chips of inch size 0402 and smaller
 * bear nothing. Chips: three characters for two-digit values of 5 % and coarser, four for tighter ones; on 0603 a 1 % value
 * of E96 in the two-digit-and-letter code, of E24 in three characters. Leaded and MELF bodies: three bands for 20 %, four
 * for two-digit values of 5 % and coarser, else five; six where the temperature coefficient is below 100 ppm/K and has a colour.
 */
export function bodyMarking(body: MarkedBody): BodyMarking {
  const { resistance, tolerance, style, isLink } = body;
  if (style === 'chip') return chipMarking(body);
  if (isLink) return style === 'printed' ? characters('0') : { kind: 'bands', bands: ['black'] };
  if (tolerance === undefined) return unknown('the tolerance is missing');
  if (style !== 'printed') {
    const bands = bandsOf(resistance, tolerance, body.tcr);
    if (bands) return { kind: 'bands', bands };
  }
  return characters(writeLetterMarking(resistance, tolerance) ?? writeLetterMarking(resistance));
}

function chipMarking({ resistance, tolerance, size, isLink }: MarkedBody): BodyMarking {
  const chip = chipSize(size);
  if (!chip) return unknown(`“${size}” is no chip size code`);
  if (chip.length <= largestUnmarkedLength)
    return { kind: 'none', reason: 'Chips of inch size 0402 and smaller bear no marking.' };
  const narrow = chip.inch === '0603';
  if (isLink) return characters(narrow ? '0' : '000');
  if (tolerance === undefined) return unknown('the tolerance is missing');
  const letters = writeLetterMarking(resistance);
  const three = writeChipMarking(resistance, 3);
  const four = writeChipMarking(resistance, 4);
  if (isCoarse(tolerance)) return characters(three ?? four ?? letters);
  if (narrow && isOnePercent(tolerance))
    return characters(writePositionMarking(resistance) ?? three ?? four ?? letters);
  return characters(four ?? letters);
}

function bandsOf(resistance: number, tolerance: number, tcr: number | undefined): readonly Colour[] | null {
  const value = { resistance, tolerance, tcr };
  const counts: (3 | 4 | 5 | 6)[] = [];
  if (tcr !== undefined && tcr < 99.9e-6 && !isCoarse(tolerance)) counts.push(6);
  counts.push(...(isCoarse(tolerance) ? ([3, 4, 5] as const) : ([5, 4] as const)));
  for (const count of counts) {
    const written = writeBands(value, count);
    if (written.ok) return written.bands;
  }
  return null;
}

function isCoarse(tolerance: number): boolean {
  return tolerance > 0.0499;
}

function isOnePercent(tolerance: number): boolean {
  return Math.abs(tolerance - 0.01) < 1e-9;
}

function characters(text: string | null): BodyMarking {
  return text === null ? unknown('the value has no form of IEC 60062') : { kind: 'characters', text };
}

function unknown(reason: string): BodyMarking {
  return { kind: 'unknown', reason: `The marking cannot be told: ${reason}.` };
}
