import type { Quantity } from '@resistry/engineering/notation/quantity';

/** Ratings of a size that are one quantity each: name in the files → column of `size_ratings`, and the quantity. */
export const sizeQuantities = {
  limitingElementVoltage: ['limiting_element_voltage_volt', 'voltage'],
  overloadVoltage: ['overload_voltage_volt', 'voltage'],
  insulationVoltage: ['insulation_voltage_volt', 'voltage'],
  voltageCoefficient: ['voltage_coefficient_per_volt', 'voltage-coefficient'],
  noiseIndex: ['noise_index_decibel', 'noise-index'],
  inductance: ['inductance_henry', 'inductance'],
  capacitance: ['capacitance_farad', 'capacitance'],
  solderShift: ['solder_shift_fraction', 'fraction'],
  humidityShift: ['humidity_shift_fraction', 'fraction'],
} as const satisfies Record<string, readonly [column: string, quantity: Quantity]>;

/** Ratings of a size that are texts. */
export const sizeTexts = {
  landPattern: 'land_pattern',
  termination: 'termination',
  soldering: 'soldering',
} as const;

/** Ratings of an operating mode that are one quantity each: name → column of `operating_modes`, and the quantity. */
export const modeQuantities = {
  dissipation: ['rated_dissipation_watt', 'power'],
  maxElementTemperature: ['max_element_temperature_celsius', 'temperature'],
  thermalResistance: ['thermal_resistance_kelvin_per_watt', 'thermal-resistance'],
} as const satisfies Record<string, readonly [column: string, quantity: Quantity]>;

/**
 * What a complete datasheet gives for every size. A family that lacks one says so under `lacks`, so that a gap is a
 * statement and never a slip.
 */
export const completeRatings = [
  ...(Object.keys(sizeQuantities) as (keyof typeof sizeQuantities)[]),
  ...(Object.keys(sizeTexts) as (keyof typeof sizeTexts)[]),
  ...(Object.keys(modeQuantities) as (keyof typeof modeQuantities)[]),
  'derating',
  'drift',
  'body',
  'category',
  'mounting',
  'pulses',
  'tcr',
  'failureRateStyle',
] as const;
export type CompleteRating = (typeof completeRatings)[number];

/** Names a citation may point at: the fields of the ratings, as the assessments name them. */
export const citableFields: readonly string[] = [
  'resistance',
  'tolerance',
  'tcr',
  'referenceTemperature',
  'ratedDissipation',
  'derating',
  'maxElementTemperature',
  'thermalResistance',
  'drift',
  'category',
  'body',
  'mounting',
  'features',
  'certificates',
  'pulses',
  'link',
  'failureRateStyle',
  ...Object.keys(sizeQuantities),
  ...Object.keys(sizeTexts),
];
