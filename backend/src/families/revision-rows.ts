import type { SizeRatingsRow } from '../parts/ratings/size-ratings-row';
import type { BodyStyle } from '../parts/summary/part-summary.dto';

export interface RevisionRow {
  id: number;
  number: number;
  state: 'draft' | 'published';
  current: number;
  description: string;
  entered_by: number;
  entered_by_name: string;
  entered_at: string;
  published_by: number | null;
  published_by_name: string | null;
  published_at: string | null;
}

/** A family's revisions; the WHERE clause follows. */
export const revisionsSql = `
  SELECT r.id, r.number, r.state, r.id IS f.current_revision_id AS current, r.description, r.entered_by,
    e.name AS entered_by_name, r.entered_at, r.published_by, p.name AS published_by_name, r.published_at
  FROM family_revisions AS r JOIN families AS f ON f.id = r.family_id JOIN users AS e ON e.id = r.entered_by
    LEFT JOIN users AS p ON p.id = r.published_by`;

export interface RevisionHeadRow {
  family_code: string;
  datasheet_id: number | null;
  reference_temperature_celsius: number | null;
  failure_rate_style: string | null;
  features: string;
  ordering_code_template: string;
}

export const revisionHeadSql = `
  SELECT f.code AS family_code, r.datasheet_id, r.reference_temperature_celsius, r.failure_rate_style, r.features,
    r.ordering_code_template
  FROM family_revisions AS r JOIN families AS f ON f.id = r.family_id WHERE r.id = $revisionId`;

/** One row an operating mode of a size, in the order of sizes and modes. */
export interface RevisionSizeRow extends SizeRatingsRow {
  size_code: string;
  metric_code: string | null;
  body_style: BodyStyle;
  land_pattern: string | null;
  termination: string | null;
  soldering: string | null;
  parts: number;
}

/** The certificates of a family stand apart, so that none is read here. */
export const revisionSizesSql = `
  SELECT s.size_id, f.id AS family_id, r.id AS revision_id, f.technology, r.reference_temperature_celsius,
    r.failure_rate_style, r.features, s.mounting, s.body_length_metre, s.body_width_metre, s.body_height_metre,
    s.limiting_element_voltage_volt, s.overload_voltage_volt, s.insulation_voltage_volt, s.category_min_celsius,
    s.category_max_celsius, s.voltage_coefficient_per_volt, s.noise_index_decibel, s.inductance_henry,
    s.capacitance_farad, s.solder_shift_fraction, s.humidity_shift_fraction, s.pulses, s.link_rated_current_ampere,
    s.link_residual_resistance_ohm, m.name AS mode_name, m.rated_dissipation_watt, m.derating_axis, m.derating_points,
    m.max_element_temperature_celsius, m.thermal_resistance_kelvin_per_watt, m.drift_fraction, m.drift_hours,
    m.drift_temperature_celsius, m.drift_law_exponent, m.drift_law_doubling_kelvin, '[]' AS certificates,
    z.code AS size_code, z.metric_code, s.body_style, s.land_pattern, s.termination, s.soldering,
    (SELECT count(*) FROM parts WHERE size_id = s.size_id) AS parts
  FROM family_revisions AS r JOIN families AS f ON f.id = r.family_id
    JOIN size_ratings AS s ON s.revision_id = r.id JOIN sizes AS z ON z.id = s.size_id
    JOIN operating_modes AS m ON m.size_ratings_id = s.id
  WHERE r.id = $revisionId ORDER BY z.position, m.position`;

export interface RangeRow {
  size_id: number;
  size_code: string;
  metric_code: string | null;
  tolerance_fraction: number;
  tcr_per_kelvin: number | null;
  resistance_min_ohm: number;
  resistance_max_ohm: number;
  series: string;
}

export const rangesSql = `
  SELECT z.id AS size_id, z.code AS size_code, z.metric_code, g.tolerance_fraction, g.tcr_per_kelvin,
    g.resistance_min_ohm, g.resistance_max_ohm, g.series
  FROM ranges AS g JOIN sizes AS z ON z.id = g.size_id WHERE g.revision_id = $revisionId
  ORDER BY z.position, g.tolerance_fraction, g.tcr_per_kelvin, g.resistance_min_ohm`;

export interface PackagingRow {
  size_id: number;
  size_code: string;
  metric_code: string | null;
  code: string;
  description: string;
  quantity: number;
}

export const packagingsSql = `
  SELECT z.id AS size_id, z.code AS size_code, z.metric_code, k.code, k.description, k.quantity
  FROM packagings AS k JOIN sizes AS z ON z.id = k.size_id WHERE k.revision_id = $revisionId
  ORDER BY z.position, k.quantity, k.code`;
