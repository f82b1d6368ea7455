import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import {
  approvals,
  supplyStatuses,
  type Approval,
  type SupplyStatus,
} from '@resistry/engineering/ratings/technology';
import { PersonRefDto } from '../../common/reading/person-ref.dto';

/** What a restricted part may be used for. */
export class RestrictionDto {
  @ApiProperty()
  words: string;

  @ApiPropertyOptional({ description: 'Absent where it holds everywhere' })
  scope?: string;
}

class StepDto {
  @ApiProperty()
  reason: string;

  @ApiProperty({ type: PersonRefDto })
  changedBy: PersonRefDto;

  @ApiProperty({ description: 'ISO 8601' })
  changedAt: string;
}

export class ApprovalStepDto extends StepDto {
  @ApiPropertyOptional({ enum: approvals })
  from?: Approval;

  @ApiProperty({ enum: approvals })
  to: Approval;

  @ApiPropertyOptional({ description: 'Of a restriction' })
  words?: string;

  @ApiPropertyOptional({ description: 'Of a restriction' })
  scope?: string;

  @ApiPropertyOptional({ description: 'Why a part without a second source was promoted all the same' })
  exception?: string;
}

export class SupplyStepDto extends StepDto {
  @ApiPropertyOptional({ enum: supplyStatuses })
  from?: SupplyStatus;

  @ApiProperty({ enum: supplyStatuses })
  to: SupplyStatus;

  @ApiPropertyOptional({ description: 'Day, ISO 8601' })
  lastOrderOn?: string;
}

export const reviewCauses = ['left-active-supply', 'lost-second-source', 'submitted'] as const;
export type ReviewCause = (typeof reviewCauses)[number];

export class OpenReviewDto {
  @ApiProperty()
  id: number;

  @ApiProperty({ enum: reviewCauses })
  cause: ReviewCause;

  @ApiProperty()
  words: string;

  @ApiProperty({ type: PersonRefDto })
  openedBy: PersonRefDto;

  @ApiProperty({ description: 'ISO 8601' })
  openedAt: string;
}
