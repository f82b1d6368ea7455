import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { ArrayMinSize, IsInt, IsString, Max, MaxLength, Min } from 'class-validator';
import { Day } from '../../common/validation/day';
import { Filled } from '../../common/validation/filled';
import { NestedList } from '../../common/validation/nested';
import { Prose } from '../../common/validation/prose';
import { QuantityOf } from '../../common/validation/quantity';
import type { OfferTerms } from '../offer-terms';

/** More pieces than anybody orders, and few enough to be counted exactly. */
const MOST_PIECES = 1_000_000_000;
const MOST_DAYS = 3650;
const MOST_BREAKS = 20;
const MOST_EUR = 1_000_000;
const LEAST_EUR = 0.000001;

function Pieces(description: string): PropertyDecorator {
  return applyDecorators(
    ApiProperty({ type: 'integer', minimum: 1, maximum: MOST_PIECES, description }),
    IsInt(),
    Min(1),
    Max(MOST_PIECES),
  );
}

function Identifier(description?: string): PropertyDecorator {
  return applyDecorators(
    ApiProperty({ type: 'integer', minimum: 1, description }),
    IsInt(),
    Min(1),
    Max(Number.MAX_SAFE_INTEGER),
  );
}

export class PriceBreakForm {
  @Pieces('From so many pieces')
  quantity: number;

  @QuantityOf({ description: 'EUR a piece, in whole millionths', min: LEAST_EUR, max: MOST_EUR })
  unitPrice: number;
}

class ReasonForm {
  @Prose()
  reason: string;
}

class TermsForm extends ReasonForm implements OfferTerms {
  @Identifier()
  supplierId: number;

  @ApiProperty({ maxLength: 20, description: 'Code of a packaging of the part’s size' })
  @IsString()
  @Filled()
  @MaxLength(20)
  packaging: string;

  @Pieces('Pieces; a multiple of the order multiple')
  minimumOrder: number;

  @Pieces('Pieces; orders are multiples of it')
  orderMultiple: number;

  @ApiProperty({ type: 'integer', minimum: 0, maximum: MOST_DAYS })
  @IsInt()
  @Min(0)
  @Max(MOST_DAYS)
  leadTimeDays: number;

  @ApiProperty({ description: 'First day, ISO 8601' })
  @IsString()
  @Day()
  validFrom: string;

  @ApiProperty({ description: 'Last day, ISO 8601' })
  @IsString()
  @Day()
  validUntil: string;

  @NestedList(() => PriceBreakForm, { atMost: MOST_BREAKS })
  @ArrayMinSize(1)
  priceBreaks: PriceBreakForm[];
}

export class NewOfferForm extends TermsForm {
  @Identifier()
  partId: number;
}

export class OfferChangeForm extends TermsForm {
  @Identifier('Version of the offer that the change is made on')
  version: number;
}

export class OfferEndForm extends ReasonForm {
  @Identifier('Version of the offer that is ended')
  version: number;
}
