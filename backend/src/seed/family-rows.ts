import { expandParts, type ExpandedPart } from './expand-parts';
import { currentRevision, type Family } from './family';
import { emptyFamilyRows, type FamilyContext, type FamilyRows } from './family-tables';
import { momentOf } from './moments';
import { addRevision, idOf } from './revision-rows';

/** A part with its place in the database. */
export interface PlacedPart extends ExpandedPart {
  readonly id: number;
  readonly family: Family;
}

/** A family as rows. Revisions come as drafts: what makes them public is in `publications`. */
export interface FilledFamily {
  readonly familyId: number;
  readonly currentRevisionId: number;
  readonly rows: FamilyRows;
  readonly publications: readonly { id: number; published_by: number; published_at: string }[];
  readonly parts: readonly PlacedPart[];
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
