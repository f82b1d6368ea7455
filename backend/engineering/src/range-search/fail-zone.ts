import type { Conditions } from '../operating/conditions';
import { deviationAt } from '../operating/settle';
import { firstAbove, firstNotBelow } from './row-masks';
import { peakOf, type Peak } from './peak';

/**
 * Resistances (Ω, nominal) at which one check fails: certainly inside the inner open interval, possibly inside the outer
 * one, certainly not outside it. What lies between inner and outer is to be assessed part by part.
 */
export interface FailZone {
  certainFrom: number;
  certainTo: number;
  possibleFrom: number;
  possibleTo: number;
}

/**
 * The positions of [from, to) that a zone covers, rising: possibleFrom ≤ certainFrom ≤ certainTo ≤ possibleTo. The upper
 * ends are excluded.
 */
export function stretchOf(zone: FailZone, resistances: Float64Array, from: number, to: number): FailZone {
  if (zone === nowhere) return { certainFrom: from, certainTo: from, possibleFrom: from, possibleTo: from };
  const possibleFrom = firstAbove(resistances, from, to, zone.possibleFrom);
  const possibleTo = firstNotBelow(resistances, possibleFrom, to, zone.possibleTo);
  const certainFrom = firstAbove(resistances, possibleFrom, possibleTo, zone.certainFrom);
  const certainTo = firstNotBelow(resistances, certainFrom, possibleTo, zone.certainTo);
  return { certainFrom, certainTo, possibleFrom, possibleTo };
}

/** Keeps rounding on the safe side of both intervals; a thousand times the slack of a comparison. */
const guard = 1e-6;

/** Deviation (fraction) from which a part counts as running away; settling gives up a little later. */
const runaway = 1e5;

/** A side on which nothing bounds the load. */
const unbounded: Peak = { least: 0, most: 0, atEnd: false };

/** More than any part dissipates, W: who passes it has no operating point. */
const endlessDissipation = 1e9;

export const nowhere: FailZone = {
  certainFrom: Infinity,
  certainTo: 0,
  possibleFrom: Infinity,
  possibleTo: 0,
};
export const everywhere: FailZone = {
  certainFrom: 0,
  certainTo: Infinity,
  possibleFrom: 0,
  possibleTo: Infinity,
};
/** Nothing is known beforehand: every part is to be assessed. */
export const undecided: FailZone = {
  certainFrom: Infinity,
  certainTo: 0,
  possibleFrom: 0,
  possibleTo: Infinity,
};

/**
 * Where the dissipation passes an allowance (W). A part that dissipates exactly x W has the deviation d(x) that x heats it
 * to, so x is an operating point of the resistance x / (I²·(1 + d)) by current, of U² / (x·(1 − d)) by voltage. Settling
 * reaches the least operating point, so a part stays inside the allowance exactly if some x up to it is one: up to the
 * largest such resistance by current, from the smallest by voltage.
 * @param least allowance with all rounding against the part, W
 * @param most allowance with all rounding for the part, W
 */
export function dissipationZone(conditions: Conditions, least: number, most: number): FailZone {
  return zoneWith(conditions, least, most, (peak) => peak.most);
}

/**
 * @param certain what no operating point inside the allowance can reach: the peak, or Infinity where reaching beyond the
 *   allowance is no failure
 */
function zoneWith(
  conditions: Conditions,
  least: number,
  most: number,
  certain: (peak: Peak) => number,
): FailZone {
  const load = conditions.load;
  if (load === undefined) return nowhere;
  const { voltageMax, currentMax, powerMax } = load;
  if (voltageMax === 0 || currentMax === 0 || powerMax === 0) return least > 0 ? nowhere : undecided;
  if (!(most > 0)) return everywhere;
  const deviation = (watt: number, volt: number): number =>
    deviationAt(conditions, conditions.axis.known ? conditions.axis.celsius + rise * watt : NaN, volt);
  const rise = conditions.thermal?.value ?? 0;
  const largest = Math.min(powerMax, voltageMax * currentMax);
  if (largest <= most) {
    // The stated bounds alone keep it inside, as long as it settles at all.
    const settles = deviation(largest, largestVoltageOf(conditions, largest)) < runaway;
    return settles && largest <= least ? nowhere : undecided;
  }
  // A power bounds the voltage by a root, and with a voltage coefficient the shares below no longer have one peak.
  if (powerMax < Infinity && conditions.voltageCoefficient !== 0) return undecided;
  const byCurrent = (watt: number): number =>
    1 / (1 + deviation(watt, Math.min(voltageMax, watt / currentMax)));
  const byVoltage = (watt: number): number => 1 - deviation(watt, voltageMax);
  const scale = Math.max(0, least / most) * (1 - guard);
  const rising = currentMax < Infinity ? peakOf(byCurrent, most) : unbounded;
  const falling = voltageMax < Infinity ? peakOf(byVoltage, most) : unbounded;
  return {
    certainFrom: (certain(rising) * (1 + guard)) / currentMax ** 2,
    certainTo: voltageMax ** 2 / (certain(falling) * (1 + guard)),
    possibleFrom: (rising.least * scale) / currentMax ** 2,
    possibleTo: voltageMax ** 2 / (falling.least * scale),
  };
}

