import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { PartSummaryDto } from '../summary/part-summary.dto';
import { type Difference, type Sense, senses } from './differences';

export class DifferenceDto implements Difference {
  @ApiProperty({ description: 'Field of the ratings' })
  field: string;

  @ApiProperty({ enum: senses, description: 'unknown: one of the two does not state it' })
  sense: Sense;

  @ApiPropertyOptional({ description: 'Of the part, with its unit; absent where it is not stated' })
  own?: string;

  @ApiPropertyOptional({ description: 'Of the alternate, with its unit; absent where it is not stated' })
  alternate?: string;
}

/** A part of equal form, fit and function. */
export class AlternateDto {
  @ApiProperty({ type: PartSummaryDto })
  part: PartSummaryDto;

  @ApiProperty({ description: 'Stands under the same company part number' })
  sameCompanyPartNumber: boolean;

  @ApiProperty()
  otherManufacturer: boolean;

  @ApiProperty({ description: 'Approved or preferred, and in active supply' })
  sound: boolean;

  @ApiPropertyOptional({
    description: 'Operating mode of the alternate in which it is compared, where it has several',
  })
  mode?: string;

  @ApiProperty({ type: [DifferenceDto] })
  differences: DifferenceDto[];
}

export class AlternatesDto {
  @ApiProperty({ description: 'Number of all that there are' })
  total: number;

  @ApiProperty({
    type: [AlternateDto],
    description: 'At most 100: those under the same company part number first, then other manufacturers’',
  })
  items: AlternateDto[];
}
