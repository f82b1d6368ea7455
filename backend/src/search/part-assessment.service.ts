import { Injectable } from '@nestjs/common';
import { assess } from '@resistry/engineering/assessment/assess';
import type { AssessmentDto } from '../assessments/dto/assessment.dto';
import type { AssessPartRequest } from '../assessments/dto/assess-request.dto';
import { presentAssessment, type CitationOf } from '../assessments/present-assessment';
import { requirementOfDuty } from '../assessments/requirement-of-duty';
import { NotFoundProblem } from '../common/problems/problems';
import { Readers } from '../database/readers';
import { SizeRatingsReader } from '../parts/ratings/size-ratings-reader';
import { candidateOf, PartSummaries } from '../parts/summary/part-summaries';
import { PoliciesService } from '../policies/policies.service';

interface CitationRow {
  field: string;
  datasheet_id: number;
  document_number: string;
  revision: string;
  page: number;
  note: string | null;
}

/** A citation for the size itself goes before one for the whole family. */
const citationsSql = `
  SELECT c.field, c.datasheet_id, d.document_number, d.revision, c.page, c.note
  FROM citations c JOIN datasheets d ON d.id = c.datasheet_id
  WHERE c.revision_id = $revisionId AND (c.size_id = $sizeId OR c.size_id IS NULL)
  ORDER BY c.size_id IS NULL`;

/** Assesses one catalogue part, with the citations of its ratings. */
@Injectable()
export class PartAssessmentService {
  constructor(
    private readonly readers: Readers,
    private readonly parts: PartSummaries,
    private readonly sizeRatings: SizeRatingsReader,
    private readonly policies: PoliciesService,
  ) {}

  async assess(id: number, request: AssessPartRequest): Promise<AssessmentDto> {
    const requirement = requirementOfDuty(request.duty);
    const { policy, used } = await this.policies.resolve(request.policy);
    const row = (await this.parts.rows([id])).get(id);
    const size = row && (await this.sizeRatings.ofSizes([row.size_id])).get(row.size_id);
    if (row === undefined || size === undefined) throw new NotFoundProblem(`There is no part ${String(id)}.`);
    const citationOf = await this.citationsOf(size.revisionId, row.size_id);
    return presentAssessment(assess(candidateOf(row, size), requirement, policy), used, citationOf);
  }

  private async citationsOf(revisionId: number, sizeId: number): Promise<CitationOf> {
    const rows = await this.readers.select<CitationRow>(citationsSql, { revisionId, sizeId });
    const byField = new Map<string, CitationRow>();
    for (const row of rows) if (!byField.has(row.field)) byField.set(row.field, row);
    return (field) => {
      // A citation of a whole curve or body stands for each of its parts.
      const row = byField.get(field) ?? byField.get(field.split('.')[0] ?? field);
      if (row === undefined) return undefined;
      const datasheet = `${row.document_number}, revision ${row.revision}`;
      return { datasheetId: row.datasheet_id, datasheet, page: row.page, note: row.note ?? undefined };
    };
  }
}
