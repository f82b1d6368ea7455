import type { Approval, SupplyStatus } from '@resistry/engineering/ratings/technology';

/** Where a part stands, and what a change of it depends on. */
export interface PartStanding {
  id: number;
  manufacturer_part_number: string;
  company_part_number: string | null;
  approval: Approval;
  restriction_words: string | null;
  restriction_scope: string | null;
  supply: SupplyStatus;
  last_order_on: string | null;
  entered_by: number;
  version: number;
  second_source: 0 | 1;
  /** The family's current revision names its datasheet. */
  datasheet: 0 | 1;
  offer_in_force: 0 | 1;
  open_reviews: number;
}

/** Binds the part and today's day. */
export const partStandingSql = `
  SELECT p.id, p.manufacturer_part_number, c.number AS company_part_number, p.approval, p.restriction_words,
    p.restriction_scope, p.supply, p.last_order_on, p.entered_by, p.version, p.derived_second_source AS second_source,
    EXISTS (SELECT 1 FROM families AS f JOIN family_revisions AS r ON r.id = f.current_revision_id
      WHERE f.id = p.family_id AND r.datasheet_id IS NOT NULL) AS datasheet,
    EXISTS (SELECT 1 FROM offers AS o WHERE o.part_id = p.id AND o.ended_at IS NULL
        AND $today BETWEEN o.valid_from AND o.valid_until) AS offer_in_force,
    (SELECT count(*) FROM reviews AS v WHERE v.part_id = p.id AND v.state = 'open') AS open_reviews
  FROM parts AS p LEFT JOIN approved_sources AS a ON a.part_id = p.id
    LEFT JOIN company_part_numbers AS c ON c.id = a.company_part_number_id
  WHERE p.id = $partId`;

/** The part and the others under its company part number: a change of one changes the second source of the others. */
export const partAndSourcesSql = `
  SELECT $partId AS id UNION
  SELECT other.part_id FROM approved_sources AS own
    JOIN approved_sources AS other ON other.company_part_number_id = own.company_part_number_id
  WHERE own.part_id = $partId`;

/** What people call the part. */
export function nameOf(part: PartStanding): string {
  const number = part.company_part_number;
  return number === null ? part.manufacturer_part_number : `${part.manufacturer_part_number} (${number})`;
}
