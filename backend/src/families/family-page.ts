import { Injectable } from '@nestjs/common';
import type { Approval, Technology } from '@resistry/engineering/ratings/technology';
import { NotFoundProblem } from '../common/problems/problems';
import { Readers } from '../database/readers';
import { approvalCounts } from './approval-counts';
import type { FamilyDetailsDto } from './dto/family-details.dto';
import { FamilyPapers } from './family-papers';
import { FamilyRevisions } from './family-revisions';

interface FamilyDetailsRow {
  id: number;
  code: string;
  name: string;
  technology: Technology;
  manufacturer_id: number;
  manufacturer_code: string;
  manufacturer_name: string;
  entered_by: number;
  entered_by_name: string;
  entered_at: string;
  revision_number: number | null;
}

const FAMILY = `
  SELECT f.id, f.code, f.name, f.technology, m.id AS manufacturer_id, m.code AS manufacturer_code,
    m.name AS manufacturer_name, f.entered_by, u.name AS entered_by_name, f.entered_at, r.number AS revision_number
  FROM families AS f JOIN manufacturers AS m ON m.id = f.manufacturer_id JOIN users AS u ON u.id = f.entered_by
    LEFT JOIN family_revisions AS r ON r.id = f.current_revision_id
  WHERE f.id = $id`;

/** Reading everything about one family. */
@Injectable()
export class FamilyPage {
  constructor(
    private readonly readers: Readers,
    private readonly revisions: FamilyRevisions,
    private readonly papers: FamilyPapers,
  ) {}

  /** @throws NotFoundProblem */
  async find(id: number): Promise<FamilyDetailsDto> {
    const row = await this.readers.lookUp<FamilyDetailsRow>(FAMILY, { id });
    if (!row) throw new NotFoundProblem(`There is no family ${id}.`);
    const counts = await this.readers.select<{ approval: Approval; parts: number }>(
      'SELECT approval, count(*) AS parts FROM parts WHERE family_id = $id GROUP BY approval',
      { id },
    );
    return {
      id: row.id,
      code: row.code,
      name: row.name,
      manufacturer: { id: row.manufacturer_id, code: row.manufacturer_code, name: row.manufacturer_name },
      technology: row.technology,
      enteredBy: { id: row.entered_by, name: row.entered_by_name },
      enteredAt: row.entered_at,
      parts: counts.reduce((sum, { parts }) => sum + parts, 0),
      approvals: approvalCounts(counts),
      revision: row.revision_number === null ? undefined : await this.revisions.find(id, row.revision_number),
      revisions: await this.revisions.list(id),
      declarations: await this.papers.declarations(id),
      certificates: await this.papers.certificates(id),
      datasheets: await this.papers.datasheets(id),
    };
  }
}
