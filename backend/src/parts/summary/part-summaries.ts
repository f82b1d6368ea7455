import { Injectable } from '@nestjs/common';
import type { Candidate } from '@resistry/engineering/assessment/judge';
import type { Approval, Mounting, SupplyStatus, Technology } from '@resistry/engineering/ratings/technology';
import { Readers } from '../../database/readers';
import { modesOfPart, type SizeRatings } from '../ratings/size-ratings';
import type { BodyStyle, PartSummaryDto } from './part-summary.dto';

/** A part as lists read it. */
export interface PartRow {
  id: number;
  manufacturer_part_number: string;
  company_part_number_id: number | null;
  company_part_number: string | null;
  manufacturer_id: number;
  manufacturer_code: string;
  manufacturer_name: string;
  family_id: number;
  family_code: string;
  family_name: string;
  technology: Technology;
  size_id: number;
  size_code: string;
  metric_code: string | null;
  body_style: BodyStyle;
  body_length_metre: number | null;
  body_width_metre: number | null;
  body_height_metre: number | null;
  mounting: Mounting | null;
  resistance_ohm: number;
  tolerance_fraction: number | null;
  tcr_per_kelvin: number | null;
  rated_dissipation_watt: number | null;
  approval: Approval;
  supply: SupplyStatus;
  derived_unit_price_micro: number | null;
  derived_second_source: number;
}

/** Columns of a part in a list; the WHERE clause follows. Only parts whose size has published ratings. */
export const partRowsSql = `
  SELECT p.id, p.manufacturer_part_number, c.id AS company_part_number_id, c.number AS company_part_number,
    m.id AS manufacturer_id, m.code AS manufacturer_code, m.name AS manufacturer_name,
    f.id AS family_id, f.code AS family_code, f.name AS family_name, f.technology,
    s.id AS size_id, s.code AS size_code, s.metric_code, r.body_style, r.body_length_metre, r.body_width_metre,
    r.body_height_metre, r.mounting, p.resistance_ohm, p.tolerance_fraction, p.tcr_per_kelvin,
    o.rated_dissipation_watt, p.approval, p.supply, p.derived_unit_price_micro, p.derived_second_source
  FROM parts p
  JOIN families f ON f.id = p.family_id
  JOIN manufacturers m ON m.id = f.manufacturer_id
  JOIN sizes s ON s.id = p.size_id
  JOIN size_ratings r ON r.size_id = p.size_id AND r.revision_id = f.current_revision_id
  LEFT JOIN operating_modes o ON o.size_ratings_id = r.id
    AND o.position = (SELECT min(position) FROM operating_modes WHERE size_ratings_id = r.id)
  LEFT JOIN approved_sources a ON a.part_id = p.id
  LEFT JOIN company_part_numbers c ON c.id = a.company_part_number_id`;

/** Reads parts as lists show them. */
@Injectable()
export class PartSummaries {
  constructor(private readonly readers: Readers) {}

  /** The rows of the named parts, by id; a part that is not there is left out. */
  async rows(ids: readonly number[]): Promise<Map<number, PartRow>> {
    const rows = await this.readers.select<PartRow>(
      `${partRowsSql} WHERE p.id IN (SELECT value FROM json_each($ids))`,
      {
        ids: JSON.stringify(ids),
      },
    );
    return new Map(rows.map((row) => [row.id, row]));
  }
}

/** What an assessment needs of a part in a list, with the ratings of its size. */
export function candidateOf(row: PartRow, size: SizeRatings): Candidate {
  return {
    modes: modesOfPart(size, {
      resistance: row.resistance_ohm,
      tolerance: row.tolerance_fraction,
      tcr: row.tcr_per_kelvin,
    }),
    standing: { approval: row.approval, supply: row.supply, secondSource: row.derived_second_source === 1 },
  };
}

/** A part as the API gives it in a list. */
export function presentPartSummary(row: PartRow): PartSummaryDto {
  const { body_length_metre: length, body_width_metre: width, body_height_metre: height } = row;
  const { company_part_number_id: companyId, company_part_number: companyNumber } = row;
  return {
    id: row.id,
    manufacturerPartNumber: row.manufacturer_part_number,
    companyPartNumber:
      companyId === null || companyNumber === null ? undefined : { id: companyId, number: companyNumber },
    manufacturer: { id: row.manufacturer_id, code: row.manufacturer_code, name: row.manufacturer_name },
    family: { id: row.family_id, code: row.family_code, name: row.family_name },
    technology: row.technology,
    size: { id: row.size_id, code: row.size_code, metricCode: row.metric_code ?? undefined },
    bodyStyle: row.body_style,
    body: length === null || width === null || height === null ? undefined : { length, width, height },
    mounting: row.mounting ?? undefined,
    resistance: row.resistance_ohm,
    tolerance: row.tolerance_fraction ?? undefined,
    tcr: row.tcr_per_kelvin ?? undefined,
    ratedDissipation: row.rated_dissipation_watt ?? undefined,
    approval: row.approval,
    supply: row.supply,
    unitPrice: row.derived_unit_price_micro === null ? undefined : row.derived_unit_price_micro / 1e6,
    secondSource: row.derived_second_source === 1,
  };
}
