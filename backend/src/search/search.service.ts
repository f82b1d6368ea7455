import { Injectable } from '@nestjs/common';
import { assess } from '@resistry/engineering/assessment/assess';
import type { Requirement } from '@resistry/engineering/duty/requirement';
import { presentAssessment } from '../assessments/present-assessment';
import { requirementOfDuty } from '../assessments/requirement-of-duty';
import { PartText } from '../parts/part-text';
import type { SizeRatings } from '../parts/ratings/size-ratings';
import {
  candidateOf,
  PartSummaries,
  presentPartSummary,
  type PartRow,
} from '../parts/summary/part-summaries';
import type { ResolvedPolicy } from '../policies/policy-choice';
import { PoliciesService } from '../policies/policies.service';
import type { SearchRequest } from './dto/search-request.dto';
import type { AssessedPartDto, SearchItemDto, SearchResultDto } from './dto/search-result.dto';
import type { FoundItem, PartFilters, Sort, SortColumn } from './engine/search-plan';
import { overSpecificationOf } from './over-specification';
import { SearchIndex } from './search-index';

const defaultPageSize = 50;

/** Finds the parts that meet a duty. */
@Injectable()
export class SearchService {
  constructor(
    private readonly index: SearchIndex,
    private readonly parts: PartSummaries,
    private readonly partText: PartText,
    private readonly policies: PoliciesService,
  ) {}

  /** @param gone aborted when nobody waits for the answer any more */
  async search(request: SearchRequest, gone?: AbortSignal): Promise<SearchResultDto> {
    const duty = request.duty ?? {};
    const requirement = requirementOfDuty(duty);
    const resolved = await this.policies.resolve(request.policy);
    const page = request.page ?? 1;
    const pageSize = request.pageSize ?? defaultPageSize;
    const { items, total, unrated, byApproval, knockouts, relaxations } = await this.index.search(
      {
        duty,
        policy: resolved.policy,
        filters: await this.filtersOf(request),
        showUnrated: request.show === 'met-and-unrated',
        byCompanyNumber: request.group === 'company',
        sort: sortOf(request.sort),
        offset: (page - 1) * pageSize,
        limit: pageSize,
        relaxations: page === 1,
      },
      gone,
    );
    const shown = await this.present(items, requirement, resolved);
    return { total, unrated, byApproval, items: shown, knockouts, relaxations, page, pageSize };
  }

  private async filtersOf({ filters }: SearchRequest): Promise<PartFilters> {
    if (filters === undefined) return {};
    const { text } = filters;
    if (text === undefined || text.trim() === '') return filters;
    return Object.assign({}, filters, { partIds: await this.partText.idsOf(text) });
  }

  private async present(
    items: readonly FoundItem[],
    requirement: Requirement,
    resolved: ResolvedPolicy,
  ): Promise<SearchItemDto[]> {
    const ratings = await this.index.ratings();
    const rows = await this.parts.rows(items.flatMap(({ partId, sourceIds }) => sourceIds ?? [partId]));
    const assessed = (id: number): AssessedPartDto | undefined => {
      const row = rows.get(id);
      const size = row && ratings.get(row.size_id);
      return row === undefined || size === undefined
        ? undefined
        : assessedPart(row, size, requirement, resolved);
    };
    return items.flatMap((item) => {
      const worst = assessed(item.partId);
      if (worst === undefined) return [];
      const { part, assessment } = worst;
      const overSpecification = overSpecificationOf(assessment.excess);
      if (item.sourceIds === undefined) return [{ part, assessment, overSpecification }];
      const sources = item.sourceIds.map(assessed).filter((source) => source !== undefined);
      return [
        {
          part,
          assessment,
          overSpecification,
          companyPartNumber: part.companyPartNumber,
          sources: sources.map((source) => ({ part: source.part, assessment: source.assessment })),
        },
      ];
    });
  }
}

function assessedPart(
  row: PartRow,
  size: SizeRatings,
  requirement: Requirement,
  { policy, used }: ResolvedPolicy,
): AssessedPartDto {
  return {
    part: presentPartSummary(row),
    assessment: presentAssessment(assess(candidateOf(row, size), requirement, policy), used),
  };
}

function sortOf(text: string | undefined): Sort {
  if (text === undefined) return { by: 'preference', descending: false };
  const descending = text.startsWith('-');
  return { by: text.slice(descending ? 1 : 0) as SortColumn, descending };
}
