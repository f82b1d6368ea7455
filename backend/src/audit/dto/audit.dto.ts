import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { IsInt, IsOptional, IsString, Max, MaxLength, Min } from 'class-validator';
import { Moment } from '../../common/validation/moment';
import { NumberFromText } from '../../common/validation/query-values';

export class AuditQuery {
  @ApiProperty({ required: false, description: 'Kind of thing, such as Part' })
  @IsOptional()
  @IsString()
  @MaxLength(60)
  subjectType?: string;

  @ApiProperty({ required: false })
  @IsOptional()
  @IsString()
  @MaxLength(100)
  subjectId?: string;

  @ApiProperty({ required: false, description: 'Id of the person who acted' })
  @IsOptional()
  @NumberFromText()
  @IsInt()
  @Min(1)
  @Max(Number.MAX_SAFE_INTEGER)
  actor?: number;

  @ApiProperty({ required: false })
  @IsOptional()
  @IsString()
  @MaxLength(60)
  action?: string;

  @ApiProperty({
    required: false,
    description: 'Found in the reason, the name of the actor or the changed fields',
  })
  @IsOptional()
  @IsString()
  @MaxLength(100)
  text?: string;

  @ApiProperty({ required: false, description: 'ISO 8601, inclusive' })
  @IsOptional()
  @Moment()
  from?: string;

  @ApiProperty({ required: false, description: 'ISO 8601, exclusive' })
  @IsOptional()
  @Moment()
  to?: string;

  @ApiProperty({ required: false, description: 'The `next` of the page before' })
  @IsOptional()
  @NumberFromText()
  @IsInt()
  @Min(1)
  @Max(Number.MAX_SAFE_INTEGER)
  before?: number;

  @ApiProperty({ required: false, minimum: 1, maximum: 200, default: 50 })
  @IsOptional()
  @NumberFromText()
  @IsInt()
  @Min(1)
  @Max(200)
  limit?: number;
}

export class AuditEntry {
  @ApiProperty()
  id: number;

  @ApiProperty({ description: 'ISO 8601' })
  recordedAt: string;

  @ApiProperty({ required: false, description: 'Absent where no person acted' })
  actorId?: number;

  @ApiProperty()
  actorName: string;

  @ApiProperty()
  action: string;

  @ApiProperty()
  subjectType: string;

  @ApiProperty()
  subjectId: string;

  @ApiPropertyOptional({ type: 'object', additionalProperties: true })
  before?: Record<string, unknown>;

  @ApiPropertyOptional({ type: 'object', additionalProperties: true })
  after?: Record<string, unknown>;

  @ApiProperty({ required: false })
  reason?: string;
}

export class AuditPage {
  @ApiProperty({ type: [AuditEntry] })
  items: AuditEntry[];

  @ApiProperty({ required: false, description: 'Send as `before` for the next page; absent on the last one' })
  next?: number;
}
