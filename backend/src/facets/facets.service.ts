import { Injectable } from '@nestjs/common';
import { seriesNames } from '@resistry/engineering/preferred-values/series';
import type { Mounting, Technology } from '@resistry/engineering/ratings/technology';
import { Readers } from '../database/readers';
import { acceptedSeriesBits, seriesBits } from '../search/index/series-bits';
import type { FacetsDto, SeriesFacet } from './facets.dto';
import { Tally } from './tally';

/** Parts that are alike in everything but resistance and standing. */
interface GroupRow {
  manufacturer_id: number;
  manufacturer_code: string;
  manufacturer_name: string;
  family_id: number;
  family_code: string;
  family_name: string;
  technology: Technology;
  size_code: string;
  metric_code: string | null;
  mounting: Mounting | null;
  tolerance_fraction: number | null;
  tcr_per_kelvin: number | null;
  parts: number;
}

/** The catalogue as searches see it: parts whose size has ratings in the family's current revision. */
const GROUPS = `
  WITH counted AS MATERIALIZED (
    SELECT size_id, tolerance_fraction, tcr_per_kelvin, count(*) AS parts FROM parts GROUP BY 1, 2, 3)
  SELECT m.id AS manufacturer_id, m.code AS manufacturer_code, m.name AS manufacturer_name, f.id AS family_id,
    f.code AS family_code, f.name AS family_name, f.technology, s.code AS size_code, s.metric_code, r.mounting,
    c.tolerance_fraction, c.tcr_per_kelvin, c.parts
  FROM counted AS c JOIN sizes AS s ON s.id = c.size_id JOIN families AS f ON f.id = s.family_id
    JOIN manufacturers AS m ON m.id = f.manufacturer_id
    JOIN size_ratings AS r ON r.size_id = s.id AND r.revision_id = f.current_revision_id
  ORDER BY m.name, f.code, s.code`;

const RESISTANCES = `
  SELECT p.resistance_ohm AS resistance, count(*) AS parts FROM parts AS p JOIN families AS f ON f.id = p.family_id
    JOIN size_ratings AS r ON r.size_id = p.size_id AND r.revision_id = f.current_revision_id
  WHERE p.resistance_ohm > 0 GROUP BY 1`;

/**
 * All that the counts follow from: a part never goes and never changes what it is, so the newest one stands for all; what
 * families and manufacturers are called and which revisions are current is read whole.
 */
const STAMP = `
  SELECT (SELECT max(id) FROM parts) AS newest_part,
    (SELECT json_group_array(json_array(f.id, f.code, f.name, f.technology, f.current_revision_id, m.code, m.name))
      FROM families AS f JOIN manufacturers AS m ON m.id = f.manufacturer_id) AS families`;

/** Counts what a search can be narrowed to, anew only where something has come to the catalogue. */
@Injectable()
export class FacetsService {
  private counted?: { stamp: string; facets: Promise<FacetsDto> };

  constructor(private readonly readers: Readers) {}

  async count(): Promise<FacetsDto> {
    const stamp = JSON.stringify(await this.readers.lookUp(STAMP));
    if (this.counted?.stamp !== stamp) {
      this.counted = { stamp, facets: this.countAnew() };
      // A failed count is not kept: the next caller tries again.
      this.counted.facets.catch(() => (this.counted = undefined));
    }
    return this.counted.facets;
  }

  private async countAnew(): Promise<FacetsDto> {
    const [rows, series] = await Promise.all([this.readers.select<GroupRow>(GROUPS), this.series()]);
    const rising = (one: { value: number }, other: { value: number }): number => one.value - other.value;
    return {
      manufacturers: Tally.of(rows, (row) => row.manufacturer_id).entries(({ parts, first }) => ({
        id: first.manufacturer_id,
        code: first.manufacturer_code,
        name: first.manufacturer_name,
        parts,
      })),
      families: Tally.of(rows, (row) => row.family_id).entries(({ parts, first }) => ({
        id: first.family_id,
        code: first.family_code,
        name: first.family_name,
        manufacturerId: first.manufacturer_id,
        parts,
      })),
      technologies: Tally.of(rows, (row) => row.technology).values(),
      sizes: Tally.of(rows, (row) => row.size_code)
        .entries(({ value, parts, rows: alike }) => ({
          code: value,
          metricCodes: [...new Set(alike.flatMap((row) => row.metric_code ?? []))],
          parts,
        }))
        .sort((one, other) => (one.code < other.code ? -1 : 1)),
      series,
      tolerances: Tally.of(rows, (row) => row.tolerance_fraction)
        .values()
        .sort(rising),
      tcrs: Tally.of(rows, (row) => row.tcr_per_kelvin)
        .values()
        .sort(rising),
      mountings: Tally.of(rows, (row) => row.mounting).values(),
    };
  }

  private async series(): Promise<SeriesFacet[]> {
    const rows = await this.readers.select<{ resistance: number; parts: number }>(RESISTANCES);
    const sets = rows.map(({ resistance, parts }) => ({ bits: seriesBits(resistance), parts }));
    return seriesNames.map((value) => {
      const accepted = acceptedSeriesBits([value]);
      const parts = sets.reduce((sum, set) => sum + ((set.bits & accepted) === 0 ? 0 : set.parts), 0);
      return { value, parts };
    });
  }
}
