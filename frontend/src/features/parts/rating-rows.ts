import { formatQuantity } from '@resistry/engineering/notation/format-quantity';
import type { Quantity } from '@resistry/engineering/notation/quantity';
import type { Ratings } from '@resistry/engineering/ratings/ratings';
import { featureWords, mountingWords } from '../../wording/technology-words';
import {
  bodyText,
  deratingText,
  driftText,
  pulseVoltageText,
  repeatedPulsesText,
  singlePulsesText,
} from './rating-texts';

/** One rating as a line of the table: its field, under which it is cited, and its words in each mode. */
export interface RatingRow {
  field: string;
  /** Undefined where the datasheet does not state it. */
  words: (ratings: Ratings) => string | undefined;
  /** Of links only, or of resistors only; of both where absent. */
  only?: 'link' | 'resistor';
}

const figure = (
  field: string,
  quantity: Quantity,
  of: (ratings: Ratings) => number | undefined,
  only?: RatingRow['only'],
): RatingRow => ({
  field,
  only,
  words: (ratings) => {
    const value = of(ratings);
    return value === undefined ? undefined : formatQuantity(value, quantity);
  },
});

/** The ratings in the order in which a datasheet is read. */
export const ratingRows: readonly RatingRow[] = [
  figure('resistance', 'resistance', (ratings) => ratings.resistance, 'resistor'),
  figure('tolerance', 'tolerance', (ratings) => ratings.tolerance, 'resistor'),
  figure('tcr', 'temperature-coefficient', (ratings) => ratings.tcr, 'resistor'),
  figure('referenceTemperature', 'temperature', (ratings) => ratings.referenceTemperature, 'resistor'),
  figure('link.ratedCurrent', 'current', (ratings) => ratings.link?.ratedCurrent, 'link'),
  figure('link.residualResistance', 'resistance', (ratings) => ratings.link?.residualResistance, 'link'),
  figure('ratedDissipation', 'power', (ratings) => ratings.ratedDissipation, 'resistor'),
  { field: 'derating', words: deratingText },
  figure('limitingElementVoltage', 'voltage', (ratings) => ratings.limitingElementVoltage, 'resistor'),
  figure('overloadVoltage', 'voltage', (ratings) => ratings.overloadVoltage, 'resistor'),
  figure('insulationVoltage', 'voltage', (ratings) => ratings.insulationVoltage),
  {
    field: 'category',
    words: ({ category }) =>
      category &&
      `${formatQuantity(category.min, 'temperature')} to ${formatQuantity(category.max, 'temperature')}`,
  },
  figure('maxElementTemperature', 'temperature', (ratings) => ratings.maxElementTemperature),
  figure('thermalResistance', 'thermal-resistance', (ratings) => ratings.thermalResistance, 'resistor'),
  figure('voltageCoefficient', 'voltage-coefficient', (ratings) => ratings.voltageCoefficient, 'resistor'),
  { field: 'drift', only: 'resistor', words: driftText },
  figure('solderShift', 'fraction', (ratings) => ratings.solderShift, 'resistor'),
  figure('humidityShift', 'fraction', (ratings) => ratings.humidityShift, 'resistor'),
  figure('noiseIndex', 'noise-index', (ratings) => ratings.noiseIndex, 'resistor'),
  { field: 'pulses.single', only: 'resistor', words: singlePulsesText },
  { field: 'pulses.continuous', only: 'resistor', words: repeatedPulsesText },
  { field: 'pulses.voltage', only: 'resistor', words: pulseVoltageText },
  figure('pulses.energy', 'energy', (ratings) => ratings.pulses?.energy, 'resistor'),
  figure('pulses.shift', 'fraction', (ratings) => ratings.pulses?.shift, 'resistor'),
  figure('inductance', 'inductance', (ratings) => ratings.inductance),
  figure('capacitance', 'capacitance', (ratings) => ratings.capacitance),
  { field: 'mounting', words: ({ mounting }) => mounting && mountingWords[mounting] },
  { field: 'body', words: bodyText },
  {
    field: 'features',
    words: ({ features = [] }) =>
      features.length === 0
        ? 'none claimed'
        : features.map((feature) => featureWords[feature].toLowerCase()).join(', '),
  },
  { field: 'failureRateStyle', only: 'resistor', words: ({ failureRateStyle }) => failureRateStyle },
];

/** The rows that make sense for a part: a link has no tolerance, and a resistor no residual resistance. */
export function rowsFor(resistance: number): RatingRow[] {
  const kind = resistance === 0 ? 'link' : 'resistor';
  return ratingRows.filter((row) => row.only === undefined || row.only === kind);
}
