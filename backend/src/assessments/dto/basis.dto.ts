import { ApiExtraModels, ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import type { BasisInput } from '@resistry/engineering/checks/basis';

/** Where a number stands in a datasheet. */
export class BasisCitationDto {
  @ApiProperty()
  datasheetId: number;

  @ApiProperty({ description: 'Document number and revision' })
  datasheet: string;

  @ApiProperty()
  page: number;

  @ApiPropertyOptional()
  note?: string;
}

/** One number or word that went into a result. */
export class BasisInputDto {
  @ApiProperty()
  name: string;

  @ApiPropertyOptional()
  symbol?: string;

  @ApiProperty({ oneOf: [{ type: 'number' }, { type: 'string' }] })
  value: number | string;

  @ApiPropertyOptional()
  unit?: string;

  @ApiProperty({ enum: ['duty', 'ratings', 'policy', 'derived', 'catalogue'] })
  from: BasisInput['from'];

  @ApiPropertyOptional({ description: 'Field of the ratings, the duty or the policy' })
  field?: string;

  @ApiPropertyOptional({ type: BasisCitationDto })
  citation?: BasisCitationDto;
}

/** Why a number is what it is. */
@ApiExtraModels(BasisInputDto)
export class BasisDto {
  @ApiProperty()
  words: string;

  @ApiPropertyOptional()
  formula?: string;

  @ApiProperty({ type: [BasisInputDto] })
  inputs: BasisInputDto[];

  @ApiProperty()
  source: string;

  @ApiProperty({ type: [String] })
  notes: readonly string[];
}
