import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { deratingAxes, type DeratingAxis, type Ratings } from '@resistry/engineering/ratings/ratings';
import {
  features,
  mountings,
  technologies,
  type Feature,
  type Mounting,
  type Technology,
} from '@resistry/engineering/ratings/technology';
import { ArrayMaxSize, ArrayUnique, IsArray, IsIn, IsOptional, IsString, MaxLength } from 'class-validator';
import { Nested } from '../../common/validation/nested';
import { Points } from '../../common/validation/points';
import { QuantityOf } from '../../common/validation/quantity';
import { IntervalDto } from './load.dto';
import { DriftDto, LinkRatingsDto, PulseRatingsDto } from './ratings-parts.dto';

class DeratingDto {
  @ApiProperty({ enum: deratingAxes })
  @IsIn(deratingAxes)
  axis: DeratingAxis;

  @Points({ description: 'Curve [[°C, fraction of the rated dissipation], …], rising in °C' })
  points: [number, number][];
}

class BodyDto {
  @QuantityOf({ description: 'Length, m', min: 1e-5, max: 1 })
  length: number;

  @QuantityOf({ description: 'Width, m', min: 1e-5, max: 1 })
  width: number;

  @QuantityOf({ description: 'Height, m', min: 1e-5, max: 1 })
  height: number;
}

/** Ratings of a part known only by its numbers; a field left out is missing data. */
export class RatingsDto implements Ratings {
  @ApiProperty({ enum: technologies })
  @IsIn(technologies)
  technology: Technology;

  @QuantityOf({ description: 'Nominal resistance, Ω; 0 for a zero-ohm link', min: 0, max: 1e15 })
  resistance: number;

  @QuantityOf({ description: 'Tolerance, fraction', optional: true, min: 0, max: 0.9 })
  tolerance?: number;

  @QuantityOf({ description: 'Temperature coefficient, magnitude, 1/K', optional: true, min: 0, max: 0.1 })
  tcr?: number;

  @QuantityOf({
    description: 'Temperature the TCR refers to, °C; default 20',
    optional: true,
    min: -273.15,
    max: 1000,
  })
  referenceTemperature?: number;

  @QuantityOf({ description: 'Rated dissipation, W', optional: true, min: 1e-6, max: 1e6 })
  ratedDissipation?: number;

  @Nested(() => DeratingDto, { optional: true })
  derating?: DeratingDto;

  @QuantityOf({ description: 'Limiting element voltage, V', optional: true, min: 1e-6, max: 1e6 })
  limitingElementVoltage?: number;

  @QuantityOf({ description: 'Maximum overload voltage, V', optional: true, min: 1e-6, max: 1e6 })
  overloadVoltage?: number;

  @QuantityOf({ description: 'Insulation voltage, V', optional: true, min: 1e-6, max: 1e6 })
  insulationVoltage?: number;

  @Nested(() => IntervalDto, { optional: true })
  category?: IntervalDto;

  @QuantityOf({ description: 'Maximum element temperature, °C', optional: true, min: -273.15, max: 2000 })
  maxElementTemperature?: number;

  @QuantityOf({
    description: 'Thermal resistance element to axis, K/W; 0 is a value',
    optional: true,
    min: 0,
    max: 1e6,
  })
  thermalResistance?: number;

  @QuantityOf({ description: 'Voltage coefficient, magnitude, 1/V', optional: true, min: 0, max: 1 })
  voltageCoefficient?: number;

  @QuantityOf({ description: 'Current-noise index, dB', optional: true, min: -100, max: 60 })
  noiseIndex?: number;

  @QuantityOf({ description: 'Inductance, H', optional: true, min: 0, max: 1 })
  inductance?: number;

  @QuantityOf({ description: 'Capacitance, F', optional: true, min: 0, max: 1 })
  capacitance?: number;

  @Nested(() => PulseRatingsDto, { optional: true })
  pulses?: PulseRatingsDto;

  @Nested(() => DriftDto, { optional: true })
  drift?: DriftDto;

  @QuantityOf({ description: 'Shift by soldering, fraction', optional: true, min: 0, max: 1 })
  solderShift?: number;

  @QuantityOf({ description: 'Shift by humidity, fraction', optional: true, min: 0, max: 1 })
  humidityShift?: number;

  @Nested(() => BodyDto, { optional: true })
  body?: BodyDto;

  @ApiPropertyOptional({ enum: mountings })
  @IsOptional()
  @IsIn(mountings)
  mounting?: Mounting;

  @ApiPropertyOptional({ enum: features, isArray: true })
  @IsOptional()
  @IsArray()
  @ArrayMaxSize(features.length)
  @ArrayUnique()
  @IsIn(features, { each: true })
  features?: Feature[];

  @ApiPropertyOptional({ type: [String] })
  @IsOptional()
  @IsArray()
  @ArrayMaxSize(50)
  @IsString({ each: true })
  @MaxLength(200, { each: true })
  certificates?: string[];

  @ApiPropertyOptional({ description: "Style of the handbook's or an agency's table" })
  @IsOptional()
  @IsString()
  @MaxLength(40)
  failureRateStyle?: string;

  @Nested(() => LinkRatingsDto, { optional: true })
  link?: LinkRatingsDto;
}
