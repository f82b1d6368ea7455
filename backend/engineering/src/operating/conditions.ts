import { allowedFraction } from '../derating/policy-line';
import { driftOverLife, type DriftOverLife } from '../deviation/drift';
import { altitudeFactor } from '../derating/altitude-factor';
import { entryFor, type Policy, type PolicyEntry } from '../derating/policy-entry';
import type { Duty } from '../duty/duty';
import type { Requirement } from '../duty/requirement';
import type { SteadyLoad } from '../duty/steady-load';
import { standardReferenceTemperature, type Ratings } from '../ratings/ratings';
import { thermalResistanceOf, type ThermalResistance } from '../thermal/thermal-resistance';
import { axisTemperature, type AxisTemperature } from './axis-temperature';

/** A quantity that is known, or the data that are missing for it. */
export type Known = { known: true; value: number } | { known: false; missing: readonly string[] };

/**
 * Everything in an assessment that does not depend on the resistance: one set of ratings under one requirement and one
 * policy, flattened so that a search can hold it against many resistances. SI; temperatures in °C.
 */
export interface Conditions {
  ratings: Ratings;
  requirement: Requirement;
  /** Policy entry in force; undefined with `policyUnmatched` false = manufacturer's ratings as they are. */
  entry?: PolicyEntry;
  policyUnmatched: boolean;
  axis: AxisTemperature;
  thermal?: ThermalResistance;
  /** Fraction of the rated dissipation at the axis temperature with the policy's line, without the altitude. */
  fraction: Known;
  altitude: Known;
  allowedDissipation: Known;
  allowedVoltage: Known;
  load?: SteadyLoad;
  rootSumSquare: boolean;
  /** Known deviations that never change with the load: their sum, and the sum of their squares. */
  fixedSum: number;
  fixedSquares: number;
  /** 1/K; 0 where missing or where no ambient is stated (the budget then says so). */
  tcr: number;
  referenceTemperature: number;
  /** Reference temperature less the coldest, unloaded one, K. */
  coldSpan: number;
  /** 1/V; 0 where missing. */
  voltageCoefficient: number;
  /** Absent without a stated life or a stated drift. */
  driftOverLife?: DriftOverLife;
  hours: number;
}

/**
 * What every part of one size and operating mode shares under the same surroundings, whatever its tolerance and TCR and
 * whatever the load and the window.
 */
type SharedConditions = Omit<
  Conditions,
  'ratings' | 'requirement' | 'load' | 'rootSumSquare' | 'fixedSum' | 'fixedSquares' | 'tcr'
>;

/**
 * Flattens one set of ratings under a requirement and a policy.
 * @param sibling conditions of the same size and operating mode, with any tolerance, TCR and duty, if there are any: what
 *   they share is not worked out again. Surroundings and policy entries are the same if they are the same objects.
 */
export function conditionsOf(
  ratings: Ratings,
  requirement: Requirement,
  policy: Policy,
  sibling?: Conditions,
): Conditions {
  const { duty } = requirement;
  const entry = policy === 'none' ? undefined : entryFor(policy.entries, ratings);
  const policyUnmatched = policy !== 'none' && entry === undefined;
  const shares =
    sibling !== undefined &&
    sibling.entry === entry &&
    sibling.policyUnmatched === policyUnmatched &&
    haveSameSurroundings(sibling.requirement.duty, duty);
  const shared = shares ? sibling : sharedConditionsOf(ratings, duty, entry, policyUnmatched);
  const pulseShift = hasPulses(requirement) ? (ratings.pulses?.shift ?? 0) : 0;
  const tolerance = ratings.tolerance ?? 0;
  const solderShift = ratings.solderShift ?? 0;
  const humidityShift = ratings.humidityShift ?? 0;
  // Field by field: this is made for every row of a catalogue at every search, and a spread costs ten times as much.
  return {
    ratings,
    requirement,
    load: requirement.load,
    rootSumSquare: duty.deviation === 'root-sum-square',
    fixedSum: tolerance + solderShift + humidityShift + pulseShift,
    fixedSquares: tolerance ** 2 + solderShift ** 2 + humidityShift ** 2 + pulseShift ** 2,
    tcr: duty.ambient === undefined ? 0 : (ratings.tcr ?? 0),
    entry: shared.entry,
    policyUnmatched: shared.policyUnmatched,
    axis: shared.axis,
    thermal: shared.thermal,
    fraction: shared.fraction,
    altitude: shared.altitude,
    allowedDissipation: shared.allowedDissipation,
    allowedVoltage: shared.allowedVoltage,
    referenceTemperature: shared.referenceTemperature,
    coldSpan: shared.coldSpan,
    voltageCoefficient: shared.voltageCoefficient,
    driftOverLife: shared.driftOverLife,
    hours: shared.hours,
  };
}

