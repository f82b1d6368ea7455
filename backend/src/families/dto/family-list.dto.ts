import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { technologies, type Approval, type Technology } from '@resistry/engineering/ratings/technology';
import { IsIn, IsInt, IsOptional, IsString, Max, MaxLength, Min } from 'class-validator';
import { NumberFromText } from '../../common/validation/query-values';
import { NamedDto } from '../../parts/summary/part-summary.dto';

export class FamilyQuery {
  @ApiPropertyOptional({ description: 'Words that code, name and manufacturer together must all contain' })
  @IsOptional()
  @IsString()
  @MaxLength(100)
  q?: string;

  @ApiPropertyOptional({ enum: technologies })
  @IsOptional()
  @IsIn(technologies)
  technology?: Technology;

  @ApiPropertyOptional({ type: 'integer', description: 'Id of the manufacturer' })
  @IsOptional()
  @NumberFromText()
  @IsInt()
  @Min(1)
  @Max(Number.MAX_SAFE_INTEGER)
  manufacturer?: number;
}

/** The revision of a family whose ratings are in force. */
export class CurrentRevisionRefDto {
  @ApiProperty()
  number: number;

  @ApiProperty({ description: 'ISO 8601' })
  publishedAt: string;
}

export class FamilySummaryDto {
  @ApiProperty()
  id: number;

  @ApiProperty()
  code: string;

  @ApiProperty()
  name: string;

  @ApiProperty({ type: NamedDto })
  manufacturer: NamedDto;

  @ApiProperty({ enum: technologies })
  technology: Technology;

  @ApiPropertyOptional({ type: CurrentRevisionRefDto, description: 'Absent before the first publication' })
  revision?: CurrentRevisionRefDto;

  @ApiProperty({ description: 'Number of sizes' })
  sizes: number;

  @ApiProperty({ description: 'Number of parts' })
  parts: number;

  @ApiProperty({
    type: 'object',
    additionalProperties: { type: 'number' },
    description: 'Number of parts by approval, every approval named',
  })
  approvals: Record<Approval, number>;
}

export class FamilyListDto {
  @ApiProperty({ type: [FamilySummaryDto] })
  items: FamilySummaryDto[];
}
