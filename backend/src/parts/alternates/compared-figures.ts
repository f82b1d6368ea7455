import type { Quantity } from '@resistry/engineering/notation/quantity';
import type { Ratings } from '@resistry/engineering/ratings/ratings';

/** A rating in which two parts are compared. */
export interface Figure {
  field: string;
  quantity: Quantity;
  /** Which of two is the better one; neither for what is only different. */
  better?: 'higher' | 'lower';
  /** A replacement that is worse in it cannot do what the part does. Dissipation counts too, mode by mode. */
  counts?: true;
  of: (ratings: Ratings) => number | undefined;
}

/** In the order in which a datasheet states them. */
export const figures: readonly Figure[] = [
  { field: 'tolerance', quantity: 'tolerance', better: 'lower', counts: true, of: (r) => r.tolerance },
  { field: 'tcr', quantity: 'temperature-coefficient', better: 'lower', counts: true, of: (r) => r.tcr },
  { field: 'referenceTemperature', quantity: 'temperature', of: (r) => r.referenceTemperature },
  { field: 'ratedDissipation', quantity: 'power', better: 'higher', of: (r) => r.ratedDissipation },
  {
    field: 'limitingElementVoltage',
    quantity: 'voltage',
    better: 'higher',
    counts: true,
    of: (r) => r.limitingElementVoltage,
  },
  { field: 'overloadVoltage', quantity: 'voltage', better: 'higher', of: (r) => r.overloadVoltage },
  { field: 'insulationVoltage', quantity: 'voltage', better: 'higher', of: (r) => r.insulationVoltage },
  {
    field: 'category.min',
    quantity: 'temperature',
    better: 'lower',
    counts: true,
    of: (r) => r.category?.min,
  },
  {
    field: 'category.max',
    quantity: 'temperature',
    better: 'higher',
    counts: true,
    of: (r) => r.category?.max,
  },
  {
    field: 'maxElementTemperature',
    quantity: 'temperature',
    better: 'higher',
    of: (r) => r.maxElementTemperature,
  },
  {
    field: 'thermalResistance',
    quantity: 'thermal-resistance',
    better: 'lower',
    of: (r) => r.thermalResistance,
  },
  {
    field: 'voltageCoefficient',
    quantity: 'voltage-coefficient',
    better: 'lower',
    of: (r) => r.voltageCoefficient,
  },
  { field: 'noiseIndex', quantity: 'noise-index', better: 'lower', of: (r) => r.noiseIndex },
  { field: 'inductance', quantity: 'inductance', better: 'lower', of: (r) => r.inductance },
  { field: 'capacitance', quantity: 'capacitance', better: 'lower', of: (r) => r.capacitance },
  { field: 'solderShift', quantity: 'fraction', better: 'lower', of: (r) => r.solderShift },
  { field: 'humidityShift', quantity: 'fraction', better: 'lower', of: (r) => r.humidityShift },
  { field: 'body.length', quantity: 'length', of: (r) => r.body?.length },
  { field: 'body.width', quantity: 'length', of: (r) => r.body?.width },
  { field: 'body.height', quantity: 'length', of: (r) => r.body?.height },
  {
    field: 'link.ratedCurrent',
    quantity: 'current',
    better: 'higher',
    counts: true,
    of: (r) => r.link?.ratedCurrent,
  },
  {
    field: 'link.residualResistance',
    quantity: 'resistance',
    better: 'lower',
    counts: true,
    of: (r) => r.link?.residualResistance,
  },
];
