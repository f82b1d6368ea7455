import { allowedElementTemperature } from '../checks/element-temperature';
import type { CheckDefinition, Status } from '../checks/check';
import { standingChecks } from '../checks/list';
import type { Conditions } from '../operating/conditions';
import { settle, type OperatingState } from '../operating/settle';
import type { AskedCheck } from './asked-checks';
import { classifyValue } from './classify-value';
import { ratedZone, temperatureZone, voltageZone, withoutSettling, type FailZone } from './fail-zone';
import { firstAbove, firstNotBelow, setBit, type RowMasks } from './row-masks';

/** Outside the window a part fails whatever its deviation; the guard keeps rounding out of it. */
const guard = 1e-6;

/**
 * Holds one row of parts (same ratings, one operating mode, resistances rising) against its conditions: sets, for each
 * part of [from, to), the bits of the checks that are unmet and unrated. Checks of the part's standing are left out.
 * Exact: every status equals that of assessing the part alone.
 */
export function evaluateRow(
  conditions: Conditions,
  checks: readonly AskedCheck[],
  resistances: Float64Array,
  from: number,
  to: number,
  masks: RowMasks,
): void {
  masks.unmet.fill(0, from, to);
  masks.unrated.fill(0, from, to);
  const rest = stateAtRest(conditions);
  for (const { definition, bit } of checks) {
    if (standingChecks.has(definition.name)) continue;
    if (!definition.asked(conditions.requirement, conditions.ratings, undefined)) continue;
    if (!definition.variesWithResistance || conditions.ratings.resistance === 0) {
      spread(masks, from, to, bit, definition.find({ conditions, state: rest }).status);
    } else if (definition.name === 'value') {
      evaluateValue(conditions, definition, bit, resistances, from, to, masks, rest);
    } else {
      evaluateByZone(conditions, definition, bit, resistances, from, to, masks, rest);
    }
  }
}

/** The part before any load heats it: the least that every check can demand. */
function stateAtRest(conditions: Conditions): OperatingState {
  const celsius = conditions.axis.known ? conditions.axis.celsius : NaN;
  const riseKnown = conditions.load === undefined || conditions.thermal !== undefined;
  return {
    nominal: conditions.ratings.resistance,
    low: 0,
    high: 0,
    deviation: 0,
    dissipation: 0,
    voltage: 0,
    hot: riseKnown ? celsius : NaN,
    hotKnown: celsius,
    steps: 0,
    settled: true,
  };
}

function spread(masks: RowMasks, from: number, to: number, bit: number, status: Status): void {
  if (status === 'unmet') setBit(masks.unmet, from, to, bit);
  else if (status === 'unrated') setBit(masks.unrated, from, to, bit);
}

function evaluateValue(
  conditions: Conditions,
  definition: CheckDefinition,
  bit: number,
  resistances: Float64Array,
  from: number,
  to: number,
  masks: RowMasks,
  rest: OperatingState,
): void {
  const window = conditions.requirement.window;
  if (window === undefined) return;
  if (conditions.requirement.link) {
    spread(masks, from, to, bit, 'unmet');
    return;
  }
  const first = firstNotBelow(resistances, from, to, window.lower * (1 - guard));
  const last = firstAbove(resistances, first, to, window.upper * (1 + guard));
  setBit(masks.unmet, from, first, bit);
  setBit(masks.unmet, last, to, bit);
  if (first >= last) return;
  // A part in the middle of the window with no deviation: what it lacks, every part of the row lacks.
  const middle = Number.isFinite(window.upper) ? (window.lower + window.upper) / 2 : window.lower * 2;
  const atRest = definition.find({ conditions, state: { ...rest, nominal: middle } }).status;
  classifyValue({ conditions, window, resistances, masks, bit, atRest }, first, last);
}

function evaluateByZone(
  conditions: Conditions,
  definition: CheckDefinition,
  bit: number,
  resistances: Float64Array,
  from: number,
  to: number,
  masks: RowMasks,
  rest: OperatingState,
): void {
  const passing = definition.find({ conditions, state: rest }).status;
  if (passing === 'unmet') {
    setBit(masks.unmet, from, to, bit);
    return;
  }
  if (passing === 'unrated') setBit(masks.unrated, from, to, bit);
  const zone = zoneOf(conditions, definition);
  const possibleFrom = firstAbove(resistances, from, to, zone.possibleFrom);
  const possibleTo = firstNotBelow(resistances, possibleFrom, to, zone.possibleTo);
  const certainFrom = clamp(firstAbove(resistances, from, to, zone.certainFrom), possibleFrom, possibleTo);
  const certainTo = clamp(firstNotBelow(resistances, from, to, zone.certainTo), certainFrom, possibleTo);
  for (let index = certainFrom; index < certainTo; index += 1) {
    masks.unmet[index] = (masks.unmet[index] ?? 0) | bit;
    masks.unrated[index] = (masks.unrated[index] ?? 0) & ~bit;
  }
  assessEach(conditions, definition, bit, resistances, possibleFrom, certainFrom, masks);
  assessEach(conditions, definition, bit, resistances, certainTo, possibleTo, masks);
}

function zoneOf(conditions: Conditions, definition: CheckDefinition): FailZone {
  if (definition.name === 'voltage') {
    const allowed = conditions.allowedVoltage;
    return allowed.known ? voltageZone(conditions, allowed.value) : withoutSettling(conditions);
  }
  if (definition.name === 'dissipation') {
    const allowed = conditions.allowedDissipation;
    return allowed.known ? ratedZone(conditions, allowed.value) : withoutSettling(conditions);
  }
  const celsius = allowedElementTemperature(conditions);
  return celsius === undefined ? withoutSettling(conditions) : temperatureZone(conditions, celsius);
}

function assessEach(
  conditions: Conditions,
  definition: CheckDefinition,
  bit: number,
  resistances: Float64Array,
  from: number,
  to: number,
  masks: RowMasks,
): void {
  for (let index = from; index < to; index += 1) {
    const resistance = resistances[index] ?? NaN;
    const state = settle(conditions, resistance, resistance);
    const { status } = definition.find({ conditions, state });
    masks.exact += 1;
    masks.unmet[index] = ((masks.unmet[index] ?? 0) & ~bit) | (status === 'unmet' ? bit : 0);
    masks.unrated[index] = ((masks.unrated[index] ?? 0) & ~bit) | (status === 'unrated' ? bit : 0);
  }
}

function clamp(value: number, from: number, to: number): number {
  return Math.min(to, Math.max(from, value));
}