/** Largest voltage (V) that a dissipation inside the stated bounds can bring about; it only matters to a voltage coefficient. */
function largestVoltageOf({ load, voltageCoefficient }: Conditions, watt: number): number {
  if (load === undefined || voltageCoefficient === 0) return 0;
  return Math.min(load.voltageMax, watt / load.currentMax);
}

/** Zone of an allowance in W that carries only the rounding of its own arithmetic. */
export function ratedZone(conditions: Conditions, allowance: number | undefined): FailZone {
  if (allowance === undefined) return withoutSettling(conditions);
  return dissipationZone(conditions, allowance * (1 - guard), allowance * (1 + guard));
}

/** Zone of an allowed element temperature, °C, where one is known: the dissipation that heats the element to it. */
export function temperatureZone(conditions: Conditions, celsius: number | undefined): FailZone {
  const { axis, thermal } = conditions;
  // Without them there is no temperature to pass anything.
  if (!axis.known || thermal === undefined) return nowhere;
  if (celsius === undefined) return withoutSettling(conditions);
  const rise = celsius - axis.celsius;
  const rounding = guard * (1 + Math.abs(celsius));
  if (thermal.value === 0) return rise >= 0 ? withoutSettling(conditions) : everywhere;
  return dissipationZone(conditions, (rise - rounding) / thermal.value, (rise + rounding) / thermal.value);
}

/** Where a part has no operating point; nothing else can fail a check that has no allowance to hold it to. */
export function withoutSettling(conditions: Conditions): FailZone {
  const most = endlessDissipation;
  return zoneWith(conditions, most * (1 - guard), most, (peak) => (peak.atEnd ? Infinity : peak.most));
}

/**
 * Where the steady voltage passes an allowance (V); it never falls as the resistance grows, so from one edge upwards.
 * As with the dissipation, x V are an operating point of the resistance x / (I·(1 + d)) or x² / (P·(1 + d)).
 */
export function voltageZone(conditions: Conditions, allowance: number | undefined): FailZone {
  const load = conditions.load;
  if (load === undefined) return nowhere;
  // Against no allowance only a voltage that nothing bounds fails.
  if (allowance === undefined) return load.voltageMax < Infinity ? nowhere : withoutSettling(conditions);
  if (load.voltageMax <= allowance * (1 - guard)) return nowhere;
  if (load.voltageMax <= allowance * (1 + guard)) return undecided;
  const { currentMax, powerMax } = load;
  if (currentMax === Infinity && powerMax === Infinity) return everywhere;
  const rise = conditions.thermal?.value ?? 0;
  const deviation = (watt: number, volt: number): number =>
    deviationAt(conditions, conditions.axis.known ? conditions.axis.celsius + rise * watt : NaN, volt);
  if (allowance * currentMax <= powerMax) {
    const peak = peakOf((volt) => 1 / (1 + deviation(volt * currentMax, volt)), allowance);
    return {
      ...everywhere,
      certainFrom: (peak.most * (1 + 3 * guard)) / currentMax,
      possibleFrom: (peak.least * (1 - guard)) / currentMax,
    };
  }
  const heated = deviation(powerMax, allowance);
  const ohm = allowance ** 2 / powerMax;
  return {
    ...everywhere,
    certainFrom: (ohm * (1 + 3 * guard)) / (1 + deviation(0, 0)),
    possibleFrom: heated < runaway ? (ohm * (1 - guard)) / (1 + heated) : 0,
  };
}
