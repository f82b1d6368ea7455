import type { FamilyRevision } from './family';
import type { FamilyContext, FamilyRows } from './family-tables';
import { momentOf } from './moments';

/** Where a revision belongs. */
export interface RevisionPlace {
  readonly id: number;
  readonly familyId: number;
  readonly sizeIds: ReadonlyMap<string, number>;
  readonly datasheetIds: ReadonlyMap<string, number>;
  readonly context: FamilyContext;
}

/** Adds the rows of one revision, as a draft, to those of its family. */
export function addRevision(rows: FamilyRows, revision: FamilyRevision, place: RevisionPlace): void {
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

/** @throws RangeError for a name without a row */
export function idOf(ids: ReadonlyMap<string, number>, name: string): number {
  const id = ids.get(name);
  if (id === undefined) throw new RangeError(`“${name}” has no row of its own.`);
  return id;
}
