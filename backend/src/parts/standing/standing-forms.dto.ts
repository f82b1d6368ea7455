import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import {
  type Approval,
  approvals,
  supplyStatuses,
  type SupplyStatus,
} from '@resistry/engineering/ratings/technology';
import { IsIn, IsInt, IsOptional, IsString, Max, Min } from 'class-validator';
import { Day } from '../../common/validation/day';
import { Prose } from '../../common/validation/prose';

class ReasonedForm {
  @Prose()
  reason: string;

  @ApiProperty({ type: 'integer', minimum: 1, description: 'Version of the part that the change is made on' })
  @IsInt()
  @Min(1)
  @Max(Number.MAX_SAFE_INTEGER)
  version: number;
}

export class ApprovalChangeForm extends ReasonedForm {
  @ApiProperty({ enum: approvals })
  @IsIn(approvals)
  to: Approval;

  @Prose({ optional: true, description: 'Of a restriction: what the part may be used for' })
  words?: string;

  @Prose({ optional: true, description: 'Of a restriction: where it holds' })
  scope?: string;

  @Prose({ optional: true, description: 'Of a promotion: why one source will do' })
  exception?: string;
}

export class SupplyChangeForm extends ReasonedForm {
  @ApiProperty({ enum: supplyStatuses })
  @IsIn(supplyStatuses)
  to: SupplyStatus;

  @ApiPropertyOptional({ description: 'Day, ISO 8601; a last-time buy needs it' })
  @IsOptional()
  @IsString()
  @Day()
  lastOrderDate?: string;
}
