import type { Feature, Mounting, Technology } from './technology';

/** Temperature axis against which a family states its derating curve. */
export const deratingAxes = ['ambient', 'terminal', 'case'] as const;
export type DeratingAxis = (typeof deratingAxes)[number];

/** Manufacturer's derating curve: points of (°C on the axis, fraction of the rated dissipation), rising in °C. */
export interface DeratingCurve {
  axis: DeratingAxis;
  points: readonly (readonly [celsius: number, fraction: number])[];
}

/** Load-life drift as the datasheet states it. */
export interface Drift {
  /** ΔR/R, fraction, after the test. */
  fraction: number;
  /** Duration of the test, h. */
  hours: number;
  /** Temperature of the element in the test, °C. */
  temperature: number;
  /** Law of the family where it states one: (t/t₀)^exponent · 2^((T−T₀)/doubling). */
  law?: { exponent: number; doubling: number };
}

/** Pulse data of a datasheet: [s, W] and [s, V] points, J, fraction. */
export interface PulseRatings {
  single?: readonly (readonly [number, number])[];
  singleCount?: number;
  continuous?: readonly (readonly [number, number])[];
  voltage?: readonly (readonly [number, number])[] | number;
  energy?: number;
  shift?: number;
}

/** A zero-ohm link: rated current in A, largest residual resistance in Ω. */
export interface LinkRatings {
  ratedCurrent?: number;
  residualResistance?: number;
}

/** A certificate or declaration that a part carries. */
export type Certificate = string;

/**
 * Ratings of one part in one operating mode, SI (Ω, V, W, K/W, H, F), temperatures in °C, ratios as fractions, TCR in 1/K.
 * A field that is absent is missing data: the checks that need it are unrated and name it.
 */
export interface Ratings {
  technology: Technology;
  /** Nominal resistance, Ω; 0 for a zero-ohm link. */
  resistance: number;
  /** Tolerance at delivery, fraction. */
  tolerance?: number;
  /** Largest magnitude of the temperature coefficient, 1/K. */
  tcr?: number;
  /** Temperature to which the TCR refers, °C; 20 per IEC 60115-1 unless the family states another. */
  referenceTemperature?: number;
  ratedDissipation?: number;
  derating?: DeratingCurve;
  limitingElementVoltage?: number;
  overloadVoltage?: number;
  insulationVoltage?: number;
  category?: { min: number; max: number };
  maxElementTemperature?: number;
  /** Element to the axis of the derating curve, K/W; 0 is a value. */
  thermalResistance?: number;
  /** Magnitude of the voltage coefficient, 1/V. */
  voltageCoefficient?: number;
  /** Current-noise index per IEC 60195, dB. */
  noiseIndex?: number;
  inductance?: number;
  capacitance?: number;
  pulses?: PulseRatings;
  drift?: Drift;
  solderShift?: number;
  humidityShift?: number;
  body?: { length: number; width: number; height: number };
  mounting?: Mounting;
  features?: readonly Feature[];
  certificates?: readonly Certificate[];
  failureRateStyle?: string;
  link?: LinkRatings;
}

/** IEC 60115-1: the TCR refers to 20 °C unless the detail specification states another temperature. */
export const standardReferenceTemperature = 20;
