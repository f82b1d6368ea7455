import { technologies } from '@resistry/engineering/ratings/technology';
import type {
  Family,
  FamilyCertificate,
  FamilyDatasheet,
  FamilyDeclaration,
  FamilyRevision,
  OrderingCodeExample,
} from '../family';
import { Fields } from './fields';
import { revisionOver } from './merge-revisions';
import { type FamilyFrame, readDeed, readRevision } from './read-revision';

/**
 * Reads a family's file.
 *
 * @param file path that refusals name
 * @param content what the file's JSON holds
 * @throws SeedDataError naming the file and the field
 */
export function readFamily(file: string, content: unknown): Family {
  return Fields.read(file, '', content, (fields) => {
    const sizes = fields.list('sizes', (inner) => ({
      code: inner.text('code'),
      metricCode: inner.optional('metric', () => inner.text('metric')) ?? null,
    }));
    const datasheets = fields.list('datasheets', readDatasheet);
    const frame: FamilyFrame = {
      sizes: sizes.map((size) => size.code),
      datasheets: new Map(datasheets.map((sheet) => [`${sheet.document} ${sheet.revision}`, sheet.pages])),
    };
    return {
      code: fields.text('code'),
      manufacturer: fields.text('manufacturer'),
      name: fields.text('name'),
      technology: fields.choice('technology', technologies),
      entered: fields.one('entered', readDeed),
      sizes,
      datasheets,
      declarations: fields.list('declarations', readDeclaration),
      certificates: fields.list('certificates', (inner) => readCertificate(inner, frame)),
      revisions: readRevisions(fields, frame),
      examples: fields.list('examples', readExample),
    };
  });
}

function readRevisions(fields: Fields, frame: FamilyFrame): FamilyRevision[] {
  const plains = fields.objects('revisions');
  if (plains.length === 0) throw fields.refusal('revisions', 'needs at least one revision');
  const revisions = plains.map((plain, place) => {
    const base = plains.find((candidate) => candidate['number'] === plain['basedOn']);
    if (plain['basedOn'] !== undefined && (base === undefined || base['basedOn'] !== undefined)) {
      throw fields.refusal(`revisions[${place}].basedOn`, 'must be the number of a revision given in full');
    }
    const whole = base === undefined ? plain : revisionOver(base, plain);
    return Fields.read(fields.file, `revisions[${place}]`, whole, (inner) => readRevision(inner, frame));
  });
  const slip = revisions.findIndex((revision, place) => revision.number !== place + 1);
  if (slip >= 0) throw fields.refusal(`revisions[${slip}].number`, `must be ${slip + 1}`);
  return revisions;
}

function readDatasheet(fields: Fields): FamilyDatasheet {
  return {
    title: fields.text('title'),
    document: fields.text('document'),
    revision: fields.text('revision'),
    issuedOn: fields.day('issued'),
    pages: fields.whole('pages', 1),
  };
}

function readDeclaration(fields: Fields): FamilyDeclaration {
  return {
    kind: fields.choice('kind', ['RoHS', 'REACH']),
    datedOn: fields.day('dated'),
    exemption: fields.optional('exemption', () => fields.text('exemption')) ?? null,
    statement: fields.text('statement'),
  };
}

function readCertificate(fields: Fields, frame: FamilyFrame): FamilyCertificate {
  const sizes = fields.optional('sizes', () => fields.texts('sizes')) ?? [];
  const stranger = sizes.find((size) => !frame.sizes.includes(size));
  if (stranger !== undefined) throw fields.refusal('sizes', `“${stranger}” is not a size of the family`);
  return {
    kind: fields.choice('kind', ['safety', 'automotive']),
    standard: fields.text('standard'),
    number: fields.text('number'),
    issuedOn: fields.day('issued'),
    expiresOn: fields.optional('expires', () => fields.day('expires')) ?? null,
    sizes,
  };
}

function readExample(fields: Fields): OrderingCodeExample {
  return {
    code: fields.text('code'),
    size: fields.text('size'),
    resistance: fields.quantity('resistance', 'resistance'),
    tolerance: fields.optional('tolerance', () => fields.quantity('tolerance', 'tolerance')) ?? null,
    tcr: fields.optional('tcr', () => fields.quantity('tcr', 'temperature-coefficient')) ?? null,
    packaging: fields.optional('packaging', () => fields.text('packaging')),
  };
}
