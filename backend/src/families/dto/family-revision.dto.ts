import { ApiProperty, ApiPropertyOptional, OmitType } from '@nestjs/swagger';
import { seriesNames, type SeriesName } from '@resistry/engineering/preferred-values/series';
import type { Ratings } from '@resistry/engineering/ratings/ratings';
import { features, mountings, type Feature, type Mounting } from '@resistry/engineering/ratings/technology';
import { RatingsDto } from '../../assessments/dto/ratings.dto';
import { PersonRefDto } from '../../common/reading/person-ref.dto';
import { BodySizeDto, bodyStyles, SizeRefDto, type BodyStyle } from '../../parts/summary/part-summary.dto';
import { CitationDto, DatasheetDto } from './papers.dto';

const ofOnePart = ['resistance', 'tolerance', 'tcr', 'certificates'] as const;

/** Ratings that all parts of a size share; an absent one is not in the datasheet. */
export class SizeRatingsDto extends OmitType(RatingsDto, ofOnePart) {}

export type SharedRatings = Omit<Ratings, (typeof ofOnePart)[number]>;

export class OperatingModeDto {
  @ApiProperty()
  name: string;

  @ApiProperty({ type: SizeRatingsDto })
  ratings: SharedRatings;
}

export class FamilySizeDto {
  @ApiProperty({ type: SizeRefDto })
  size: SizeRefDto;

  @ApiProperty({ enum: bodyStyles })
  bodyStyle: BodyStyle;

  @ApiPropertyOptional({ type: BodySizeDto })
  body?: BodySizeDto;

  @ApiPropertyOptional({ enum: mountings })
  mounting?: Mounting;

  @ApiPropertyOptional()
  landPattern?: string;

  @ApiPropertyOptional()
  termination?: string;

  @ApiPropertyOptional()
  soldering?: string;

  @ApiProperty({ description: 'Number of parts of this size' })
  parts: number;

  @ApiProperty({ type: [OperatingModeDto], description: 'At least one; never mixed with one another' })
  modes: OperatingModeDto[];
}

/** A row of the range table. */
export class RangeDto {
  @ApiProperty({ type: SizeRefDto })
  size: SizeRefDto;

  @ApiProperty({ description: 'Fraction' })
  tolerance: number;

  @ApiPropertyOptional({ description: '1/K; absent where the datasheet states none' })
  tcr?: number;

  @ApiProperty({ description: 'Lowest resistance, Ω' })
  min: number;

  @ApiProperty({ description: 'Highest resistance, Ω' })
  max: number;

  @ApiProperty({ enum: seriesNames, isArray: true })
  series: SeriesName[];
}

export class PackagingDto {
  @ApiProperty({ type: SizeRefDto })
  size: SizeRefDto;

  @ApiProperty()
  code: string;

  @ApiProperty()
  description: string;

  @ApiProperty({ description: 'Pieces' })
  quantity: number;
}

/** An ordering code made by the template, beside what it stands for. */
export class OrderingCodeExampleDto {
  @ApiProperty()
  code: string;

  @ApiProperty({ description: 'Code of the size' })
  size: string;

  @ApiProperty({ description: 'Ω; 0 for a zero-ohm link' })
  resistance: number;

  @ApiPropertyOptional({ description: 'Fraction' })
  tolerance?: number;

  @ApiPropertyOptional({ description: '1/K' })
  tcr?: number;

  @ApiPropertyOptional({ description: 'Code of the packaging; absent where it is left open' })
  packaging?: string;
}

/** A revision in the list of all. */
export class RevisionRefDto {
  @ApiProperty()
  number: number;

  @ApiProperty({ enum: ['draft', 'published'] })
  state: 'draft' | 'published';

  @ApiProperty({ description: 'Its ratings are in force' })
  current: boolean;

  @ApiProperty()
  description: string;

  @ApiProperty({ type: PersonRefDto })
  enteredBy: PersonRefDto;

  @ApiProperty({ description: 'ISO 8601' })
  enteredAt: string;

  @ApiPropertyOptional({ type: PersonRefDto })
  publishedBy?: PersonRefDto;

  @ApiPropertyOptional({ description: 'ISO 8601' })
  publishedAt?: string;
}

/** A set of ratings of a family: once published, it never changes. */
export class FamilyRevisionDto extends RevisionRefDto {
  @ApiPropertyOptional({ type: DatasheetDto })
  datasheet?: DatasheetDto;

  @ApiPropertyOptional({ description: '°C; 20 °C per IEC 60115-1 where it is absent' })
  referenceTemperature?: number;

  @ApiPropertyOptional({ description: "Style in the failure-rate handbook's table" })
  failureRateStyle?: string;

  @ApiProperty({ enum: features, isArray: true })
  features: Feature[];

  @ApiProperty()
  orderingCodeTemplate: string;

  @ApiProperty({ type: [OrderingCodeExampleDto] })
  orderingCodeExamples: OrderingCodeExampleDto[];

  @ApiProperty({ type: [FamilySizeDto] })
  sizes: FamilySizeDto[];

  @ApiProperty({ type: [RangeDto] })
  ranges: RangeDto[];

  @ApiProperty({ type: [PackagingDto] })
  packagings: PackagingDto[];

  @ApiProperty({ type: [CitationDto] })
  citations: CitationDto[];
}
