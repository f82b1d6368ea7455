import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { PartSummaryDto } from '../summary/part-summary.dto';
import { type Difference, type Sense, senses } from './differences';
import { type Judgement, judgements, type Shortfall, shortfallSenses } from './shortfall';

export class DifferenceDto implements Difference {
  @ApiProperty({ description: 'Field of the ratings' })
  field: string;

  @ApiPropertyOptional({ description: 'Operating mode of the part that it is about, where it has several' })
  mode?: string;

  @ApiProperty({ enum: senses, description: 'unknown: one of the two does not state it' })
  sense: Sense;

  @ApiPropertyOptional({ description: 'Of the part, with its unit; absent where it is not stated' })
  own?: string;

  @ApiPropertyOptional({ description: 'Of the alternate, with its unit; absent where it is not stated' })
  alternate?: string;
}

/** In what an alternate is less than the part, or in what that cannot be said. */
export class ShortfallDto extends DifferenceDto implements Shortfall {
  @ApiProperty({ enum: shortfallSenses, description: 'unknown: one of the two does not state it' })
  declare sense: Shortfall['sense'];
}

/** A part that may replace another. */
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

  @ApiProperty({
    enum: judgements,
    description:
      'Of equal form, fit and function; lesser where a shortfall is known; undecided where a rating that counts is not stated',
  })
  judgement: Judgement;

  @ApiProperty({ type: [ShortfallDto], description: 'What keeps it from being equal; none of an equal' })
  shortfalls: ShortfallDto[];

  @ApiProperty({ type: [DifferenceDto] })
  differences: DifferenceDto[];
}

export class AlternatesDto {
  @ApiProperty({ description: 'Number of all that there are' })
  total: number;

  @ApiProperty({
    type: [AlternateDto],
    description:
      'At most 100: those under the same company part number first, equal or not; then the equal, then the undecided',
  })
  items: AlternateDto[];
}
