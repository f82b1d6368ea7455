import { Injectable } from '@nestjs/common';
import { Clock } from '../../common/clock';
import { Readers } from '../../database/readers';
import type { SizeRatings } from './size-ratings';
import { ratingsOfRow, type SizeRatingsRow } from './size-ratings-row';

/** One row an operating mode of every size in its family's current revision; certificates that are in date today. */
const sizeRatingsSql = `
  SELECT s.size_id, f.id AS family_id, r.id AS revision_id, f.technology, r.reference_temperature_celsius,
    r.failure_rate_style, r.features, s.mounting, s.body_length_metre, s.body_width_metre, s.body_height_metre,
    s.limiting_element_voltage_volt, s.overload_voltage_volt, s.insulation_voltage_volt,
    s.category_min_celsius, s.category_max_celsius, s.voltage_coefficient_per_volt, s.noise_index_decibel,
    s.inductance_henry, s.capacitance_farad, s.solder_shift_fraction, s.humidity_shift_fraction, s.pulses,
    s.link_rated_current_ampere, s.link_residual_resistance_ohm,
    m.name AS mode_name, m.rated_dissipation_watt, m.derating_axis, m.derating_points,
    m.max_element_temperature_celsius, m.thermal_resistance_kelvin_per_watt,
    m.drift_fraction, m.drift_hours, m.drift_temperature_celsius, m.drift_law_exponent, m.drift_law_doubling_kelvin,
    (SELECT json_group_array(c.standard || ' ' || c.number) FROM certificates c
      WHERE c.family_id = f.id AND (c.size_id IS NULL OR c.size_id = s.size_id) AND c.kind = 'safety'
        AND c.issued_on <= $today AND (c.expires_on IS NULL OR c.expires_on >= $today)) AS certificates
  FROM families f
  JOIN family_revisions r ON r.id = f.current_revision_id
  JOIN size_ratings s ON s.revision_id = r.id
  JOIN operating_modes m ON m.size_ratings_id = s.id`;
const ofTheseSizes = 'WHERE s.size_id IN (SELECT value FROM json_each($sizes))';
const inOrder = 'ORDER BY s.size_id, m.position';

/** Reads the ratings that parts are assessed with: those of each family's current, published revision. */
@Injectable()
export class SizeRatingsReader {
  constructor(
    private readonly readers: Readers,
    private readonly clock: Clock,
  ) {}

  /** All sizes of the catalogue. */
  async all(): Promise<Map<number, SizeRatings>> {
    return bySize(await this.readers.select(`${sizeRatingsSql} ${inOrder}`, { today: this.clock.today() }));
  }

  /** The named sizes; one that has no published revision is left out. */
  async ofSizes(sizeIds: readonly number[]): Promise<Map<number, SizeRatings>> {
    const sizes = JSON.stringify([...new Set(sizeIds)]);
    const sql = `${sizeRatingsSql} ${ofTheseSizes} ${inOrder}`;
    return bySize(await this.readers.select(sql, { today: this.clock.today(), sizes }));
  }
}

function bySize(rows: readonly SizeRatingsRow[]): Map<number, SizeRatings> {
  const sizes = new Map<number, SizeRatings>();
  for (const row of rows) {
    const mode = { name: row.mode_name, ratings: ratingsOfRow(row) };
    const known = sizes.get(row.size_id);
    sizes.set(row.size_id, {
      sizeId: row.size_id,
      familyId: row.family_id,
      revisionId: row.revision_id,
      modes: [...(known?.modes ?? []), mode],
    });
  }
  return sizes;
}
