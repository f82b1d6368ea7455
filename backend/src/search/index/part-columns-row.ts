import type { Approval, SupplyStatus } from '@resistry/engineering/ratings/technology';

/** A part as the index reads it, in the order of the columns. */
export interface PartColumnsRow {
  id: number;
  size_id: number;
  resistance_ohm: number;
  tolerance_fraction: number | null;
  tcr_per_kelvin: number | null;
  approval: Approval;
  supply: SupplyStatus;
  derived_second_source: number;
  derived_unit_price_micro: number | null;
  company_part_number_id: number | null;
}

/** Parts of the sizes from `$first` to `$last`. */
export const partColumnsSql = `
  SELECT p.id, p.size_id, p.resistance_ohm, p.tolerance_fraction, p.tcr_per_kelvin, p.approval, p.supply,
    p.derived_second_source, p.derived_unit_price_micro, a.company_part_number_id
  FROM parts p
  LEFT JOIN approved_sources a ON a.part_id = p.id
  WHERE p.size_id BETWEEN $first AND $last
  ORDER BY p.size_id, p.tolerance_fraction, p.tcr_per_kelvin, p.resistance_ohm, p.id`;

export const partCountsSql =
  'SELECT size_id, count(*) AS parts, max(id) AS last_id FROM parts GROUP BY size_id ORDER BY size_id';

/** Part numbers in alphabetical order, after `$after`. */
export const partNumbersSql = `
  SELECT id, manufacturer_part_number AS number FROM parts
  WHERE manufacturer_part_number > $after ORDER BY manufacturer_part_number LIMIT $limit`;

export interface SizeRow {
  id: number;
  code: string;
  family_id: number;
  family_rank: number;
  manufacturer_id: number;
  manufacturer_rank: number;
  technology: string;
  body_style: string;
}

export const sizesSql = `
  SELECT s.id, s.code, f.id AS family_id, dense_rank() OVER (ORDER BY f.code, f.id) AS family_rank,
    m.id AS manufacturer_id, dense_rank() OVER (ORDER BY m.name) AS manufacturer_rank, f.technology, r.body_style
  FROM sizes s
  JOIN families f ON f.id = s.family_id
  JOIN manufacturers m ON m.id = f.manufacturer_id
  JOIN size_ratings r ON r.size_id = s.id AND r.revision_id = f.current_revision_id`;

export const companyNumbersSql = 'SELECT id FROM company_part_numbers ORDER BY number';
