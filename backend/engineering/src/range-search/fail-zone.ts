import type { SteadyLoad } from '../duty/steady-load';
import type { Conditions } from '../operating/conditions';
import { deviationAt, settle } from '../operating/settle';

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

/** Keeps rounding on the safe side of both intervals; a thousand times the slack of a comparison. */
const guard = 1e-6;

/** Deviation (fraction) from which a part counts as running away. */
const runaway = 1e5;

/** Deviation (fraction) up to which a resistance stays above 0, so that a voltage across it has a bounded current. */
const settlesBelow = 0.9;

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
 * Where the dissipation passes an allowance (W). Settling is monotone, so a part whose dissipation at the deviation that
 * the allowance itself would heat it to stays inside the allowance has its operating point inside it; and a part that
 * passes the allowance before it is heated at all passes it once heated.
 * @param least allowance with all rounding against the part, W
 * @param most allowance with all rounding for the part, W
 */
export function dissipationZone(conditions: Conditions, least: number, most: number): FailZone {
  const load = conditions.load;
  if (load === undefined) return nowhere;
  const idle = load.voltageMax === 0 || load.currentMax === 0 || load.powerMax === 0;
  const axis = conditions.axis.known ? conditions.axis.celsius : NaN;
  const unheated = deviationAt(conditions, axis, 0);
  let certain = most > 0 ? dissipationAbove(load, most, unheated) : { from: 0, to: Infinity };
  if (idle) certain = { from: Infinity, to: 0 };
  const possible = least > 0 ? possiblyAbove(conditions, load, least) : { from: 0, to: Infinity };
  return {
    certainFrom: certain.from,
    certainTo: certain.to,
    possibleFrom: possible.from,
    possibleTo: possible.to,
  };
}

/** Zone of an allowance in W that carries only the rounding of its own arithmetic. */
export function ratedZone(conditions: Conditions, allowance: number): FailZone {
  return dissipationZone(conditions, allowance * (1 - guard), allowance * (1 + guard));
}

/** Zone of an allowed element temperature, °C: the dissipation that heats the element to it. */
export function temperatureZone(conditions: Conditions, celsius: number): FailZone {
  const { axis, thermal } = conditions;
  if (!axis.known || thermal === undefined) return undecided;
  const rise = celsius - axis.celsius;
  const rounding = guard * (1 + Math.abs(celsius));
  if (thermal.value === 0) return rise >= 0 ? withoutSettling(conditions) : everywhere;
  return dissipationZone(conditions, (rise - rounding) / thermal.value, (rise + rounding) / thermal.value);
}

/** Rises of the element, K, tried in turn as a bound inside which self-heating certainly settles. */
const boundingRises = [1000, 300, 100, 30];
/** Voltages, V, tried in turn as a bound inside which a voltage coefficient certainly settles. */
const boundingVoltages = [1e5, 1e4, 1e3, 100];

/** Where a part possibly has no operating point; nothing else can fail a check that has no allowance to hold it to. */
export function withoutSettling(conditions: Conditions): FailZone {
  const { load, thermal, axis } = conditions;
  if (load === undefined) return nowhere;
  const heats = axis.known && thermal !== undefined && thermal.value > 0;
  const bounds = heats ? boundingRises.map((rise) => rise / thermal.value) : [Infinity];
  for (const watt of bounds) {
    const possible = heats ? possiblyAbove(conditions, load, watt) : unheatedPossibly(conditions, load);
    if (possible.from > 0 || possible.to < Infinity) {
      return { ...nowhere, possibleFrom: possible.from, possibleTo: possible.to };
    }
  }
  return undecided;
}

/** Without heat only the voltage coefficient feeds back: R grows with its own voltage where a current is kept. */
function unheatedPossibly(conditions: Conditions, load: SteadyLoad): { from: number; to: number } {
  const axis = conditions.axis.known ? conditions.axis.celsius : NaN;
  if (conditions.voltageCoefficient === 0 || load.voltageMax < Infinity) {
    const deviation = deviationAt(conditions, axis, Math.min(load.voltageMax, Number.MAX_VALUE));
    return deviation < settlesBelow ? { from: Infinity, to: 0 } : { from: 0, to: Infinity };
  }
  if (load.currentMax === Infinity) return { from: 0, to: Infinity };
  for (const volt of boundingVoltages) {
    const deviation = deviationAt(conditions, axis, volt);
    if (deviation < settlesBelow) return { from: volt / (load.currentMax * (1 + deviation)), to: Infinity };
  }
  return { from: 0, to: Infinity };
}

