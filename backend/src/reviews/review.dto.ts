import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { approvals, type Approval } from '@resistry/engineering/ratings/technology';
import { IsIn, IsOptional } from 'class-validator';
import { PageQuery } from '../common/reading/page-query';
import { PersonRefDto } from '../common/reading/person-ref.dto';
import { OpenReviewDto } from '../parts/details/standing.dto';
import { PartSummaryDto } from '../parts/summary/part-summary.dto';

const states = ['open', 'closed'] as const;
type ReviewState = (typeof states)[number];

export class ReviewQuery extends PageQuery {
  @ApiPropertyOptional({ enum: states, default: 'open' })
  @IsOptional()
  @IsIn(states)
  state?: ReviewState;
}

export class ReviewDto extends OpenReviewDto {
  @ApiProperty({ type: PartSummaryDto })
  part: PartSummaryDto;

  @ApiProperty({ enum: states })
  state: ReviewState;

  @ApiPropertyOptional({ type: PersonRefDto })
  closedBy?: PersonRefDto;

  @ApiPropertyOptional({ description: 'ISO 8601' })
  closedAt?: string;

  @ApiPropertyOptional({ enum: approvals, description: 'Approval that closed it' })
  outcome?: Approval;
}

export class ReviewList {
  @ApiProperty()
  total: number;

  @ApiProperty({ type: [ReviewDto], description: 'Open ones the oldest first, closed ones the newest first' })
  items: ReviewDto[];
}
