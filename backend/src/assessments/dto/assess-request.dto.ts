import { ApiExtraModels, ApiPropertyOptional, getSchemaPath } from '@nestjs/swagger';
import { plainToInstance, Transform } from 'class-transformer';
import { IsOptional, ValidateIf, ValidateNested } from 'class-validator';
import { Nested } from '../../common/validation/nested';
import { PolicyEntryDto } from '../../policies/dto/policy-entry.dto';
import { DutyDto } from './duty.dto';
import { RatingsDto } from './ratings.dto';

/** A version's id, `none`, or one entry inline; absent = the company's published policy. */
export type PolicyChoice = number | 'none' | PolicyEntryDto;

/** Gives a request its policy. */
@ApiExtraModels(PolicyEntryDto)
export class PolicyRequest {
  @ApiPropertyOptional({
    description: "A version's id, 'none', or one entry inline; absent = the company's published policy",
    oneOf: [{ type: 'integer' }, { type: 'string', enum: ['none'] }, { $ref: getSchemaPath(PolicyEntryDto) }],
  })
  @Transform(({ value }: { value: unknown }) =>
    typeof value === 'object' && value !== null && !Array.isArray(value)
      ? plainToInstance(PolicyEntryDto, value)
      : value,
  )
  @IsOptional()
  @ValidateIf(({ policy }: { policy?: unknown }) => policy instanceof PolicyEntryDto)
  @ValidateNested()
  policy?: PolicyChoice;
}

/** A duty to derive the requirement of. */
export class RequirementRequest {
  @Nested(() => DutyDto)
  duty: DutyDto;
}

/** A part known only by its numbers, held against a duty. */
export class AssessRatingsRequest extends PolicyRequest {
  @Nested(() => RatingsDto)
  ratings: RatingsDto;

  @Nested(() => DutyDto)
  duty: DutyDto;
}

/** A catalogue part held against a duty. */
export class AssessPartRequest extends PolicyRequest {
  @Nested(() => DutyDto)
  duty: DutyDto;
}
