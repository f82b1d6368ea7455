import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import type { Ratings } from '@resistry/engineering/ratings/ratings';
import { RatingsDto } from '../../assessments/dto/ratings.dto';
import { PersonRefDto } from '../../common/reading/person-ref.dto';
import { CertificateDto, CitationDto, DatasheetRefDto, DeclarationDto } from '../../families/dto/papers.dto';
import { PartSummaryDto } from '../summary/part-summary.dto';
import { OfferDto } from '../../offers/dto/offer.dto';
import { OrderingCodeDto, SourceDto } from './purchasing.dto';
import { ApprovalStepDto, OpenReviewDto, RestrictionDto, SupplyStepDto } from './standing.dto';

export class PartModeDto {
  @ApiPropertyOptional({ description: 'Absent where the size has one operating mode only' })
  name?: string;

  @ApiProperty({ type: RatingsDto })
  ratings: Ratings;
}

/** The revision from which the ratings come. */
export class RatingsRevisionDto {
  @ApiProperty()
  id: number;

  @ApiProperty()
  number: number;

  @ApiProperty({ description: 'ISO 8601' })
  publishedAt: string;

  @ApiPropertyOptional({ type: DatasheetRefDto })
  datasheet?: DatasheetRefDto;
}

/** Everything that the catalogue knows of a part. */
export class PartDetailsDto extends PartSummaryDto {
  @ApiProperty({ description: 'Of the part’s standing; send it with a change' })
  version: number;

  @ApiProperty({ type: PersonRefDto })
  enteredBy: PersonRefDto;

  @ApiProperty({ description: 'ISO 8601' })
  enteredAt: string;

  @ApiPropertyOptional()
  landPattern?: string;

  @ApiPropertyOptional()
  termination?: string;

  @ApiPropertyOptional()
  soldering?: string;

  @ApiProperty({ type: RatingsRevisionDto })
  revision: RatingsRevisionDto;

  @ApiProperty({ type: [PartModeDto], description: 'Operating modes, never mixed with one another' })
  modes: PartModeDto[];

  @ApiProperty({ type: [CitationDto], description: 'Where each rating stands' })
  citations: CitationDto[];

  @ApiProperty({ type: [OrderingCodeDto], description: 'Full ordering codes, one a packaging' })
  orderingCodes: OrderingCodeDto[];

  @ApiProperty({
    type: [SourceDto],
    description: 'What may be bought under the company part number, this part included; empty without one',
  })
  sources: SourceDto[];

  @ApiProperty({ type: [OfferDto], description: 'Those in force first' })
  offers: OfferDto[];

  @ApiPropertyOptional({ type: RestrictionDto, description: 'Of a restricted part' })
  restriction?: RestrictionDto;

  @ApiPropertyOptional({ description: 'Day, ISO 8601' })
  lastOrderOn?: string;

  @ApiProperty({ type: [ApprovalStepDto], description: 'The newest first' })
  approvalHistory: ApprovalStepDto[];

  @ApiProperty({ type: [SupplyStepDto], description: 'The newest first' })
  supplyHistory: SupplyStepDto[];

  @ApiProperty({ type: [OpenReviewDto] })
  openReviews: OpenReviewDto[];

  @ApiProperty({ type: [DeclarationDto] })
  declarations: DeclarationDto[];

  @ApiProperty({ type: [CertificateDto], description: 'Those that cover the size' })
  certificates: CertificateDto[];
}
