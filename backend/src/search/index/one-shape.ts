import type { Ratings } from '@resistry/engineering/ratings/ratings';

/**
 * The same ratings with every field there is, in one order. A search reads the ratings of thousands of rows; where each
 * family's object has fields of its own, every read has to look for them.
 */
export function inOneShape(ratings: Ratings): { [Field in keyof Required<Ratings>]: Ratings[Field] } {
  return {
    technology: ratings.technology,
    resistance: ratings.resistance,
    tolerance: ratings.tolerance,
    tcr: ratings.tcr,
    referenceTemperature: ratings.referenceTemperature,
    ratedDissipation: ratings.ratedDissipation,
    derating: ratings.derating,
    limitingElementVoltage: ratings.limitingElementVoltage,
    overloadVoltage: ratings.overloadVoltage,
    insulationVoltage: ratings.insulationVoltage,
    category: ratings.category,
    maxElementTemperature: ratings.maxElementTemperature,
    thermalResistance: ratings.thermalResistance,
    voltageCoefficient: ratings.voltageCoefficient,
    noiseIndex: ratings.noiseIndex,
    inductance: ratings.inductance,
    capacitance: ratings.capacitance,
    pulses: ratings.pulses,
    drift: ratings.drift,
    solderShift: ratings.solderShift,
    humidityShift: ratings.humidityShift,
    body: ratings.body,
    mounting: ratings.mounting,
    features: ratings.features,
    certificates: ratings.certificates,
    failureRateStyle: ratings.failureRateStyle,
    link: ratings.link,
  };
}
