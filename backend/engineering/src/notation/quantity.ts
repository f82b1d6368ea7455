/** The kinds of quantity that a person may type. Every parsed value is in the SI unit named beside it. */
export const quantities = [
  'resistance', // Ω
  'voltage', // V
  'current', // A
  'power', // W
  'energy', // J
  'time', // s
  'temperature', // °C
  'temperature-difference', // K
  'temperature-coefficient', // 1/K
  'voltage-coefficient', // 1/V
  'thermal-resistance', // K/W
  'tolerance', // fraction, never negative
  'fraction', // fraction, signed: drifts, shifts, deviations
  'ratio', // a plain number
  'noise-index', // dB
  'frequency', // Hz
  'length', // m
  'altitude', // m
  'capacitance', // F
  'inductance', // H
] as const;

export type Quantity = (typeof quantities)[number];
