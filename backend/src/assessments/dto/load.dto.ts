import { ApiProperty } from '@nestjs/swagger';
import { pulseShapes, type Interval, type Pulse, type PulseShape } from '@resistry/engineering/duty/duty';
import { IsIn } from 'class-validator';
import { Points } from '../../common/validation/points';
import { QuantityOf } from '../../common/validation/quantity';

/** A closed interval in the unit of the field that holds it. */
export class IntervalDto implements Interval {
  @QuantityOf({ description: 'Smallest' })
  min: number;

  @QuantityOf({ description: 'Largest' })
  max: number;
}

/** A pulse across the position. */
export class PulseDto implements Pulse {
  @ApiProperty({ enum: pulseShapes })
  @IsIn(pulseShapes)
  shape: PulseShape;

  @QuantityOf({ description: 'Peak voltage, V; the open-circuit setting of a surge', optional: true })
  voltage?: number;

  @QuantityOf({ description: 'Peak current, A', optional: true })
  current?: number;

  @QuantityOf({ description: 'Peak power, W', optional: true })
  power?: number;

  @QuantityOf({ description: 'Duration or time constant, s', optional: true })
  duration?: number;

  @QuantityOf({ description: 'Period, s', optional: true })
  period?: number;

  @QuantityOf({ description: 'Number over life, where not periodic', optional: true })
  count?: number;

  @QuantityOf({ description: 'Capacitance, F', optional: true })
  capacitance?: number;

  @QuantityOf({ description: 'Source resistance, Ω', optional: true })
  sourceResistance?: number;

  @Points({ description: 'Samples [s, V or A]', optional: true, atMost: 100_000 })
  samples?: [number, number][];
}
