import type { Approval, Feature, Mounting, SupplyStatus } from '../ratings/technology';

/** A closed interval in the unit of the field that holds it. */
export interface Interval {
  min: number;
  max: number;
}

export const pulseShapes = [
  'rectangular',
  'triangular',
  'half-sine',
  'exponential',
  'capacitor-discharge',
  'surge-1.2/50',
  'surge-10/700',
  'waveform',
] as const;
export type PulseShape = (typeof pulseShapes)[number];

/** A pulse across the position; duration and period in s, capacitance in F, source resistance in Ω. */
export interface Pulse {
  shape: PulseShape;
  voltage?: number;
  current?: number;
  power?: number;
  duration?: number;
  period?: number;
  count?: number;
  capacitance?: number;
  sourceResistance?: number;
  samples?: readonly (readonly [number, number])[];
}

/** What the circuit does to a position, SI, every field optional (engineering.md, section 2). */
export interface Duty {
  /** Ω that the circuit tolerates over life; lower 0 asks for a zero-ohm link. */
  window?: { lower: number; upper: number; nominal?: number };
  /** In place of the window: whatever the voltage (V) across it, the current (A) stays inside. */
  limits?: { voltage: Interval; current: Interval };
  /** Steady, RMS; signs allowed, the larger magnitude counts. V, A, W. */
  load?: { voltage?: Interval; current?: Interval; power?: { max: number } };
  pulses?: readonly Pulse[];
  /** °C, °C, K, °C, °C, m. */
  ambient?: {
    min: number;
    max: number;
    enclosureRise?: number;
    terminal?: number;
    case?: number;
    altitude?: number;
  };
  life?: { hours: number };
  deviation?: DeviationRule;
  /** Hz, Hz, V rms, V d.c. */
  noise?: { from: number; to: number; limit: number; bias?: number };
  /** Hz, fraction of |Z| against R. */
  frequency?: { at: number; within: number };
  /** V between the element and what it may touch. */
  insulation?: { voltage: number };
  mounting?: Mounting;
  /** m, at most. */
  body?: { length?: number; width?: number; height?: number };
  features?: readonly Feature[];
  safety?: { mains?: boolean; function?: boolean };
  secondSource?: boolean;
  approvals?: readonly Approval[];
  supply?: readonly SupplyStatus[];
}

/** How deviations add. */
export const deviationRules = ['worst-case', 'root-sum-square'] as const;
export type DeviationRule = (typeof deviationRules)[number];
