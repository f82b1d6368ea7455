import { fractionAt } from '@resistry/engineering/derating/curve';
import type { Ratings } from '@resistry/engineering/ratings/ratings';

/** Forgives the noise of decimal fractions. */
const NOISE = 1e-9;

/** Just beyond the end of a curve, where nothing is left, K. */
const BEYOND = 1e-6;

/** An operating mode of a part. */
export interface Mode {
  name?: string;
  ratings: Ratings;
}

/**
 * Whether a part can do whatever the other one can, by their ratings: of every operating mode of the one to be replaced there
 * is a mode of the replacement that bears as much, and voltage, category and tolerances are no narrower. A rating that the one
 * states and the replacement does not is not as good; one that the part to be replaced does not state asks for nothing.
 *
 * @returns the mode of the replacement that stands for the first mode of the part; undefined where it is no equal
 */
export function equalMode(own: readonly Mode[], other: readonly Mode[]): Mode | undefined {
  const [first, second] = [own[0], other[0]];
  if (!first || !second || !isAsWide(first.ratings, second.ratings)) return undefined;
  const standIns = own.map((mode) => other.find((candidate) => bearsAsMuch(mode.ratings, candidate.ratings)));
  return standIns.every((mode) => mode !== undefined) ? standIns[0] : undefined;
}

/** Rated dissipation, and dissipation at every temperature where both curves stand on the same axis. */
function bearsAsMuch(own: Ratings, other: Ratings): boolean {
  if (own.ratedDissipation === undefined) return true;
  if (!atLeast(own.ratedDissipation, other.ratedDissipation)) return false;
  const [ownCurve, otherCurve] = [own.derating, other.derating];
  if (!ownCurve) return true;
  if (!otherCurve) return false;
  // Temperatures of different places cannot be compared: the difference is named instead.
  if (ownCurve.axis !== otherCurve.axis) return true;
  const [ownRated, otherRated] = [own.ratedDissipation, other.ratedDissipation ?? 0];
  return [...ownCurve.points, ...otherCurve.points]
    .flatMap(([celsius]) => [celsius, celsius + BEYOND])
    .every(
      (celsius) =>
        otherRated * fractionAt(otherCurve, celsius) >= ownRated * fractionAt(ownCurve, celsius) * (1 - 1e-6),
    );
}

function isAsWide(own: Ratings, other: Ratings): boolean {
  return (
    atLeast(own.limitingElementVoltage, other.limitingElementVoltage) &&
    atMost(own.tolerance, other.tolerance) &&
    atMost(own.tcr, other.tcr) &&
    atMost(own.category?.min, other.category?.min) &&
    atLeast(own.category?.max, other.category?.max) &&
    atLeast(own.link?.ratedCurrent, other.link?.ratedCurrent) &&
    atMost(own.link?.residualResistance, other.link?.residualResistance)
  );
}

function atLeast(own: number | undefined, other: number | undefined): boolean {
  return own === undefined || (other !== undefined && other >= own - Math.abs(own) * NOISE);
}

function atMost(own: number | undefined, other: number | undefined): boolean {
  return own === undefined || (other !== undefined && other <= own + Math.abs(own) * NOISE);
}