function possiblyAbove(conditions: Conditions, load: SteadyLoad, watt: number): { from: number; to: number } {
  const most = Math.min(watt, load.powerMax, load.voltageMax * load.currentMax);
  // By a current alone, where I²·R stays inside the bound, I·R stays inside watt / I.
  const voltage = load.voltageMax < Infinity ? load.voltageMax : watt / load.currentMax;
  const bounded =
    load.voltageMax < Infinity || load.currentMax < Infinity || conditions.voltageCoefficient === 0;
  if (!bounded) return { from: 0, to: Infinity };
  const axis = conditions.axis.known ? conditions.axis.celsius : NaN;
  const heated = deviationAt(
    conditions,
    axis + (conditions.thermal?.value ?? 0) * most,
    Math.min(voltage, Number.MAX_VALUE),
  );
  // A deviation without end even inside the bound: whether such a part settles at all is to be seen one by one.
  return heated < runaway ? dissipationAbove(load, watt, heated) : { from: 0, to: Infinity };
}

/**
 * Open interval of nominal resistance in which the worst of min(U²/R, I²R, P) over R·(1 ± deviation) is above a
 * threshold (W): it rises with R by the current and falls by the voltage, so the set is one interval.
 */
function dissipationAbove(
  load: SteadyLoad,
  threshold: number,
  deviation: number,
): { from: number; to: number } {
  if (load.powerMax <= threshold || load.voltageMax * load.currentMax <= threshold)
    return { from: Infinity, to: 0 };
  return {
    from: load.currentMax === Infinity ? 0 : threshold / (load.currentMax ** 2 * (1 + deviation)),
    to:
      load.voltageMax === Infinity || deviation >= 1
        ? Infinity
        : load.voltageMax ** 2 / (threshold * (1 - deviation)),
  };
}

/** Where the steady voltage passes an allowance (V); it never falls as the resistance grows, so from one edge upwards. */
export function voltageZone(conditions: Conditions, allowance: number): FailZone {
  const load = conditions.load;
  if (load === undefined || load.voltageMax <= allowance * (1 - guard)) return nowhere;
  if (load.voltageMax <= allowance * (1 + guard)) return undecided;
  const byCurrent = load.currentMax === Infinity ? 0 : allowance / load.currentMax;
  const byPower = load.powerMax === Infinity ? 0 : allowance ** 2 / load.powerMax;
  const worst = Math.max(byCurrent, byPower);
  if (worst === 0) return everywhere;
  const axis = conditions.axis.known ? conditions.axis.celsius : NaN;
  const edge = (worst * (1 + guard)) / (1 + deviationAt(conditions, axis, 0));
  if (load.voltageMax === Infinity && load.powerMax === Infinity)
    return zoneByCurrent(conditions, allowance, edge);
  const bound = settle(conditions, edge / 2, edge);
  const deviation = bound.settled && bound.deviation < 0.9 ? bound.deviation : Infinity;
  return {
    certainFrom: edge,
    certainTo: Infinity,
    possibleFrom: (worst * (1 - guard)) / (1 + deviation),
    possibleTo: Infinity,
  };
}

/** Halvings of the logarithm of resistance; near the last resistance that settles each further one costs many steps. */
const halvings = 6;

/**
 * Where a voltage that a current alone brings about passes an allowance (V). Voltage and heat both grow with resistance,
 * so up to the last resistance that settles inside the allowance every part passes, and from the first that does not
 * every part fails.
 * @param edge Ω, from which even an unheated part fails
 */
function zoneByCurrent(conditions: Conditions, allowance: number, edge: number): FailZone {
  const passes = (ohm: number, volt: number): boolean => {
    const state = settle(conditions, ohm, ohm);
    return state.settled && state.voltage <= volt;
  };
  let high = edge;
  let low = edge / 2;
  while (low > edge * 1e-6 && !passes(low, allowance * (1 - guard))) {
    high = low;
    low /= 10;
  }
  if (low <= edge * 1e-6)
    return { certainFrom: high, certainTo: Infinity, possibleFrom: 0, possibleTo: Infinity };
  for (let step = 0; step < halvings; step += 1) {
    const middle = Math.sqrt(low * high);
    if (passes(middle, allowance * (1 - guard))) low = middle;
    else high = middle;
  }
  return {
    certainFrom: high * (1 + 3 * guard),
    certainTo: Infinity,
    possibleFrom: low,
    possibleTo: Infinity,
  };
}
