import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { IsOptional, IsString, MaxLength } from 'class-validator';
import { PageQuery } from '../../common/reading/page-query';
import { PersonRefDto } from '../../common/reading/person-ref.dto';
import { PartSummaryDto } from '../../parts/summary/part-summary.dto';

export class CompanyPartNumberQuery extends PageQuery {
  @ApiPropertyOptional({ description: 'Words that number and description together must all contain' })
  @IsOptional()
  @IsString()
  @MaxLength(100)
  q?: string;
}

export class CompanyPartNumberSummaryDto {
  @ApiProperty()
  id: number;

  @ApiProperty()
  number: string;

  @ApiProperty()
  description: string;

  @ApiProperty({ description: 'Number of parts that may be bought under it' })
  sources: number;

  @ApiProperty({ description: 'Of them, approved or preferred and in active supply' })
  soundSources: number;
}

export class CompanyPartNumberList {
  @ApiProperty()
  total: number;

  @ApiProperty({ type: [CompanyPartNumberSummaryDto] })
  items: CompanyPartNumberSummaryDto[];
}

/** A place in the approved manufacturer list. */
export class ApprovedSourceDto {
  @ApiProperty({ description: 'From 1' })
  position: number;

  @ApiProperty({ type: PersonRefDto })
  addedBy: PersonRefDto;

  @ApiProperty({ description: 'ISO 8601' })
  addedAt: string;

  @ApiProperty({ type: PartSummaryDto })
  part: PartSummaryDto;
}

export class CompanyPartNumberDto {
  @ApiProperty()
  id: number;

  @ApiProperty()
  number: string;

  @ApiProperty()
  description: string;

  @ApiProperty({ type: PersonRefDto })
  enteredBy: PersonRefDto;

  @ApiProperty({ description: 'ISO 8601' })
  enteredAt: string;

  @ApiProperty({ type: [ApprovedSourceDto], description: 'The approved manufacturer list, in its order' })
  sources: ApprovedSourceDto[];
}
