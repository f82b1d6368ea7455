import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import {
  approvals,
  mountings,
  supplyStatuses,
  technologies,
  type Approval,
  type Mounting,
  type SupplyStatus,
  type Technology,
} from '@resistry/engineering/ratings/technology';

/** Something with an id, a code and a name. */
export class NamedDto {
  @ApiProperty()
  id: number;

  @ApiProperty()
  code: string;

  @ApiProperty()
  name: string;
}

/** Company part number of a part. */
export class CompanyNumberRefDto {
  @ApiProperty()
  id: number;

  @ApiProperty()
  number: string;
}

export class SizeRefDto {
  @ApiProperty()
  id: number;

  @ApiProperty({ description: 'Inch code of a chip, or the trade’s code of the body' })
  code: string;

  @ApiPropertyOptional({ description: 'Metric code of a chip' })
  metricCode?: string;
}

export class BodySizeDto {
  @ApiProperty({ description: 'm' })
  length: number;

  @ApiProperty({ description: 'm' })
  width: number;

  @ApiProperty({ description: 'm' })
  height: number;
}

export const bodyStyles = ['chip', 'melf', 'axial', 'cemented', 'housed', 'strip', 'radial'] as const;
export type BodyStyle = (typeof bodyStyles)[number];

/** A part in a list: what identifies it, what it is chosen by, how it stands. */
export class PartSummaryDto {
  @ApiProperty()
  id: number;

  @ApiProperty()
  manufacturerPartNumber: string;

  @ApiPropertyOptional({ type: CompanyNumberRefDto })
  companyPartNumber?: CompanyNumberRefDto;

  @ApiProperty({ type: NamedDto })
  manufacturer: NamedDto;

  @ApiProperty({ type: NamedDto })
  family: NamedDto;

  @ApiProperty({ enum: technologies })
  technology: Technology;

  @ApiProperty({ type: SizeRefDto })
  size: SizeRefDto;

  @ApiProperty({ enum: bodyStyles })
  bodyStyle: BodyStyle;

  @ApiPropertyOptional({ type: BodySizeDto })
  body?: BodySizeDto;

  @ApiPropertyOptional({ enum: mountings })
  mounting?: Mounting;

  @ApiProperty({ description: 'Ω; 0 for a zero-ohm link' })
  resistance: number;

  @ApiPropertyOptional({ description: 'Fraction; absent for a link' })
  tolerance?: number;

  @ApiPropertyOptional({ description: '1/K; absent where the datasheet states none' })
  tcr?: number;

  @ApiPropertyOptional({ description: 'W, in the first operating mode' })
  ratedDissipation?: number;

  @ApiProperty({ enum: approvals })
  approval: Approval;

  @ApiProperty({ enum: supplyStatuses })
  supply: SupplyStatus;

  @ApiPropertyOptional({
    description: 'Lowest unit price at 1000 pieces in force today, EUR; absent where no offer is in force',
  })
  unitPrice?: number;

  @ApiProperty({
    description: 'Another manufacturer’s approved and active part stands under the same company part number',
  })
  secondSource: boolean;
}
