import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import type { Colour } from '@resistry/engineering/marking/colours';
import type { MarkingKind } from '@resistry/engineering/marking/reading';
import { quantities, type Quantity } from '@resistry/engineering/notation/quantity';
import { seriesNames, type SeriesName } from '@resistry/engineering/preferred-values/series';
import { IsIn, IsNumber, IsOptional, IsString, MaxLength } from 'class-validator';
import { NumberFromText } from '../../common/validation/query-values';

export class NotationQuery {
  @ApiProperty({ description: 'As typed, e.g. 4k7' })
  @IsString()
  @MaxLength(100)
  text: string;

  @ApiProperty({ enum: quantities })
  @IsIn(quantities)
  quantity: Quantity;
}

export class NotationDto {
  @ApiProperty({ description: 'SI' })
  value: number;

  @ApiProperty({ description: 'As it is printed, e.g. 4.7 kΩ' })
  text: string;

  @ApiPropertyOptional({ description: 'Fraction, where the text of a resistance carries one' })
  tolerance?: number;
}

export class PreferredValuesQuery {
  @ApiProperty({ enum: seriesNames })
  @IsIn(seriesNames)
  series: SeriesName;

  @ApiProperty({ description: 'Ω' })
  @NumberFromText()
  @IsNumber()
  from: number;

  @ApiProperty({ description: 'Ω' })
  @NumberFromText()
  @IsNumber()
  to: number;
}

export class PreferredValuesDto {
  @ApiProperty({ type: [Number], description: 'Ω, rising, both ends included' })
  values: number[];
}

export class MarkingQuery {
  @ApiPropertyOptional({ description: 'Characters on the body' })
  @IsOptional()
  @IsString()
  @MaxLength(100)
  text?: string;

  @ApiPropertyOptional({ description: 'Ω' })
  @IsOptional()
  @NumberFromText()
  @IsNumber()
  resistance?: number;

  @ApiPropertyOptional({ description: 'Fraction' })
  @IsOptional()
  @NumberFromText()
  @IsNumber()
  tolerance?: number;

  @ApiPropertyOptional({ description: '1/K' })
  @IsOptional()
  @NumberFromText()
  @IsNumber()
  tcr?: number;
}

const markingKinds = [
  'colour-bands',
  'letter-code',
  'three-character',
  'four-character',
  'two-digit-and-letter',
  'link',
] as const satisfies readonly MarkingKind[];

export class MarkingReadingDto {
  @ApiProperty({ enum: markingKinds })
  kind: MarkingKind;

  @ApiProperty({ description: 'Ω' })
  resistance: number;

  @ApiPropertyOptional({ description: 'Fraction' })
  tolerance?: number;

  @ApiPropertyOptional({ description: '1/K' })
  tcr?: number;
}

export class MarkingFormDto {
  @ApiProperty({ enum: markingKinds })
  kind: MarkingKind;

  @ApiPropertyOptional()
  text?: string;

  @ApiPropertyOptional({ type: [String] })
  bands?: readonly Colour[];
}

export class MarkingDto {
  @ApiPropertyOptional({ type: [MarkingReadingDto], description: 'Everything the text can mean' })
  readings?: MarkingReadingDto[];

  @ApiPropertyOptional({ type: [MarkingFormDto], description: 'The forms a resistance can bear' })
  forms?: MarkingFormDto[];
}
