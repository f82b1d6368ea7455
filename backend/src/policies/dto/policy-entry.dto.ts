import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import {
  policyReadings,
  type PolicyEntry,
  type PolicyMatch,
  type PolicyReading,
} from '@resistry/engineering/derating/policy-entry';
import {
  mountings,
  technologies,
  type Mounting,
  type Technology,
} from '@resistry/engineering/ratings/technology';
import { IsIn, IsOptional, IsString, MaxLength } from 'class-validator';
import { Nested } from '../../common/validation/nested';
import { Points } from '../../common/validation/points';
import { QuantityOf } from '../../common/validation/quantity';

class PolicyMatchDto implements PolicyMatch {
  @ApiPropertyOptional({ enum: technologies, isArray: true, description: 'One technology or several' })
  @IsOptional()
  @IsIn(technologies, { each: true })
  technology?: Technology | Technology[];

  @ApiPropertyOptional({ enum: mountings })
  @IsOptional()
  @IsIn(mountings)
  mounting?: Mounting;

  @ApiPropertyOptional({ description: "Style of the handbook's or the agency's table" })
  @IsOptional()
  @IsString()
  @MaxLength(40)
  style?: string;

  @QuantityOf({ description: 'Largest tolerance the entry covers, fraction', optional: true, min: 0, max: 1 })
  tolerance?: number;
}

/** One entry of a derating policy. */
export class PolicyEntryDto implements PolicyEntry {
  @Nested(() => PolicyMatchDto)
  match: PolicyMatchDto;

  @QuantityOf({ description: 'Share of the rated dissipation', min: 0, max: 1 })
  powerRatio: number;

  @ApiProperty({ enum: policyReadings })
  @IsIn(policyReadings)
  reading: PolicyReading;

  @QuantityOf({ description: 'Parallel line full up to, °C', optional: true, min: -273.15, max: 1000 })
  from?: number;

  @QuantityOf({ description: 'Parallel line zero at, °C', optional: true, min: -273.15, max: 1000 })
  zero?: number;

  @QuantityOf({ description: 'Share of the limiting element voltage', min: 0, max: 1 })
  voltageRatio: number;

  @QuantityOf({ description: 'Share of the pulse rating', optional: true, min: 0, max: 1 })
  pulseRatio?: number;

  @QuantityOf({ description: 'Never passed, even unloaded, °C', optional: true, min: -273.15, max: 1000 })
  maxTemperature?: number;

  @QuantityOf({
    description: 'Kept below the maximum element temperature, K',
    optional: true,
    min: 0,
    max: 500,
  })
  reserve?: number;

  @Points({ description: 'Altitude factors [[m, factor], …], rising', optional: true, atMost: 50 })
  altitude?: [number, number][];
}
