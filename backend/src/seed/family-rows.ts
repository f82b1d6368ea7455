import { expandParts, type ExpandedPart } from './expand-parts';
import { currentRevision, type Columns, type Family, type FamilyRevision } from './family';
import type { IdSequences } from './id-sequences';
import { momentOf } from './moments';

/** A part with its place in the database. */
export interface PlacedPart extends ExpandedPart {
  readonly id: number;
  readonly family: Family;
}

/** Tables that a family fills, in an order in which every row finds what it refers to. */
export const familyTables = [
  'families',
  'datasheets',
  'sizes',
  'family_revisions',
  'size_ratings',
  'operating_modes',
  'ranges',
  'packagings',
  'citations',
  'declarations',
  'certificates',
  'parts',
] as const;
export type FamilyTable = (typeof familyTables)[number];
export type FamilyRows = Readonly<Record<FamilyTable, Columns[]>>;

export interface FamilyContext {
  readonly manufacturerId: number;
  /** Local part of an address → id of the account. */
  readonly personId: (address: string) => number;
  readonly ids: IdSequences;
}

/** A family as rows. Revisions come as drafts: what makes them public is in `publications`. */
export interface FilledFamily {
  readonly familyId: number;
  readonly currentRevisionId: number;
  readonly rows: FamilyRows;
  readonly publications: readonly { id: number; published_by: number; published_at: string }[];
  readonly parts: readonly PlacedPart[];
}

export function emptyFamilyRows(): FamilyRows {
  return Object.fromEntries(familyTables.map((table) => [table, []])) as unknown as FamilyRows;
}

/** Turns a family, with every part that its current revision offers, into rows of the catalogue. */
export function familyRows(family: Family, context: FamilyContext): FilledFamily {
  const { ids, personId } = context;
  const rows = emptyFamilyRows();
  const familyId = ids.next('families');
  const enteredBy = personId(family.entered.by);
  const enteredAt = momentOf(family.entered.on);
  rows.families.push({
    id: familyId,
    manufacturer_id: context.manufacturerId,
    code: family.code,
    name: family.name,
    technology: family.technology,
    entered_by: enteredBy,
    entered_at: enteredAt,
  });
  const sizeIds = new Map(family.sizes.map((size) => [size.code, ids.next('sizes')]));
  for (const [place, size] of family.sizes.entries()) {
    rows.sizes.push({
      id: idOf(sizeIds, size.code),
      family_id: familyId,
      code: size.code,
      metric_code: size.metricCode,
      position: place + 1,
    });
  }
  const datasheetIds = new Map<string, number>();
  for (const sheet of family.datasheets) {
    const id = ids.next('datasheets');
    datasheetIds.set(`${sheet.document} ${sheet.revision}`, id);
    rows.datasheets.push({
      id,
      family_id: familyId,
      title: sheet.title,
      document_number: sheet.document,
      revision: sheet.revision,
      issued_on: sheet.issuedOn,
      page_count: sheet.pages,
    });
  }
  const publications = family.revisions.map((revision) => {
    const id = ids.next('family_revisions');
    addRevision(rows, revision, { id, familyId, sizeIds, datasheetIds, context });
    return {
      id,
      published_by: personId(revision.published.by),
      published_at: momentOf(revision.published.on, 14),
    };
  });
  addPapers(rows, family, familyId, sizeIds);
  const parts = expandParts(family).map((part): PlacedPart => ({ ...part, id: ids.next('parts'), family }));
  for (const part of parts) {
    rows.parts.push({
      id: part.id,
      family_id: familyId,
      size_id: idOf(sizeIds, part.size),
      manufacturer_part_number: part.manufacturerPartNumber,
      resistance_ohm: part.resistance,
      tolerance_fraction: part.tolerance,
      tcr_per_kelvin: part.tcr,
      entered_by: enteredBy,
      entered_at: enteredAt,
    });
  }
  const currentRevisionId = publications[currentRevision(family).number - 1]?.id ?? NaN;
  return { familyId, currentRevisionId, rows, publications, parts };
}

interface RevisionPlace {
  readonly id: number;
  readonly familyId: number;
  readonly sizeIds: ReadonlyMap<string, number>;
  readonly datasheetIds: ReadonlyMap<string, number>;
  readonly context: FamilyContext;
}

function addRevision(rows: FamilyRows, revision: FamilyRevision, place: RevisionPlace): void {
  const { id, sizeIds, datasheetIds, context } = place;
  const datasheetId = idOf(datasheetIds, revision.datasheet);
  rows.family_revisions.push({
    id,
    family_id: place.familyId,
    number: revision.number,
    description: revision.description,
    datasheet_id: datasheetId,
    reference_temperature_celsius: revision.referenceTemperature,
    failure_rate_style: revision.failureRateStyle,
    features: JSON.stringify(revision.features),
    ordering_code_template: revision.orderingCodeTemplate,
    entered_by: context.personId(revision.entered.by),
    entered_at: momentOf(revision.entered.on, 10),
  });
  for (const [size, ratings] of revision.sizes) {
    const ratingsId = context.ids.next('size_ratings');
    rows.size_ratings.push({
      id: ratingsId,
      revision_id: id,
      size_id: idOf(sizeIds, size),
      ...ratings.columns,
    });
    rows.operating_modes.push(
      ...ratings.modes.map((mode, index) => ({ size_ratings_id: ratingsId, position: index + 1, ...mode })),
    );
  }
  for (const range of revision.ranges) {
    for (const size of range.sizes) {
      rows.ranges.push({
        revision_id: id,
        size_id: idOf(sizeIds, size),
        tolerance_fraction: range.tolerance,
        tcr_per_kelvin: range.tcr,
        resistance_min_ohm: range.min,
        resistance_max_ohm: range.max,
        series: JSON.stringify(range.series),
      });
    }
  }
  for (const { sizes, code, description, quantity } of revision.packagings) {
    rows.packagings.push(
      ...sizes.map((size) => ({
        revision_id: id,
        size_id: idOf(sizeIds, size),
        code,
        description,
        quantity,
      })),
    );
  }
  for (const { fields, size, page, note } of revision.citations) {
    const sizeId = size === null ? null : idOf(sizeIds, size);
    rows.citations.push(
      ...fields.map((field) => ({
        revision_id: id,
        size_id: sizeId,
        field,
        datasheet_id: datasheetId,
        page,
        note,
      })),
    );
  }
}

function addPapers(
  rows: FamilyRows,
  family: Family,
  familyId: number,
  sizeIds: ReadonlyMap<string, number>,
): void {
  for (const { kind, datedOn, exemption, statement } of family.declarations) {
    rows.declarations.push({ family_id: familyId, kind, dated_on: datedOn, exemption, statement });
  }
  for (const certificate of family.certificates) {
    const sizes = certificate.sizes.length === 0 ? [null] : certificate.sizes;
    rows.certificates.push(
      ...sizes.map((size) => ({
        family_id: familyId,
        size_id: size === null ? null : idOf(sizeIds, size),
        kind: certificate.kind,
        standard: certificate.standard,
        number: certificate.number,
        issued_on: certificate.issuedOn,
        expires_on: certificate.expiresOn,
      })),
    );
  }
}

function idOf(ids: ReadonlyMap<string, number>, name: string): number {
  const id = ids.get(name);
  if (id === undefined) throw new RangeError(`“${name}” has no row of its own.`);
  return id;
}
