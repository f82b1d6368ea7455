import { decimalValue } from '@resistry/engineering/notation/decimal-value';

/** How a resistance is written: letter code of IEC 60062 (4K7), or digits with the number of noughts (472, 4701). */
export type ResistanceForm = 'rkm' | 'three' | 'four';

/** Letters of a family's own for a tolerance or a temperature coefficient: fraction or 1/K → text. */
export type LetterTable = ReadonlyMap<number, string>;

export type OrderingCodePiece =
  | { readonly kind: 'text'; readonly text: string }
  | { readonly kind: 'family' }
  | { readonly kind: 'size' }
  | { readonly kind: 'tolerance'; readonly table?: LetterTable }
  | { readonly kind: 'tcr'; readonly form: 'letter' | 'ppm' | LetterTable }
  | { readonly kind: 'resistance'; readonly form: ResistanceForm }
  /** Texts around the packaging code that go when it is left open. */
  | { readonly kind: 'packaging'; readonly before: string; readonly after: string };

export type OrderingCodeTemplate = readonly OrderingCodePiece[];

export type ParsedTemplate =
  | { readonly ok: true; readonly template: OrderingCodeTemplate }
  /** Names the piece and says what would do. */
  | { readonly ok: false; readonly message: string };

const token = /\{([^{}]*)\}|\[([^[\]]*)\]|([A-Za-z0-9./_-]+)/y;
const packagingGroup = /^([A-Za-z0-9./_-]*)\{packaging\}([A-Za-z0-9./_-]*)$/;
const known =
  '{family} {size} {tolerance} {tcr} {tcr:ppm} {resistance:rkm} {resistance:three} {resistance:four} {packaging}';

/**
 * Reads the template from which a family's ordering codes are made. Text stands for itself (letters, digits and - . / _);
 * pieces stand in braces:
 *
 * - `{family}` the family's code, `{size}` the size's code;
 * - `{tolerance}` its letter of IEC 60062, or `{tolerance:1=F,5=J}`: the family's own texts, by per cent;
 * - `{tcr}` its letter of IEC 60062, `{tcr:ppm}` ppm/K in three digits (050) or with a point (R20), or
 *   `{tcr:100=S,200=T}`: the family's own texts, by ppm/K;
 * - `{resistance:rkm}` 4K7, `{resistance:three}` 472, `{resistance:four}` 4701;
 * - `{packaging}` the packaging's code, nothing while it is left open. Brackets around it, with text, go with it: `[-{packaging}]`.
 *
 * A zero-ohm link has noughts for its tolerance, temperature coefficient and resistance.
 *
 * @example parseOrderingCodeTemplate('{family}{size}{tolerance}{resistance:four}[-{packaging}]')
 */
export function parseOrderingCodeTemplate(text: string): ParsedTemplate {
  const template: OrderingCodePiece[] = [];
  token.lastIndex = 0;
  while (token.lastIndex < text.length) {
    const at = token.lastIndex;
    const [, piece, group, literal] = token.exec(text) ?? [];
    if (literal !== undefined) template.push({ kind: 'text', text: literal });
    else if (piece !== undefined) {
      const read = readPiece(piece);
      if (typeof read === 'string') return { ok: false, message: read };
      template.push(read);
    } else if (group !== undefined) {
      const [, before, after] = packagingGroup.exec(group) ?? [];
      if (before === undefined || after === undefined)
        return { ok: false, message: `[${group}] must hold {packaging}, with nothing but text around it.` };
      template.push({ kind: 'packaging', before, after });
    } else return { ok: false, message: `The template cannot be read from “${text.slice(at)}” on.` };
  }
  for (const kind of ['family', 'size', 'tolerance', 'tcr', 'resistance', 'packaging'] as const) {
    const count = template.filter((piece) => piece.kind === kind).length;
    if (count > 1) return { ok: false, message: `{${kind}} stands ${count} times; once is enough.` };
    if (count === 0 && kind === 'resistance')
      return { ok: false, message: 'Without {resistance:…} all parts of a size would have one code.' };
  }
  return { ok: true, template };
}

/** @returns the piece, or what is wrong with it */
function readPiece(text: string): OrderingCodePiece | string {
  const [kind = '', form] = text.split(/:(.*)/s);
  if (form === undefined && (kind === 'family' || kind === 'size' || kind === 'tolerance')) return { kind };
  if (form === undefined && kind === 'packaging') return { kind, before: '', after: '' };
  if (kind === 'resistance' && (form === 'rkm' || form === 'three' || form === 'four')) return { kind, form };
  if (kind === 'tcr' && (form === undefined || form === 'ppm')) return { kind, form: form ?? 'letter' };
  if (form !== undefined && (kind === 'tolerance' || kind === 'tcr')) {
    const table = readTable(form, kind === 'tolerance' ? -2 : -6);
    if (typeof table === 'string') return `{${text}}: ${table}`;
    return kind === 'tolerance' ? { kind, table } : { kind, form: table };
  }
  return `{${text}} is not known. Known are ${known}.`;
}

/** @param exponent power of ten of the keys' unit: -2 for per cent, -6 for ppm/K */
function readTable(text: string, exponent: number): LetterTable | string {
  const table = new Map<number, string>();
  for (const entry of text.split(',')) {
    const [, figure, letters] = /^(\d{1,6}(?:\.\d{1,6})?)=([A-Za-z0-9]{1,4})$/.exec(entry) ?? [];
    if (figure === undefined || letters === undefined) return `“${entry}” must look like 100=S.`;
    const key = decimalValue(figure, exponent);
    if (table.has(key)) return `${figure} stands twice.`;
    if ([...table.values()].includes(letters)) return `${letters} stands for two values.`;
    table.set(key, letters);
  }
  return table;
}
