import type { Quantity } from '@resistry/engineering/notation/quantity';
import type { ReactNode } from 'react';
import { Figure } from '../../components/figure';
import { CurvePoints } from './curve-points';
import type { FamilySize, SizeRatings } from './requests/family-revision';

/** One line of the ratings, over all sizes and operating modes. */
export interface RatingRow {
  label: string;
  /** The field that citations name. */
  field: string;
  /** Undefined where the datasheet states nothing. */
  show: (ratings: SizeRatings, size: FamilySize) => ReactNode | undefined;
}

type NumberField = {
  [Field in keyof SizeRatings]-?: SizeRatings[Field] extends number | undefined ? Field : never;
}[keyof SizeRatings];

const shown = (value: number | undefined, quantity: Quantity): ReactNode | undefined =>
  value === undefined ? undefined : <Figure value={value} quantity={quantity} />;

const number = (label: string, field: NumberField, quantity: Quantity): RatingRow => ({
  label,
  field,
  show: (ratings) => shown(ratings[field], quantity),
});

const axisWords = { ambient: 'of the air', terminal: 'of the terminals', case: 'of the case' } as const;

const load: readonly RatingRow[] = [
  number('Rated dissipation', 'ratedDissipation', 'power'),
  {
    label: 'Derating',
    field: 'derating',
    show: ({ derating }) =>
      derating && (
        <>
          by temperature {axisWords[derating.axis]}:{' '}
          {derating.points.map(([celsius, fraction], index) => (
            <span key={celsius}>
              {index > 0 && ', '}
              <Figure value={fraction} quantity="fraction" /> at{' '}
              <Figure value={celsius} quantity="temperature" />
            </span>
          ))}
        </>
      ),
  },
  number('Limiting element voltage', 'limitingElementVoltage', 'voltage'),
  number('Overload voltage', 'overloadVoltage', 'voltage'),
  number('Insulation voltage', 'insulationVoltage', 'voltage'),
  {
    label: 'Category temperatures',
    field: 'category',
    show: ({ category }) =>
      category && (
        <>
          <Figure value={category.min} quantity="temperature" /> to{' '}
          <Figure value={category.max} quantity="temperature" />
        </>
      ),
  },
  number('Highest element temperature', 'maxElementTemperature', 'temperature'),
  number('Thermal resistance to the axis', 'thermalResistance', 'thermal-resistance'),
];

const pulses: readonly RatingRow[] = [
  {
    label: 'Single pulses',
    field: 'pulses',
    show: ({ pulses: rated }) =>
      rated?.single && (
        <>
          <CurvePoints points={rated.single} quantity="power" />
          {rated.singleCount !== undefined && (
            <span className="not-stated">for {rated.singleCount.toLocaleString('en')} pulses</span>
          )}
        </>
      ),
  },
  {
    label: 'Repeated pulses',
    field: 'pulses',
    show: ({ pulses: rated }) =>
      rated?.continuous && <CurvePoints points={rated.continuous} quantity="power" />,
  },
  {
    label: 'Pulse voltage',
    field: 'pulses',
    show: ({ pulses: rated }) => {
      if (rated?.voltage === undefined) return undefined;
      if (typeof rated.voltage === 'number') return shown(rated.voltage, 'voltage');
      return <CurvePoints points={rated.voltage} quantity="voltage" />;
    },
  },
  { label: 'Pulse energy', field: 'pulses', show: ({ pulses: rated }) => shown(rated?.energy, 'energy') },
  { label: 'Shift by pulses', field: 'pulses', show: ({ pulses: rated }) => shown(rated?.shift, 'fraction') },
];

const accuracy: readonly RatingRow[] = [
  {
    label: 'Drift in the endurance test',
    field: 'drift',
    show: ({ drift }) =>
      drift && (
        <>
          <Figure value={drift.fraction} quantity="fraction" /> after {drift.hours.toLocaleString('en')}{' '}
          <span className="not-stated">h</span> at <Figure value={drift.temperature} quantity="temperature" />
          {drift.law !== undefined && (
            <span className="not-stated">
              {' '}
              growing as time to the {drift.law.exponent}, twice as fast every {drift.law.doubling} K
            </span>
          )}
        </>
      ),
  },
  number('Shift by soldering', 'solderShift', 'fraction'),
  number('Shift by humidity', 'humidityShift', 'fraction'),
  number('Voltage coefficient', 'voltageCoefficient', 'voltage-coefficient'),
  number('Temperature the TCR refers to', 'referenceTemperature', 'temperature'),
  number('Current-noise index', 'noiseIndex', 'noise-index'),
  number('Inductance', 'inductance', 'inductance'),
  number('Capacitance', 'capacitance', 'capacitance'),
];

const bodyAndLink: readonly RatingRow[] = [
  {
    label: 'Body, length × width × height',
    field: 'body',
    show: (_ratings, { body }) =>
      body && (
        <>
          <Figure value={body.length} quantity="length" /> × <Figure value={body.width} quantity="length" /> ×{' '}
          <Figure value={body.height} quantity="length" />
        </>
      ),
  },
  { label: 'Land pattern', field: 'landPattern', show: (_ratings, size) => size.landPattern },
  { label: 'Termination', field: 'termination', show: (_ratings, size) => size.termination },
  { label: 'Soldering', field: 'soldering', show: (_ratings, size) => size.soldering },
  { label: 'Link: rated current', field: 'link', show: ({ link }) => shown(link?.ratedCurrent, 'current') },
  {
    label: 'Link: largest resistance',
    field: 'link',
    show: ({ link }) => shown(link?.residualResistance, 'resistance'),
  },
];

/** Everything a family may state of a size, grouped as an engineer reads it. */
export const ratingGroups: readonly { title: string; rows: readonly RatingRow[] }[] = [
  { title: 'Load and temperature', rows: load },
  { title: 'Pulses', rows: pulses },
  { title: 'Accuracy, noise and frequency', rows: accuracy },
  { title: 'Body and link', rows: bodyAndLink },
];
