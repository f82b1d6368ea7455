import { Injectable } from '@nestjs/common';
import type { Technology } from '@resistry/engineering/ratings/technology';
import { containsWords, wordsOf } from '../common/reading/words';
import { Readers } from '../database/readers';
import { partTextQuery } from '../parts/part-text';
import { PartSummaries, presentPartSummary } from '../parts/summary/part-summaries';
import type {
  FamilyHits,
  ManufacturerHits,
  PartHits,
  TextSearchQuery,
  TextSearchResult,
} from './text-search.dto';

const USUAL_LIMIT = 10;

interface FamilyHitRow {
  id: number;
  code: string;
  name: string;
  technology: Technology;
  manufacturer_id: number;
  manufacturer_code: string;
  manufacturer_name: string;
  total: number;
}

/** A number that is the text goes first, then one that begins with it; then as one would rather have the parts. */
const partsFound = (found: string): string => `
  WITH found AS MATERIALIZED (${found})
  SELECT p.id, count(*) OVER () AS total
  FROM found JOIN parts AS p ON p.id = found.id LEFT JOIN approved_sources AS a ON a.part_id = p.id
    LEFT JOIN company_part_numbers AS c ON c.id = a.company_part_number_id
  ORDER BY
    CASE WHEN lower($text) IN (lower(p.manufacturer_part_number), lower(c.number)) THEN 0
      WHEN 1 IN (instr(lower(p.manufacturer_part_number), lower($text)), instr(lower(c.number), lower($text))) THEN 1
      ELSE 2 END,
    CASE p.approval WHEN 'preferred' THEN 0 WHEN 'approved' THEN 1 WHEN 'restricted' THEN 2 WHEN 'in-review' THEN 3
      WHEN 'draft' THEN 4 ELSE 5 END,
    p.supply <> 'active', p.manufacturer_part_number
  LIMIT $limit`;

const FAMILIES = `
  SELECT f.id, f.code, f.name, f.technology, m.id AS manufacturer_id, m.code AS manufacturer_code,
    m.name AS manufacturer_name, count(*) OVER () AS total
  FROM families AS f JOIN manufacturers AS m ON m.id = f.manufacturer_id
  WHERE ${containsWords("f.code || ' ' || f.name || ' ' || m.name", '$words')}
  ORDER BY instr(lower(f.code), lower($text)) <> 1, f.code LIMIT $limit`;

const MANUFACTURERS = `
  SELECT m.id, m.code, m.name, count(*) OVER () AS total FROM manufacturers AS m
  WHERE ${containsWords("m.code || ' ' || m.name", '$words')} ORDER BY m.name LIMIT $limit`;

/** Quick search over part numbers, company part numbers, families and manufacturers. */
@Injectable()
export class TextSearchService {
  constructor(
    private readonly readers: Readers,
    private readonly summaries: PartSummaries,
  ) {}

  async search({ q, limit = USUAL_LIMIT }: TextSearchQuery): Promise<TextSearchResult> {
    const text = q.trim();
    const [parts, families, manufacturers] = await Promise.all([
      this.parts(text, limit),
      this.families(text, limit),
      this.manufacturers(text, limit),
    ]);
    return { parts, families, manufacturers };
  }

  private async parts(text: string, limit: number): Promise<PartHits> {
    const { sql, bind } = partTextQuery(text);
    const found = await this.readers.select<{ id: number; total: number }>(partsFound(sql), {
      ...bind,
      text,
      limit,
    });
    const rows = await this.summaries.rows(found.map(({ id }) => id));
    return {
      total: found[0]?.total ?? 0,
      items: found.flatMap(({ id }) => {
        const row = rows.get(id);
        return row ? [presentPartSummary(row)] : [];
      }),
    };
  }

  private async families(text: string, limit: number): Promise<FamilyHits> {
    const rows = await this.readers.select<FamilyHitRow>(FAMILIES, { words: wordsOf(text), text, limit });
    return {
      total: rows[0]?.total ?? 0,
      items: rows.map((row) => ({
        id: row.id,
        code: row.code,
        name: row.name,
        manufacturer: { id: row.manufacturer_id, code: row.manufacturer_code, name: row.manufacturer_name },
        technology: row.technology,
      })),
    };
  }

  private async manufacturers(text: string, limit: number): Promise<ManufacturerHits> {
    const rows = await this.readers.select<{ id: number; code: string; name: string; total: number }>(
      MANUFACTURERS,
      { words: wordsOf(text), limit },
    );
    return {
      total: rows[0]?.total ?? 0,
      items: rows.map(({ id, code, name }) => ({ id, code, name })),
    };
  }
}
