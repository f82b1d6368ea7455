import { formatQuantity } from '@resistry/engineering/notation/format-quantity';
import type { DeratingCurve, Ratings } from '@resistry/engineering/ratings/ratings';
import { type Figure, figures } from './compared-figures';

export const senses = ['better', 'worse', 'different', 'unknown'] as const;
/** `unknown`: one of the two does not state it. */
export type Sense = (typeof senses)[number];

/** In what an alternate differs from the part; texts with units, absent where it is not stated. */
export interface Difference {
  field: string;
  /** Operating mode of the part that it is about, where only one of several is. */
  mode?: string;
  sense: Sense;
  own?: string;
  alternate?: string;
}

/** What the drawing of a size adds to its ratings. */
export interface Form {
  bodyStyle: string;
  termination?: string;
}

/** Every difference between a part and an alternate, rating by rating. */
export function differencesBetween(
  own: { ratings: Ratings; form: Form },
  other: { ratings: Ratings; form: Form },
): Difference[] {
  return [
    ...figures.map((figure) => differenceOfFigures(figure, own.ratings, other.ratings)),
    differenceOfTexts('technology', own.ratings.technology, other.ratings.technology),
    differenceOfTexts('derating', curveWords(own.ratings.derating), curveWords(other.ratings.derating)),
    differenceOfTexts('drift', driftWords(own.ratings), driftWords(other.ratings)),
    differenceOfPulses(own.ratings, other.ratings),
    ...differencesOfSets('features', 'different', own.ratings.features, other.ratings.features),
    ...differencesOfSets('certificates', 'better', own.ratings.certificates, other.ratings.certificates),
    differenceOfTexts('bodyStyle', own.form.bodyStyle, other.form.bodyStyle),
    differenceOfTexts('termination', own.form.termination, other.form.termination),
  ].filter((difference) => difference !== undefined);
}

function differenceOfFigures(figure: Figure, own: Ratings, other: Ratings): Difference | undefined {
  const [ownValue, otherValue] = [figure.of(own), figure.of(other)];
  if (ownValue === otherValue) return undefined;
  return {
    field: figure.field,
    sense: senseOf(figure, ownValue, otherValue),
    own: ownValue === undefined ? undefined : formatQuantity(ownValue, figure.quantity),
    alternate: otherValue === undefined ? undefined : formatQuantity(otherValue, figure.quantity),
  };
}

function senseOf({ better }: Figure, own: number | undefined, other: number | undefined): Sense {
  if (own === undefined || other === undefined) return 'unknown';
  if (better === undefined) return 'different';
  return other > own === (better === 'higher') ? 'better' : 'worse';
}

function differenceOfTexts(
  field: string,
  own: string | undefined,
  alternate: string | undefined,
): Difference | undefined {
  if (own === alternate) return undefined;
  const sense = own === undefined || alternate === undefined ? 'unknown' : 'different';
  return { field, sense, own, alternate };
}

/** What is held against each other are curves; they are shown, not told in a line. */
function differenceOfPulses(own: Ratings, other: Ratings): Difference | undefined {
  const [ownText, otherText] = [JSON.stringify(own.pulses), JSON.stringify(other.pulses)];
  if (ownText === otherText) return undefined;
  const sense = own.pulses === undefined || other.pulses === undefined ? 'unknown' : 'different';
  return {
    field: 'pulses',
    sense,
    own: own.pulses && 'stated',
    alternate: other.pulses && 'stated',
  };
}

/** @param gained what it means to have one more: a certificate is welcome, but not every circuit wants a fuse */
function differencesOfSets(
  field: string,
  gained: Sense,
  own: readonly string[] = [],
  other: readonly string[] = [],
): Difference[] {
  const lost = own.filter((entry) => !other.includes(entry));
  const more = other.filter((entry) => !own.includes(entry));
  return [
    ...lost.map((entry): Difference => ({ field, sense: 'worse', own: entry })),
    ...more.map((entry): Difference => ({ field, sense: gained, alternate: entry })),
  ];
}

function curveWords(curve: DeratingCurve | undefined): string | undefined {
  if (!curve) return undefined;
  const points = curve.points.map(
    ([celsius, fraction]) =>
      `${formatQuantity(fraction, 'fraction')} at ${formatQuantity(celsius, 'temperature')}`,
  );
  return `${curve.axis}: ${points.join(', ')}`;
}

function driftWords({ drift }: Ratings): string | undefined {
  if (!drift) return undefined;
  const test = `${drift.hours} h at ${formatQuantity(drift.temperature, 'temperature')}`;
  return `${formatQuantity(drift.fraction, 'fraction')} in ${test}`;
}
