import { Injectable } from '@nestjs/common';
import type { Approval, Technology } from '@resistry/engineering/ratings/technology';
import { containsWords, wordsOf } from '../common/reading/words';
import { Readers } from '../database/readers';
import { approvalCounts } from './approval-counts';
import type { FamilyQuery, FamilySummaryDto } from './dto/family-list.dto';

interface FamilyRow {
  id: number;
  code: string;
  name: string;
  technology: Technology;
  manufacturer_id: number;
  manufacturer_code: string;
  manufacturer_name: string;
  revision_number: number | null;
  published_at: string | null;
  sizes: number;
}

const FAMILIES = `
  SELECT f.id, f.code, f.name, f.technology, m.id AS manufacturer_id, m.code AS manufacturer_code,
    m.name AS manufacturer_name, r.number AS revision_number, r.published_at,
    (SELECT count(*) FROM sizes WHERE family_id = f.id) AS sizes
  FROM families AS f JOIN manufacturers AS m ON m.id = f.manufacturer_id
    LEFT JOIN family_revisions AS r ON r.id = f.current_revision_id
  WHERE ($technology IS NULL OR f.technology = $technology)
    AND ($manufacturer IS NULL OR m.id = $manufacturer)
    AND ${containsWords("f.code || ' ' || f.name || ' ' || m.name", '$words')}
  ORDER BY f.code, f.id`;

/** Reading the list of families. */
@Injectable()
export class FamilyList {
  constructor(private readonly readers: Readers) {}

  /** By code. */
  async find(query: FamilyQuery): Promise<FamilySummaryDto[]> {
    const rows = await this.readers.select<FamilyRow>(FAMILIES, {
      technology: query.technology ?? null,
      manufacturer: query.manufacturer ?? null,
      words: wordsOf(query.q ?? ''),
    });
    const counts = await this.approvalsOf(rows.map(({ id }) => id));
    return rows.map((row) => {
      const byApproval = counts.filter(({ family_id: familyId }) => familyId === row.id);
      return {
        id: row.id,
        code: row.code,
        name: row.name,
        manufacturer: {
          id: row.manufacturer_id,
          code: row.manufacturer_code,
          name: row.manufacturer_name,
        },
        technology: row.technology,
        revision:
          row.revision_number === null || row.published_at === null
            ? undefined
            : { number: row.revision_number, publishedAt: row.published_at },
        sizes: row.sizes,
        parts: byApproval.reduce((sum, { parts }) => sum + parts, 0),
        approvals: approvalCounts(byApproval),
      };
    });
  }

  private async approvalsOf(
    familyIds: readonly number[],
  ): Promise<{ family_id: number; approval: Approval; parts: number }[]> {
    return this.readers.select(
      `SELECT family_id, approval, count(*) AS parts FROM parts
        WHERE family_id IN (SELECT value FROM json_each($familyIds)) GROUP BY family_id, approval`,
      { familyIds: JSON.stringify(familyIds) },
    );
  }
}
