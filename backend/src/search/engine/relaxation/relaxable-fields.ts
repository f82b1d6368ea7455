import type { Duty } from '@resistry/engineering/duty/duty';

/** A demand that can be loosened by moving one number, and how far. */
export interface RelaxableField {
  pointer: string;
  direction: 'up' | 'down';
  /** The loosest value that still makes sense, or undefined where the duty does not state the field. */
  loosest(duty: Duty): number | undefined;
  /** Temperatures are moved by whole degrees, everything else by three significant digits. */
  scale: 'degrees' | 'digits';
}

const magnitudeFloor = (interval: { min: number; max: number } | undefined): number | undefined =>
  // A signed load has no single number whose lowering loosens it.
  interval === undefined || interval.min < 0 ? undefined : interval.min;

/** Numbers of a duty that can be loosened one at a time, beside the edges of the window. */
export const relaxableFields: readonly RelaxableField[] = [
  {
    pointer: '/load/voltage/max',
    direction: 'down',
    scale: 'digits',
    loosest: (duty) => magnitudeFloor(duty.load?.voltage),
  },
  {
    pointer: '/load/current/max',
    direction: 'down',
    scale: 'digits',
    loosest: (duty) => magnitudeFloor(duty.load?.current),
  },
  {
    pointer: '/load/power/max',
    direction: 'down',
    scale: 'digits',
    loosest: (duty) => (duty.load?.power === undefined ? undefined : 0),
  },
  {
    pointer: '/limits/voltage/max',
    direction: 'down',
    scale: 'digits',
    loosest: (duty) => duty.limits?.voltage.min,
  },
  {
    pointer: '/limits/voltage/min',
    direction: 'up',
    scale: 'digits',
    loosest: (duty) => duty.limits?.voltage.max,
  },
  {
    pointer: '/limits/current/max',
    direction: 'up',
    scale: 'digits',
    loosest: (duty) => duty.limits && duty.limits.current.max * 100,
  },
  { pointer: '/limits/current/min', direction: 'down', scale: 'digits', loosest: (duty) => duty.limits && 0 },
  { pointer: '/ambient/max', direction: 'down', scale: 'degrees', loosest: (duty) => duty.ambient?.min },
  { pointer: '/ambient/min', direction: 'up', scale: 'degrees', loosest: (duty) => duty.ambient?.max },
  {
    pointer: '/ambient/enclosureRise',
    direction: 'down',
    scale: 'degrees',
    loosest: (duty) => (duty.ambient?.enclosureRise === undefined ? undefined : 0),
  },
  {
    pointer: '/ambient/terminal',
    direction: 'down',
    scale: 'degrees',
    loosest: (duty) => (duty.ambient?.terminal === undefined ? undefined : duty.ambient.min),
  },
  {
    pointer: '/ambient/case',
    direction: 'down',
    scale: 'degrees',
    loosest: (duty) => (duty.ambient?.case === undefined ? undefined : duty.ambient.min),
  },
  {
    pointer: '/ambient/altitude',
    direction: 'down',
    scale: 'digits',
    loosest: (duty) =>
      duty.ambient?.altitude === undefined ? undefined : Math.min(0, duty.ambient.altitude),
  },
  {
    pointer: '/life/hours',
    direction: 'down',
    scale: 'digits',
    loosest: (duty) => duty.life && Math.min(1, duty.life.hours),
  },
  {
    pointer: '/insulation/voltage',
    direction: 'down',
    scale: 'digits',
    loosest: (duty) => duty.insulation && 0,
  },
  { pointer: '/body/length', direction: 'up', scale: 'digits', loosest: (duty) => duty.body?.length && 1 },
  { pointer: '/body/width', direction: 'up', scale: 'digits', loosest: (duty) => duty.body?.width && 1 },
  { pointer: '/body/height', direction: 'up', scale: 'digits', loosest: (duty) => duty.body?.height && 1 },
];

/** The number at a JSON pointer of a duty. */
export function numberAt(duty: Duty, pointer: string): number {
  let value: unknown = duty;
  for (const name of pointer.slice(1).split('/')) value = (value as Record<string, unknown>)[name];
  if (typeof value !== 'number') throw new Error(`${pointer} of the duty is no number.`);
  return value;
}

/** The duty with another value at a JSON pointer; what is not on the way to it stays the same object. */
export function withValueAt(duty: Duty, pointer: string, value: unknown): Duty {
  const replace = (holder: unknown, [name, ...rest]: readonly string[]): unknown =>
    name === undefined
      ? value
      : { ...(holder as object), [name]: replace((holder as Record<string, unknown>)[name], rest) };
  return replace(duty, pointer.slice(1).split('/')) as Duty;
}

/** A number moved outward to the next one of three significant digits (or whole degrees), never past the loosest. */
export function roundedOutward(
  field: Pick<RelaxableField, 'direction' | 'scale'>,
  value: number,
  loosest: number,
): number {
  const step =
    field.scale === 'degrees' || value === 0 ? 1 : 10 ** (Math.floor(Math.log10(Math.abs(value))) - 2);
  const count = field.direction === 'up' ? Math.ceil(value / step - 1e-9) : Math.floor(value / step + 1e-9);
  const rounded = Number((count * step).toPrecision(12));
  return field.direction === 'up' ? Math.min(rounded, loosest) : Math.max(rounded, loosest);
}
