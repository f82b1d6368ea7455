import { fractionAt } from '@resistry/engineering/derating/curve';
import { formatQuantity } from '@resistry/engineering/notation/format-quantity';
import type { Ratings } from '@resistry/engineering/ratings/ratings';
import type { Shortfall } from './shortfall';

/** Forgives the noise of decimal fractions. */
const NOISE = 1e-9;

/** Forgives curves that were read off a page; what differs by more is told apart in five digits. */
const CURVE_NOISE = 1e-4;
const DIGITS = { significantDigits: 5 };

/** Just beyond the end of a curve, where nothing is left, K. */
const BEYOND = 1e-6;

/** By how much a mode dissipates less than another: by what is rated, or somewhere along curves on the same axis. */
export function dissipationShortfall(own: Ratings, other: Ratings): Shortfall | undefined {
  const [ownRated, otherRated] = [own.ratedDissipation, other.ratedDissipation];
  if (ownRated === undefined) return undefined;
  const words = formatQuantity(ownRated, 'power');
  if (otherRated === undefined) return { field: 'ratedDissipation', sense: 'unknown', own: words };
  if (otherRated < ownRated * (1 - NOISE)) {
    return {
      field: 'ratedDissipation',
      sense: 'worse',
      own: words,
      alternate: formatQuantity(otherRated, 'power'),
    };
  }
  return curveShortfall(own, ownRated, other, otherRated);
}

function curveShortfall(
  own: Ratings,
  ownRated: number,
  other: Ratings,
  otherRated: number,
): Shortfall | undefined {
  const [ownCurve, otherCurve] = [own.derating, other.derating];
  if (!ownCurve) return undefined;
  if (!otherCurve) return { field: 'derating', sense: 'unknown', own: 'stated' };
  // Temperatures of different places cannot be compared: the difference is named instead.
  if (ownCurve.axis !== otherCurve.axis) return undefined;
  const [worst] = [...ownCurve.points, ...otherCurve.points]
    .flatMap(([celsius]) => [
      { celsius, at: `at ${formatQuantity(celsius, 'temperature')}` },
      { celsius: celsius + BEYOND, at: `just above ${formatQuantity(celsius, 'temperature')}` },
    ])
    .map(({ celsius, at }) => ({
      at,
      own: ownRated * fractionAt(ownCurve, celsius),
      other: otherRated * fractionAt(otherCurve, celsius),
    }))
    .filter((point) => point.other < point.own * (1 - CURVE_NOISE))
    .sort((one, another) => one.other - one.own - (another.other - another.own));
  return (
    worst && {
      field: 'derating',
      sense: 'worse',
      own: `${formatQuantity(worst.own, 'power', DIGITS)} ${worst.at}`,
      alternate: `${formatQuantity(worst.other, 'power', DIGITS)} ${worst.at}`,
    }
  );
}
