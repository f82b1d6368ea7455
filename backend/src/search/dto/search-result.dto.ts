import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { checkNames, type CheckName } from '@resistry/engineering/checks/check';
import { AssessmentDto } from '../../assessments/dto/assessment.dto';
import { CompanyNumberRefDto, PartSummaryDto } from '../../parts/summary/part-summary.dto';

/** A part with its own assessment. */
export class AssessedPartDto {
  @ApiProperty({ type: PartSummaryDto })
  part: PartSummaryDto;

  @ApiProperty({ type: AssessmentDto })
  assessment: AssessmentDto;
}

/** A row: a part, or a company part number with the worst of its approved sources first. */
export class SearchItemDto extends AssessedPartDto {
  @ApiPropertyOptional({
    type: CompanyNumberRefDto,
    description: 'The company part number the row stands for, when grouped',
  })
  companyPartNumber?: CompanyNumberRefDto;

  @ApiPropertyOptional({ type: [AssessedPartDto], description: 'Every judged source, when grouped' })
  sources?: AssessedPartDto[];

  @ApiProperty({ type: [String], description: 'Over-specification, named' })
  overSpecification: string[];
}

export class KnockoutDto {
  @ApiProperty({ enum: checkNames })
  check: CheckName;

  @ApiProperty({
    description: 'Unmet at this check; value counts over all, the others over what value leaves',
  })
  removes: number;

  @ApiProperty({ description: 'Unmet at this check and at no other' })
  removesAlone: number;
}

export class RelaxationDto {
  @ApiProperty({ description: 'JSON pointer into the duty' })
  field: string;

  @ApiProperty({
    oneOf: [
      { type: 'number' },
      { type: 'string' },
      { type: 'boolean' },
      { type: 'array', items: { type: 'string' } },
    ],
  })
  to: unknown;

  @ApiProperty({ description: 'Searching again with it gives the total and these' })
  gains: number;
}

/** What a search found: exact counts over the whole catalogue, and one page. */
export class SearchResultDto {
  @ApiProperty()
  total: number;

  @ApiProperty({ description: 'Neither met nor unmet: data are missing' })
  unrated: number;

  @ApiProperty({
    type: 'object',
    additionalProperties: { type: 'number' },
    description: 'The total by approval',
  })
  byApproval: Partial<Record<string, number>>;

  @ApiProperty({ type: [SearchItemDto] })
  items: SearchItemDto[];

  @ApiProperty({ type: [KnockoutDto] })
  knockouts: KnockoutDto[];

  @ApiProperty({ type: [RelaxationDto] })
  relaxations: RelaxationDto[];

  @ApiProperty()
  page: number;

  @ApiProperty()
  pageSize: number;
}
