import { Injectable } from '@nestjs/common';
import type { Feature } from '@resistry/engineering/ratings/technology';
import { NotFoundProblem } from '../common/problems/problems';
import { Readers } from '../database/readers';
import type { FamilyRevisionDto, RevisionRefDto } from './dto/family-revision.dto';
import { FamilyPapers } from './family-papers';
import { OrderingCodeExamples } from './ordering-code-examples';
import { presentPackaging, presentRange, presentRevisionRef, presentSizes } from './present-revision';
import {
  type PackagingRow,
  packagingsSql,
  type RangeRow,
  rangesSql,
  type RevisionHeadRow,
  revisionHeadSql,
  type RevisionRow,
  type RevisionSizeRow,
  revisionSizesSql,
  revisionsSql,
} from './revision-rows';

/** Reading the revisions of families. */
@Injectable()
export class FamilyRevisions {
  constructor(
    private readonly readers: Readers,
    private readonly papers: FamilyPapers,
    private readonly examples: OrderingCodeExamples,
  ) {}

  /** The newest first. */
  async list(familyId: number): Promise<RevisionRefDto[]> {
    const rows = await this.readers.select<RevisionRow>(
      `${revisionsSql} WHERE r.family_id = $familyId ORDER BY r.number DESC`,
      { familyId },
    );
    return rows.map(presentRevisionRef);
  }

  /** @throws NotFoundProblem */
  async find(familyId: number, number: number): Promise<FamilyRevisionDto> {
    const row = await this.readers.lookUp<RevisionRow>(
      `${revisionsSql} WHERE r.family_id = $familyId AND r.number = $number`,
      { familyId, number },
    );
    const revisionId = row?.id ?? null;
    const head = await this.readers.lookUp<RevisionHeadRow>(revisionHeadSql, { revisionId });
    if (!row || !head) throw new NotFoundProblem('There is no such revision of this family.');
    const datasheets = await this.papers.datasheets(familyId);
    const template = head.ordering_code_template;
    return Object.assign(presentRevisionRef(row), {
      datasheet: datasheets.find(({ id }) => id === head.datasheet_id),
      referenceTemperature: head.reference_temperature_celsius ?? undefined,
      failureRateStyle: head.failure_rate_style ?? undefined,
      features: JSON.parse(head.features) as Feature[],
      orderingCodeTemplate: template,
      orderingCodeExamples: await this.examples.of(
        { id: familyId, code: head.family_code },
        { id: row.id, template },
      ),
      sizes: presentSizes(await this.readers.select<RevisionSizeRow>(revisionSizesSql, { revisionId })),
      ranges: (await this.readers.select<RangeRow>(rangesSql, { revisionId })).map(presentRange),
      packagings: (await this.readers.select<PackagingRow>(packagingsSql, { revisionId })).map(
        presentPackaging,
      ),
      citations: await this.papers.citations(row.id),
    });
  }
}
