import { ApiPropertyOptional } from '@nestjs/swagger';
import { deviationRules, type DeviationRule, type Duty } from '@resistry/engineering/duty/duty';
import {
  approvals,
  features,
  mountings,
  supplyStatuses,
  type Approval,
  type Feature,
  type Mounting,
  type SupplyStatus,
} from '@resistry/engineering/ratings/technology';
import { ArrayMaxSize, ArrayUnique, IsArray, IsBoolean, IsIn, IsOptional } from 'class-validator';
import { Nested, NestedList } from '../../common/validation/nested';
import { QuantityOf } from '../../common/validation/quantity';
import { IntervalDto, PulseDto } from './load.dto';

class WindowDto {
  @QuantityOf({ description: 'Lowest resistance over life, Ω; 0 asks for a zero-ohm link' })
  lower: number;

  @QuantityOf({ description: 'Highest resistance over life, Ω' })
  upper: number;

  @QuantityOf({ description: 'Nominal resistance the circuit was drawn with, Ω', optional: true })
  nominal?: number;
}

class LimitsDto {
  @Nested(() => IntervalDto)
  voltage: IntervalDto;

  @Nested(() => IntervalDto)
  current: IntervalDto;
}

class PowerDto {
  @QuantityOf({ description: 'Largest power, W' })
  max: number;
}

class LoadDto {
  @Nested(() => IntervalDto, { optional: true })
  voltage?: IntervalDto;

  @Nested(() => IntervalDto, { optional: true })
  current?: IntervalDto;

  @Nested(() => PowerDto, { optional: true })
  power?: PowerDto;
}

class AmbientDto extends IntervalDto {
  @QuantityOf({ description: 'Rise inside the enclosure, K', optional: true })
  enclosureRise?: number;

  @QuantityOf({ description: 'Hottest terminal, °C', optional: true })
  terminal?: number;

  @QuantityOf({ description: 'Hottest case, °C', optional: true })
  case?: number;

  @QuantityOf({ description: 'Altitude, m', optional: true })
  altitude?: number;
}

class LifeDto {
  @QuantityOf({ description: 'Life, h' })
  hours: number;
}

class NoiseDto {
  @QuantityOf({ description: 'Lower end of the band, Hz' })
  from: number;

  @QuantityOf({ description: 'Upper end of the band, Hz' })
  to: number;

  @QuantityOf({ description: 'Largest noise, V rms' })
  limit: number;

  @QuantityOf({ description: 'Direct voltage across the part, V', optional: true })
  bias?: number;
}

class FrequencyDto {
  @QuantityOf({ description: 'Frequency, Hz' })
  at: number;

  @QuantityOf({ description: 'Allowed change of |Z| against R, fraction' })
  within: number;
}

class InsulationDto {
  @QuantityOf({ description: 'Voltage between the element and what it may touch, V' })
  voltage: number;
}

class BodyLimitDto {
  @QuantityOf({ description: 'Largest length, m', optional: true })
  length?: number;

  @QuantityOf({ description: 'Largest width, m', optional: true })
  width?: number;

  @QuantityOf({ description: 'Largest height, m', optional: true })
  height?: number;
}

class SafetyDto {
  @ApiPropertyOptional({ description: 'Connected to the mains' })
  @IsOptional()
  @IsBoolean()
  mains?: boolean;

  @ApiPropertyOptional({ description: 'Has a safety function' })
  @IsOptional()
  @IsBoolean()
  function?: boolean;
}

/** What the circuit does to a position; every field optional, SI, temperatures in °C. */
export class DutyDto implements Duty {
  @Nested(() => WindowDto, { optional: true })
  window?: WindowDto;

  @Nested(() => LimitsDto, { optional: true })
  limits?: LimitsDto;

  @Nested(() => LoadDto, { optional: true })
  load?: LoadDto;

  @NestedList(() => PulseDto, { optional: true, atMost: 20 })
  pulses?: PulseDto[];

  @Nested(() => AmbientDto, { optional: true })
  ambient?: AmbientDto;

  @Nested(() => LifeDto, { optional: true })
  life?: LifeDto;

  @ApiPropertyOptional({ enum: deviationRules, description: 'How deviations add; default worst-case' })
  @IsOptional()
  @IsIn(deviationRules)
  deviation?: DeviationRule;

  @Nested(() => NoiseDto, { optional: true })
  noise?: NoiseDto;

  @Nested(() => FrequencyDto, { optional: true })
  frequency?: FrequencyDto;

  @Nested(() => InsulationDto, { optional: true })
  insulation?: InsulationDto;

  @ApiPropertyOptional({ enum: mountings })
  @IsOptional()
  @IsIn(mountings)
  mounting?: Mounting;

  @Nested(() => BodyLimitDto, { optional: true })
  body?: BodyLimitDto;

  @ApiPropertyOptional({ enum: features, isArray: true })
  @IsOptional()
  @IsArray()
  @ArrayMaxSize(features.length)
  @ArrayUnique()
  @IsIn(features, { each: true })
  features?: Feature[];

  @Nested(() => SafetyDto, { optional: true })
  safety?: SafetyDto;

  @ApiPropertyOptional({ description: 'Asks for a second source' })
  @IsOptional()
  @IsBoolean()
  secondSource?: boolean;

  @ApiPropertyOptional({ enum: approvals, isArray: true, description: 'Absent: approved and preferred' })
  @IsOptional()
  @IsArray()
  @ArrayMaxSize(approvals.length)
  @ArrayUnique()
  @IsIn(approvals, { each: true })
  approvals?: Approval[];

  @ApiPropertyOptional({ enum: supplyStatuses, isArray: true, description: 'Absent: active' })
  @IsOptional()
  @IsArray()
  @ArrayMaxSize(supplyStatuses.length)
  @ArrayUnique()
  @IsIn(supplyStatuses, { each: true })
  supply?: SupplyStatus[];
}
