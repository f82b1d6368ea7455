import { Injectable } from '@nestjs/common';
import { NotFoundProblem } from '../../common/problems/problems';
import { Readers } from '../../database/readers';
import { FamilyPapers } from '../../families/family-papers';
import { OfferReading } from '../../offers/offer-reading';
import { modesOfPart } from '../ratings/size-ratings';
import { SizeRatingsReader } from '../ratings/size-ratings-reader';
import { PartSummaries, presentPartSummary, type PartRow } from '../summary/part-summaries';
import type { PartDetailsDto } from './part-details.dto';
import { PartPurchasingReading } from './part-purchasing-reading';
import { PartStandingReading } from './part-standing-reading';

interface DetailsRow {
  version: number;
  restriction_words: string | null;
  restriction_scope: string | null;
  last_order_on: string | null;
  entered_by: number;
  entered_by_name: string;
  entered_at: string;
  land_pattern: string | null;
  termination: string | null;
  soldering: string | null;
  revision_id: number;
  revision_number: number;
  published_at: string;
  ordering_code_template: string;
  datasheet_id: number | null;
  document_number: string | null;
  datasheet_revision: string | null;
}

const DETAILS = `
  SELECT p.version, p.restriction_words, p.restriction_scope, p.last_order_on, p.entered_by, u.name AS entered_by_name,
    p.entered_at, z.land_pattern, z.termination, z.soldering, r.id AS revision_id, r.number AS revision_number,
    r.published_at, r.ordering_code_template, d.id AS datasheet_id, d.document_number, d.revision AS datasheet_revision
  FROM parts AS p JOIN users AS u ON u.id = p.entered_by JOIN families AS f ON f.id = p.family_id
    JOIN family_revisions AS r ON r.id = f.current_revision_id
    JOIN size_ratings AS z ON z.revision_id = r.id AND z.size_id = p.size_id
    LEFT JOIN datasheets AS d ON d.id = r.datasheet_id
  WHERE p.id = $id`;

/** Reading everything about one part. */
@Injectable()
export class PartDetails {
  constructor(
    private readonly readers: Readers,
    private readonly summaries: PartSummaries,
    private readonly sizeRatings: SizeRatingsReader,
    private readonly papers: FamilyPapers,
    private readonly purchasing: PartPurchasingReading,
    private readonly offerReading: OfferReading,
    private readonly standing: PartStandingReading,
  ) {}

  /** @throws NotFoundProblem */
  async find(id: number): Promise<PartDetailsDto> {
    const summary = (await this.summaries.rows([id])).get(id);
    const row = await this.readers.lookUp<DetailsRow>(DETAILS, { id });
    const size = summary && (await this.sizeRatings.ofSizes([summary.size_id])).get(summary.size_id);
    if (!summary || !row || !size) throw new NotFoundProblem(`There is no part ${id}.`);
    const [citations, orderingCodes, sources, offers, declarations, certificates] = await Promise.all([
      this.papers.citations(row.revision_id, summary.size_id),
      this.purchasing.orderingCodes(
        { id: row.revision_id, template: row.ordering_code_template },
        summary.size_id,
        orderedPartOf(summary),
      ),
      summary.company_part_number_id === null ? [] : this.purchasing.sources(summary.company_part_number_id),
      this.offerReading.ofPart(id),
      this.papers.declarations(summary.family_id),
      this.papers.certificates(summary.family_id, summary.size_id),
    ]);
    return Object.assign(presentPartSummary(summary), presentDetails(row), {
      modes: modesOfPart(size, {
        resistance: summary.resistance_ohm,
        tolerance: summary.tolerance_fraction,
        tcr: summary.tcr_per_kelvin,
      }),
      citations,
      orderingCodes,
      sources,
      offers,
      approvalHistory: await this.standing.approvalHistory(id),
      supplyHistory: await this.standing.supplyHistory(id),
      openReviews: await this.standing.openReviews(id),
      declarations,
      certificates,
    });
  }
}

function orderedPartOf(row: PartRow): Parameters<PartPurchasingReading['orderingCodes']>[2] {
  return {
    familyCode: row.family_code,
    sizeCode: row.size_code,
    resistance: row.resistance_ohm,
    tolerance: row.tolerance_fraction,
    tcr: row.tcr_per_kelvin,
  };
}

function presentDetails(
  row: DetailsRow,
): Pick<
  PartDetailsDto,
  | 'version'
  | 'enteredBy'
  | 'enteredAt'
  | 'landPattern'
  | 'termination'
  | 'soldering'
  | 'revision'
  | 'restriction'
  | 'lastOrderOn'
> {
  const { datasheet_id: datasheetId, document_number: documentNumber, datasheet_revision: revision } = row;
  return {
    version: row.version,
    enteredBy: { id: row.entered_by, name: row.entered_by_name },
    enteredAt: row.entered_at,
    landPattern: row.land_pattern ?? undefined,
    termination: row.termination ?? undefined,
    soldering: row.soldering ?? undefined,
    revision: {
      id: row.revision_id,
      number: row.revision_number,
      publishedAt: row.published_at,
      datasheet:
        datasheetId === null || documentNumber === null || revision === null
          ? undefined
          : { id: datasheetId, documentNumber, revision },
    },
    restriction:
      row.restriction_words === null
        ? undefined
        : { words: row.restriction_words, scope: row.restriction_scope ?? undefined },
    lastOrderOn: row.last_order_on ?? undefined,
  };
}
