import type { Drift, LinkRatings, PulseRatings } from '@resistry/engineering/ratings/ratings';
import { Nested } from '../../common/validation/nested';
import { Points } from '../../common/validation/points';
import { QuantityOf } from '../../common/validation/quantity';

/** Law of a family's drift: (t/t₀)^exponent · 2^((T−T₀)/doubling). */
class DriftLawDto {
  @QuantityOf({ description: 'Exponent of time', min: 0, max: 2 })
  exponent: number;

  @QuantityOf({ description: 'K per doubling', min: 1, max: 1000 })
  doubling: number;
}

/** Load-life drift as the datasheet states it. */
export class DriftDto implements Drift {
  @QuantityOf({ description: 'ΔR/R after the test, fraction', min: 0, max: 1 })
  fraction: number;

  @QuantityOf({ description: 'Duration of the test, h', min: 1e-3, max: 1e7 })
  hours: number;

  @QuantityOf({ description: 'Temperature of the element in the test, °C', min: -273.15, max: 2000 })
  temperature: number;

  @Nested(() => DriftLawDto, { optional: true })
  law?: DriftLawDto;
}

/** Pulse data of a datasheet. */
export class PulseRatingsDto implements PulseRatings {
  @Points({ description: 'Single pulses [[s, W], …]', optional: true })
  single?: [number, number][];

  @QuantityOf({
    description: 'Number of pulses the single curve is stated for',
    optional: true,
    min: 1,
    max: 1e12,
  })
  singleCount?: number;

  @Points({ description: 'Repeated pulses [[s, W], …]', optional: true })
  continuous?: [number, number][];

  @Points({ description: 'Pulse voltage [[s, V], …] or V', optional: true, orNumber: true })
  voltage?: [number, number][] | number;

  @QuantityOf({ description: 'Energy limit, J', optional: true, min: 0, max: 1e9 })
  energy?: number;

  @QuantityOf({ description: 'Shift by pulses, fraction', optional: true, min: 0, max: 1 })
  shift?: number;
}

/** A zero-ohm link. */
export class LinkRatingsDto implements LinkRatings {
  @QuantityOf({ description: 'Rated current, A', optional: true, min: 1e-6, max: 1e5 })
  ratedCurrent?: number;

  @QuantityOf({ description: 'Largest residual resistance, Ω', optional: true, min: 0, max: 1e3 })
  residualResistance?: number;
}
