import type { DeratingAxis, PulseRatings, Ratings } from '@resistry/engineering/ratings/ratings';
import type { Feature, Mounting, Technology } from '@resistry/engineering/ratings/technology';

/** One operating mode of one size as the database holds it, with what its revision and family add. */
export interface SizeRatingsRow {
  size_id: number;
  family_id: number;
  revision_id: number;
  technology: Technology;
  reference_temperature_celsius: number | null;
  failure_rate_style: string | null;
  features: string;
  mounting: Mounting | null;
  body_length_metre: number | null;
  body_width_metre: number | null;
  body_height_metre: number | null;
  limiting_element_voltage_volt: number | null;
  overload_voltage_volt: number | null;
  insulation_voltage_volt: number | null;
  category_min_celsius: number | null;
  category_max_celsius: number | null;
  voltage_coefficient_per_volt: number | null;
  noise_index_decibel: number | null;
  inductance_henry: number | null;
  capacitance_farad: number | null;
  solder_shift_fraction: number | null;
  humidity_shift_fraction: number | null;
  pulses: string | null;
  link_rated_current_ampere: number | null;
  link_residual_resistance_ohm: number | null;
  mode_name: string;
  rated_dissipation_watt: number | null;
  derating_axis: DeratingAxis | null;
  derating_points: string | null;
  max_element_temperature_celsius: number | null;
  thermal_resistance_kelvin_per_watt: number | null;
  drift_fraction: number | null;
  drift_hours: number | null;
  drift_temperature_celsius: number | null;
  drift_law_exponent: number | null;
  drift_law_doubling_kelvin: number | null;
  certificates: string;
}

/** The ratings of a row: a NULL column is missing data and leaves its field out. */
export function ratingsOfRow(row: SizeRatingsRow): Ratings {
  const ratings: Ratings = {
    technology: row.technology,
    resistance: NaN,
    referenceTemperature: row.reference_temperature_celsius ?? undefined,
    failureRateStyle: row.failure_rate_style ?? undefined,
    features: JSON.parse(row.features) as Feature[],
    certificates: JSON.parse(row.certificates) as string[],
    mounting: row.mounting ?? undefined,
    limitingElementVoltage: row.limiting_element_voltage_volt ?? undefined,
    overloadVoltage: row.overload_voltage_volt ?? undefined,
    insulationVoltage: row.insulation_voltage_volt ?? undefined,
    voltageCoefficient: row.voltage_coefficient_per_volt ?? undefined,
    noiseIndex: row.noise_index_decibel ?? undefined,
    inductance: row.inductance_henry ?? undefined,
    capacitance: row.capacitance_farad ?? undefined,
    solderShift: row.solder_shift_fraction ?? undefined,
    humidityShift: row.humidity_shift_fraction ?? undefined,
    ratedDissipation: row.rated_dissipation_watt ?? undefined,
    maxElementTemperature: row.max_element_temperature_celsius ?? undefined,
    thermalResistance: row.thermal_resistance_kelvin_per_watt ?? undefined,
    category: pair(row.category_min_celsius, row.category_max_celsius),
    body: bodyOf(row),
    derating: deratingOf(row),
    drift: driftOf(row),
    pulses: row.pulses === null ? undefined : (JSON.parse(row.pulses) as PulseRatings),
    link: linkOf(row),
  };
  return ratings;
}

function pair(min: number | null, max: number | null): { min: number; max: number } | undefined {
  return min === null || max === null ? undefined : { min, max };
}

function bodyOf(row: SizeRatingsRow): Ratings['body'] {
  const { body_length_metre: length, body_width_metre: width, body_height_metre: height } = row;
  return length === null || width === null || height === null ? undefined : { length, width, height };
}

function deratingOf(row: SizeRatingsRow): Ratings['derating'] {
  if (row.derating_axis === null || row.derating_points === null) return undefined;
  return { axis: row.derating_axis, points: JSON.parse(row.derating_points) as [number, number][] };
}

function driftOf(row: SizeRatingsRow): Ratings['drift'] {
  const { drift_fraction: fraction, drift_hours: hours, drift_temperature_celsius: temperature } = row;
  if (fraction === null || hours === null || temperature === null) return undefined;
  const { drift_law_exponent: exponent, drift_law_doubling_kelvin: doubling } = row;
  return {
    fraction,
    hours,
    temperature,
    ...(exponent === null || doubling === null ? {} : { law: { exponent, doubling } }),
  };
}

function linkOf(row: SizeRatingsRow): Ratings['link'] {
  const { link_rated_current_ampere: current, link_residual_resistance_ohm: residual } = row;
  if (current === null && residual === null) return undefined;
  return { ratedCurrent: current ?? undefined, residualResistance: residual ?? undefined };
}
