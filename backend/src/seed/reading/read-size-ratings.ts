import { faultOfCurve } from '@resistry/engineering/derating/curve';
import { deratingAxes } from '@resistry/engineering/ratings/ratings';
import { mountings } from '@resistry/engineering/ratings/technology';
import type { BindValue } from '../../database/bind-values';
import type { Columns, FamilySizeRatings } from '../family';
import type { Fields } from './fields';
import { modeQuantities, sizeQuantities, sizeTexts } from './rating-fields';

const bodyStyles = ['chip', 'melf', 'axial', 'cemented', 'housed', 'strip', 'radial'] as const;

/** Reads the merged ratings of one size of a revision. */
export function readSizeRatings(fields: Fields): FamilySizeRatings {
  const [length, width, height] = fields.optional('body', () => fields.quantities('body', 'length', 3)) ?? [];
  const [lowest, highest] =
    fields.optional('category', () => fields.quantities('category', 'temperature', 2)) ?? [];
  const link = fields.optional('link', () =>
    fields.one('link', (inner) => ({
      current: inner.quantity('ratedCurrent', 'current'),
      resistance: inner.quantity('residualResistance', 'resistance'),
    })),
  );
  const pulses = fields.optional('pulses', () => fields.one('pulses', readPulses));
  const columns: Record<string, BindValue> = {
    mounting: fields.optional('mounting', () => fields.choice('mounting', mountings)) ?? null,
    body_style: fields.choice('bodyStyle', bodyStyles),
    body_length_metre: length ?? null,
    body_width_metre: width ?? null,
    body_height_metre: height ?? null,
    category_min_celsius: lowest ?? null,
    category_max_celsius: highest ?? null,
    pulses: pulses === undefined ? null : JSON.stringify(pulses),
    link_rated_current_ampere: link?.current ?? null,
    link_residual_resistance_ohm: link?.resistance ?? null,
  };
  for (const [name, [column, quantity]] of Object.entries(sizeQuantities)) {
    columns[column] = fields.optional(name, () => fields.quantity(name, quantity)) ?? null;
  }
  for (const [name, column] of Object.entries(sizeTexts)) {
    columns[column] = fields.optional(name, () => fields.text(name)) ?? null;
  }
  const modes = fields.list('modes', readMode);
  if (modes.length === 0) throw fields.refusal('modes', 'needs at least one operating mode');
  return { columns, modes, isLinkToo: link !== undefined };
}

function readMode(fields: Fields): Columns {
  const derating = fields.optional('derating', () =>
    fields.one('derating', (inner) => ({
      axis: inner.choice('axis', deratingAxes),
      points: inner.pairs('points', 'temperature', 'ratio'),
    })),
  );
  const fault = derating && faultOfCurve(derating);
  if (fault !== undefined) throw fields.refusal('derating', fault);
  const drift = fields.optional('drift', () => fields.one('drift', readDrift));
  const columns: Record<string, BindValue> = {
    name: fields.text('name'),
    derating_axis: derating?.axis ?? null,
    derating_points: derating === undefined ? null : JSON.stringify(derating.points),
    drift_fraction: drift?.fraction ?? null,
    drift_hours: drift?.hours ?? null,
    drift_temperature_celsius: drift?.temperature ?? null,
    drift_law_exponent: drift?.law?.exponent ?? null,
    drift_law_doubling_kelvin: drift?.law?.doubling ?? null,
  };
  for (const [name, [column, quantity]] of Object.entries(modeQuantities)) {
    columns[column] = fields.optional(name, () => fields.quantity(name, quantity)) ?? null;
  }
  return columns;
}

interface DriftFields {
  fraction: number;
  hours: number;
  temperature: number;
  law?: { exponent: number; doubling: number };
}

function readDrift(fields: Fields): DriftFields {
  return {
    fraction: fields.quantity('fraction', 'fraction'),
    hours: fields.whole('hours', 1),
    temperature: fields.quantity('temperature', 'temperature'),
    law: fields.optional('law', () =>
      fields.one('law', (inner) => ({
        exponent: inner.number('exponent', 0, 1),
        doubling: inner.quantity('doubling', 'temperature-difference'),
      })),
    ),
  };
}

/** Pulse data in the shape of the ratings: [s, W] and [s, V] points, J, fraction. */
function readPulses(fields: Fields): object {
  return {
    single: fields.optional('single', () => rising(fields, 'single', 'power')),
    singleCount: fields.optional('singleCount', () => fields.whole('singleCount', 1)),
    continuous: fields.optional('continuous', () => rising(fields, 'continuous', 'power')),
    voltage: fields.optional('voltage', () =>
      typeof fields.raw('voltage') === 'string'
        ? fields.quantity('voltage', 'voltage')
        : rising(fields, 'voltage', 'voltage'),
    ),
    energy: fields.optional('energy', () => fields.quantity('energy', 'energy')),
    shift: fields.optional('shift', () => fields.quantity('shift', 'fraction')),
  };
}

/** A curve over the pulse width: longer pulses, never more power or voltage. */
function rising(fields: Fields, name: string, quantity: 'power' | 'voltage'): [number, number][] {
  const points = fields.pairs(name, 'time', quantity);
  const slip = points.findIndex((point, place) => {
    const before = points[place - 1];
    return before !== undefined && (point[0] <= before[0] || point[1] > before[1]);
  });
  if (slip >= 0)
    throw fields.refusal(`${name}[${slip}]`, 'must be a longer pulse with no more than the one before');
  return points;
}
