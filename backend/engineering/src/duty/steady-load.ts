/**
 * The steady load as bounds that all hold at once: the magnitudes of voltage (V), current (A) and power (W).
 * A bound that the duty does not state is Infinity (largest) or 0 (smallest).
 */
export interface SteadyLoad {
  voltageMin: number;
  voltageMax: number;
  currentMin: number;
  currentMax: number;
  powerMax: number;
}

/**
 * Largest dissipation over a whole interval of resistance, W: the highest that all bounds leave at any resistance inside.
 * At one resistance the bounds leave min(U²/R, I²R, P); that rises up to R = U/I and falls beyond it, so the largest
 * over an interval is at the point of the interval nearest to U/I (Ohm, Joule).
 * @param low Ω, above 0 when a voltage bounds the load
 * @param high Ω, not below low
 * @returns W; 0 where no bound is stated would be a guess, so Infinity is returned then
 */
export function worstDissipation(load: SteadyLoad, low: number, high: number): number {
  const atVoltage = (resistance: number): number => (load.voltageMax * load.voltageMax) / resistance;
  const atCurrent = (resistance: number): number => load.currentMax * load.currentMax * resistance;
  let watt: number;
  if (load.voltageMax === Infinity) watt = load.currentMax === Infinity ? Infinity : atCurrent(high);
  else if (load.currentMax === Infinity) watt = load.voltageMax === 0 ? 0 : atVoltage(low);
  else if (load.voltageMax === 0 || load.currentMax === 0) watt = 0;
  else {
    const turning = load.voltageMax / load.currentMax;
    if (turning < low) watt = atVoltage(low);
    else if (turning > high) watt = atCurrent(high);
    else watt = load.voltageMax * load.currentMax;
  }
  return Math.min(watt, load.powerMax);
}

/**
 * Largest steady voltage across a resistance, V: min(U, I·R, √(P·R)); never falls as the resistance grows.
 * @param resistance Ω
 */
export function largestVoltage(load: SteadyLoad, resistance: number): number {
  const byCurrent = load.currentMax === Infinity ? Infinity : load.currentMax * resistance;
  const byPower = load.powerMax === Infinity ? Infinity : Math.sqrt(load.powerMax * resistance);
  return Math.min(load.voltageMax, byCurrent, byPower);
}

/**
 * Largest steady current through a resistance, A: min(I, U/R, √(P/R)); never grows as the resistance grows.
 * @param resistance Ω; at 0 only a stated current bounds it
 */
export function largestCurrent(load: SteadyLoad, resistance: number): number {
  if (resistance === 0) return load.currentMax;
  return Math.min(load.currentMax, load.voltageMax / resistance, Math.sqrt(load.powerMax / resistance));
}
