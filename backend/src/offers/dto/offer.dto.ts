import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { PersonRefDto } from '../../common/reading/person-ref.dto';
import { NamedDto } from '../../parts/summary/part-summary.dto';

export class PriceBreakDto {
  @ApiProperty({ description: 'From so many pieces' })
  quantity: number;

  @ApiProperty({ description: 'A piece, in the currency of the offer' })
  unitPrice: number;
}

export class OfferDto {
  @ApiProperty()
  id: number;

  @ApiProperty({ type: NamedDto })
  supplier: NamedDto;

  @ApiProperty({ description: 'Code of the packaging' })
  packaging: string;

  @ApiProperty({ enum: ['EUR'] })
  currency: 'EUR';

  @ApiProperty({ description: 'Pieces' })
  minimumOrder: number;

  @ApiProperty({ description: 'Pieces; orders are multiples of it' })
  orderMultiple: number;

  @ApiProperty()
  leadTimeDays: number;

  @ApiProperty({ description: 'First day, ISO 8601' })
  validFrom: string;

  @ApiProperty({ description: 'Last day, ISO 8601' })
  validUntil: string;

  @ApiProperty({ description: 'Today lies between its first and its last day, and nobody has ended it' })
  inForce: boolean;

  @ApiProperty({ type: [PriceBreakDto] })
  priceBreaks: PriceBreakDto[];

  @ApiProperty({ type: PersonRefDto })
  enteredBy: PersonRefDto;

  @ApiProperty({ description: 'ISO 8601' })
  enteredAt: string;

  @ApiPropertyOptional({ description: 'ISO 8601; absent where nobody has ended it' })
  endedAt?: string;

  @ApiProperty({ description: 'Send it with a change' })
  version: number;
}
