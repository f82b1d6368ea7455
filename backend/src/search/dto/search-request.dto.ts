import { ApiPropertyOptional } from '@nestjs/swagger';
import { seriesNames, type SeriesName } from '@resistry/engineering/preferred-values/series';
import {
  approvals,
  supplyStatuses,
  technologies,
  type Approval,
  type SupplyStatus,
  type Technology,
} from '@resistry/engineering/ratings/technology';
import {
  ArrayMaxSize,
  IsArray,
  IsIn,
  IsInt,
  IsOptional,
  IsString,
  Matches,
  Max,
  MaxLength,
  Min,
} from 'class-validator';
import { PolicyRequest } from '../../assessments/dto/assess-request.dto';
import { DutyDto } from '../../assessments/dto/duty.dto';
import { Nested } from '../../common/validation/nested';
import { sortColumns } from '../engine/search-plan';
import { AnyId, AnyNumber, AnyOf, Whether } from './filter-fields';

const sortPattern = new RegExp(`^-?(${sortColumns.join('|')})$`);

/** Filters beside the duty; they apply first. */
export class FiltersDto {
  @ApiPropertyOptional({ description: 'Words in part numbers, families and manufacturers' })
  @IsOptional()
  @IsString()
  @MaxLength(100)
  text?: string;

  @AnyId()
  manufacturers?: number[];

  @AnyId()
  families?: number[];

  @AnyOf(technologies)
  technologies?: Technology[];

  @ApiPropertyOptional({ type: [String], description: 'Size codes' })
  @IsOptional()
  @IsArray()
  @ArrayMaxSize(200)
  @IsString({ each: true })
  @MaxLength(40, { each: true })
  sizes?: string[];

  @AnyOf(
    seriesNames,
    'Series of preferred values; E48, E96 and E192 accept E24 values too, which families offer at 1 %',
  )
  series?: SeriesName[];

  @AnyNumber('Fractions')
  tolerances?: number[];

  @AnyNumber('1/K')
  tcrs?: number[];

  @Whether('Has a safety certificate in date')
  certificate?: boolean;

  @AnyOf(approvals)
  approvals?: Approval[];

  @AnyOf(supplyStatuses)
  supply?: SupplyStatus[];

  @Whether('Stands under a company part number')
  companyPartNumber?: boolean;

  @Whether('Has an offer in force at 1000 pieces')
  offer?: boolean;
}

/** A search for parts that meet a duty. */
export class SearchRequest extends PolicyRequest {
  @Nested(() => DutyDto, { optional: true })
  duty?: DutyDto;

  @Nested(() => FiltersDto, { optional: true })
  filters?: FiltersDto;

  @ApiPropertyOptional({ enum: ['met', 'met-and-unrated'], default: 'met' })
  @IsOptional()
  @IsIn(['met', 'met-and-unrated'])
  show?: 'met' | 'met-and-unrated';

  @ApiPropertyOptional({
    enum: ['company'],
    description: 'Group by company part number, judged by its worst approved source',
  })
  @IsOptional()
  @IsIn(['company'])
  group?: 'company';

  @ApiPropertyOptional({
    description:
      'Column to sort by, with a minus before it for falling order; default preference, price, least excess, id',
    enum: sortColumns.flatMap((column) => [column, `-${column}`]),
  })
  @IsOptional()
  @IsString()
  @Matches(sortPattern, {
    message: `$property must be one of ${sortColumns.join(', ')}, with a minus before it for falling order`,
  })
  sort?: string;

  @ApiPropertyOptional({ type: 'integer', minimum: 1, maximum: 1_000_000, default: 1 })
  @IsOptional()
  @IsInt()
  @Min(1)
  @Max(1_000_000)
  page?: number;

  @ApiPropertyOptional({ type: 'integer', minimum: 1, maximum: 200, default: 50 })
  @IsOptional()
  @IsInt()
  @Min(1)
  @Max(200)
  pageSize?: number;
}
