import type { CheckDefinition, Status } from '../checks/check';
import { allowedElementTemperature } from '../checks/element-temperature';
import { standingChecks } from '../checks/list';
import type { Conditions, Known } from '../operating/conditions';
import type { OperatingState } from '../operating/settle';
import type { AskedCheck } from './asked-checks';
import { nowhere, ratedZone, temperatureZone, voltageZone, type FailZone } from './fail-zone';

/** How one check answers over a row: as `unloaded` says, but unmet inside its zone. */
export interface RowAnswer {
  definition: CheckDefinition;
  bit: number;
  /** Status of a part that no load heats or strains: the least that the check can demand. */
  unloaded: Status;
  /** Where the load makes it fail; nowhere for a check that does not look at the resistance, or looks at it alone. */
  zone: FailZone;
}

/** The answers over one row (same ratings, one operating mode) to every check but those of the part's standing. */
export function answersOf(conditions: Conditions, checks: readonly AskedCheck[]): RowAnswer[] {
  const { requirement, ratings } = conditions;
  const state = stateAtRest(conditions);
  const answers: RowAnswer[] = [];
  for (const { definition, bit } of checks) {
    if (standingChecks.has(definition.name)) continue;
    if (!definition.asked(requirement, ratings, undefined)) continue;
    const unloaded = definition.find({ conditions, state }).status;
    const zone = unloaded === 'unmet' ? nowhere : zoneOf(conditions, definition);
    answers.push({ definition, bit, unloaded, zone });
  }
  return answers;
}

/** A part before any load heats it, in the middle of the window: there its deviation has the most room. */
export function stateAtRest(conditions: Conditions): OperatingState {
  const celsius = conditions.axis.known ? conditions.axis.celsius : NaN;
  const riseKnown = conditions.load === undefined || conditions.thermal !== undefined;
  const window = conditions.requirement.window;
  const middle =
    window && (Number.isFinite(window.upper) ? (window.lower + window.upper) / 2 : window.lower * 2);
  return {
    nominal: middle ?? conditions.ratings.resistance,
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

function zoneOf(conditions: Conditions, { name, variesWithResistance }: CheckDefinition): FailZone {
  if (!variesWithResistance || conditions.ratings.resistance === 0) return nowhere;
  if (name === 'dissipation') return ratedZone(conditions, ifKnown(conditions.allowedDissipation));
  if (name === 'voltage') return voltageZone(conditions, ifKnown(conditions.allowedVoltage));
  if (name === 'element-temperature')
    return temperatureZone(conditions, allowedElementTemperature(conditions));
  return nowhere;
}

function ifKnown(quantity: Known): number | undefined {
  return quantity.known ? quantity.value : undefined;
}
