import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { technologies, type Technology } from '@resistry/engineering/ratings/technology';
import { IsInt, IsOptional, IsString, Max, MaxLength, Min } from 'class-validator';
import { Filled } from '../common/validation/filled';
import { NumberFromText } from '../common/validation/query-values';
import { NamedDto, PartSummaryDto } from '../parts/summary/part-summary.dto';

export class TextSearchQuery {
  @ApiProperty({
    description: 'Words, all of which must be found; every character means itself',
    maxLength: 100,
  })
  @IsString()
  @Filled()
  @MaxLength(100)
  q: string;

  @ApiPropertyOptional({
    type: 'integer',
    minimum: 1,
    maximum: 50,
    default: 10,
    description: 'Most items of each kind',
  })
  @IsOptional()
  @NumberFromText()
  @IsInt()
  @Min(1)
  @Max(50)
  limit?: number;
}

export class FamilyHitDto extends NamedDto {
  @ApiProperty({ type: NamedDto })
  manufacturer: NamedDto;

  @ApiProperty({ enum: technologies })
  technology: Technology;
}

export class PartHits {
  @ApiProperty({ description: 'Number of all that were found' })
  total: number;

  @ApiProperty({ type: [PartSummaryDto] })
  items: PartSummaryDto[];
}

export class FamilyHits {
  @ApiProperty({ description: 'Number of all that were found' })
  total: number;

  @ApiProperty({ type: [FamilyHitDto] })
  items: FamilyHitDto[];
}

export class ManufacturerHits {
  @ApiProperty({ description: 'Number of all that were found' })
  total: number;

  @ApiProperty({ type: [NamedDto] })
  items: NamedDto[];
}

/** What a text was found in, by kind of thing. */
export class TextSearchResult {
  @ApiProperty({ type: PartHits })
  parts: PartHits;

  @ApiProperty({ type: FamilyHits })
  families: FamilyHits;

  @ApiProperty({ type: ManufacturerHits })
  manufacturers: ManufacturerHits;
}