function haveSameSurroundings(first: Duty, second: Duty): boolean {
  return first.ambient === second.ambient && first.life === second.life;
}

function sharedConditionsOf(
  ratings: Ratings,
  duty: Duty,
  entry: PolicyEntry | undefined,
  policyUnmatched: boolean,
): SharedConditions {
  const axis = axisTemperature(duty, ratings.derating?.axis ?? 'ambient');
  const referenceTemperature = ratings.referenceTemperature ?? standardReferenceTemperature;
  const fraction = fractionOf(ratings, entry, policyUnmatched, axis);
  const altitude = altitudeOf(entry, duty.ambient?.altitude);
  return {
    entry,
    policyUnmatched,
    axis,
    thermal: thermalResistanceOf(ratings),
    fraction,
    altitude,
    allowedDissipation: allowedDissipationOf(ratings, fraction, altitude),
    allowedVoltage: allowedVoltageOf(ratings, entry, policyUnmatched),
    referenceTemperature,
    coldSpan: duty.ambient === undefined ? 0 : referenceTemperature - duty.ambient.min,
    voltageCoefficient: ratings.voltageCoefficient ?? 0,
    driftOverLife:
      duty.life === undefined || ratings.drift === undefined
        ? undefined
        : driftOverLife(ratings.technology, ratings.drift, duty.life.hours),
    hours: duty.life?.hours ?? 0,
  };
}

/** Whether the duty states pulses, whose heat and shift then belong to every check of heat and deviation. */
export function hasPulses(requirement: Requirement): boolean {
  return (requirement.duty.pulses?.length ?? 0) > 0;
}

const unmatched = 'an entry of the derating policy for this part';

function fractionOf(
  ratings: Ratings,
  entry: PolicyEntry | undefined,
  policyUnmatched: boolean,
  axis: AxisTemperature,
): Known {
  const missing: string[] = [];
  if (policyUnmatched) missing.push(unmatched);
  if (!axis.known) missing.push(axis.missing);
  if (ratings.derating === undefined) missing.push('derating');
  if (missing.length > 0 || !axis.known || ratings.derating === undefined) return { known: false, missing };
  return { known: true, value: allowedFraction(ratings.derating, entry, axis.celsius) };
}

function altitudeOf(entry: PolicyEntry | undefined, metre: number | undefined): Known {
  const factor = altitudeFactor(entry, metre);
  return factor.known ? { known: true, value: factor.factor } : { known: false, missing: [factor.missing] };
}

function allowedDissipationOf(ratings: Ratings, fraction: Known, altitude: Known): Known {
  const missing = [
    ...(ratings.ratedDissipation === undefined ? ['ratedDissipation'] : []),
    ...(fraction.known ? [] : fraction.missing),
    ...(altitude.known ? [] : altitude.missing),
  ];
  if (ratings.ratedDissipation === undefined || !fraction.known || !altitude.known)
    return { known: false, missing };
  return { known: true, value: ratings.ratedDissipation * fraction.value * altitude.value };
}

function allowedVoltageOf(ratings: Ratings, entry: PolicyEntry | undefined, policyUnmatched: boolean): Known {
  const missing = [
    ...(ratings.limitingElementVoltage === undefined ? ['limitingElementVoltage'] : []),
    ...(policyUnmatched ? [unmatched] : []),
  ];
  if (ratings.limitingElementVoltage === undefined || policyUnmatched) return { known: false, missing };
  return { known: true, value: ratings.limitingElementVoltage * (entry?.voltageRatio ?? 1) };
}
