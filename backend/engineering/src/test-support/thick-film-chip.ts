import type { PolicyEntry } from '../derating/policy-entry';
import type { Duty } from '../duty/duty';
import type { Ratings } from '../ratings/ratings';

/** A 1206 / 3216M thick-film chip, 4.7 kΩ ±1 % 100 ppm/K: 0.25 W, 200 V, common practice (references.md, Ratings). */
export const thickFilmChip: Ratings = {
  technology: 'thick-film',
  resistance: 4700,
  tolerance: 0.01,
  tcr: 100e-6,
  ratedDissipation: 0.25,
  derating: {
    axis: 'ambient',
    points: [
      [70, 1],
      [155, 0],
    ],
  },
  limitingElementVoltage: 200,
  category: { min: -55, max: 155 },
  maxElementTemperature: 155,
  drift: { fraction: 0.01, hours: 87600, temperature: 155 },
  mounting: 'surface',
  body: { length: 0.0032, width: 0.0016, height: 0.0006 },
  features: [],
};

/** A duty that the chip meets. */
export const gentleDuty: Duty = {
  window: { lower: 4500, upper: 4900 },
  load: { voltage: { min: 0, max: 24 } },
  ambient: { min: -20, max: 70 },
  life: { hours: 87600 },
};

/** A company entry: two thirds of the manufacturer's curve. */
export const twoThirds: PolicyEntry = {
  match: {},
  powerRatio: 0.67,
  reading: 'multiplied',
  voltageRatio: 0.8,
};
