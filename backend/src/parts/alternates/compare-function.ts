import { formatQuantity } from '@resistry/engineering/notation/format-quantity';
import type { Ratings } from '@resistry/engineering/ratings/ratings';
import { type Figure, figures } from './compared-figures';
import { dissipationShortfall } from './dissipation-shortfall';
import type { Shortfall } from './shortfall';

/** Forgives the noise of decimal fractions. */
const NOISE = 1e-9;

/** An operating mode of a part. */
export interface Mode {
  name?: string;
  ratings: Ratings;
}

export interface FunctionComparison {
  /** The mode of the replacement that stands for the first mode of the part. */
  mode: Mode;
  shortfalls: Shortfall[];
}

/**
 * Whether a part can do whatever the other one can, by their ratings: of every operating mode of the one to be replaced there
 * is a mode of the replacement that bears as much; voltage, category and tolerances are no narrower; no feature is lost. A
 * rating that the one states and the replacement does not is a shortfall that is `unknown`; one that the part to be replaced
 * does not state asks for nothing.
 *
 * @returns every shortfall, none for equals; undefined where one of the two has no operating mode at all
 */
export function compareFunction(
  own: readonly Mode[],
  other: readonly Mode[],
): FunctionComparison | undefined {
  const [first, second] = [own[0], other[0]];
  if (!first || !second) return undefined;
  const standIns = own.map((mode) => standInOf(mode, other, second));
  return {
    mode: standIns[0]?.mode ?? second,
    shortfalls: [
      ...figures
        .filter(({ counts }) => counts)
        .flatMap((figure) => narrower(figure, first.ratings, second.ratings)),
      ...lostFeatures(first.ratings, second.ratings),
      ...standIns.flatMap(({ shortfall }) => shortfall ?? []),
    ],
  };
}

interface StandIn {
  mode: Mode;
  shortfall?: Shortfall;
}

/** The mode that bears as much; else one that lacks only a rating; else the first. */
function standInOf(own: Mode, others: readonly Mode[], first: Mode): StandIn {
  const candidates = others.map((mode): StandIn => {
    const shortfall = dissipationShortfall(own.ratings, mode.ratings);
    return {
      mode,
      shortfall: shortfall && (own.name === undefined ? shortfall : { ...shortfall, mode: own.name }),
    };
  });
  return (
    candidates.find(({ shortfall }) => shortfall === undefined) ??
    candidates.find(({ shortfall }) => shortfall?.sense === 'unknown') ??
    candidates[0] ?? { mode: first }
  );
}

function narrower(figure: Figure, ownRatings: Ratings, otherRatings: Ratings): Shortfall[] {
  const [own, other] = [figure.of(ownRatings), figure.of(otherRatings)];
  if (own === undefined || isAsGood(figure, own, other)) return [];
  const words = (value: number): string => formatQuantity(value, figure.quantity);
  return other === undefined
    ? [{ field: figure.field, sense: 'unknown', own: words(own) }]
    : [{ field: figure.field, sense: 'worse', own: words(own), alternate: words(other) }];
}

function isAsGood({ better }: Figure, own: number, other: number | undefined): boolean {
  if (other === undefined) return false;
  const room = Math.abs(own) * NOISE;
  return better === 'higher' ? other >= own - room : other <= own + room;
}

function lostFeatures(own: Ratings, other: Ratings): Shortfall[] {
  return (own.features ?? [])
    .filter((feature) => !(other.features ?? []).includes(feature))
    .map((feature) => ({ field: 'features', sense: 'worse', own: feature }));
}
