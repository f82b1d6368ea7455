import { type Pulse, type PulseShape, pulseShapes } from '@resistry/engineering/duty/duty';
import type { Quantity } from '@resistry/engineering/notation/quantity';

/** The entries of a pulse, in the order in which they are asked for. */
export const pulseEntries = {
  voltage: { label: 'Voltage', quantity: 'voltage', unit: 'V' },
  current: { label: 'Current', quantity: 'current', unit: 'A' },
  power: { label: 'Peak power', quantity: 'power', unit: 'W' },
  duration: { label: 'Duration', quantity: 'time', unit: 's' },
  period: { label: 'Every', quantity: 'time', unit: 's' },
  count: { label: 'Number over life', quantity: 'ratio', unit: '' },
  capacitance: { label: 'Capacitance', quantity: 'capacitance', unit: 'F' },
  sourceResistance: { label: 'Source resistance', quantity: 'resistance', unit: 'Ω' },
} satisfies Record<string, { label: string; quantity: Quantity; unit: string }>;

export type PulseEntry = keyof typeof pulseEntries;
export const pulseEntryNames = Object.keys(pulseEntries) as PulseEntry[];

/** A pulse as it is typed. A sampled waveform comes from a file and has no such text. */
export interface PulseText {
  shape: Exclude<PulseShape, 'waveform'>;
  entries: Partial<Record<PulseEntry, string>>;
}

export const typedShapes = pulseShapes.filter((shape): shape is PulseText['shape'] => shape !== 'waveform');

const plainPulse: readonly PulseEntry[] = [
  'voltage',
  'current',
  'power',
  'duration',
  'period',
  'count',
  'sourceResistance',
];

/** What a pulse of each shape is asked for. */
export const entriesOfShape: Record<PulseText['shape'], readonly PulseEntry[]> = {
  rectangular: plainPulse,
  triangular: plainPulse,
  'half-sine': plainPulse,
  exponential: plainPulse,
  'capacitor-discharge': ['voltage', 'capacitance', 'period', 'count', 'sourceResistance'],
  'surge-1.2/50': ['voltage', 'count'],
  'surge-10/700': ['voltage', 'count'],
};

export const shapeWords: Record<PulseText['shape'], string> = {
  rectangular: 'Rectangular',
  triangular: 'Triangular',
  'half-sine': 'Half sine',
  exponential: 'Exponential',
  'capacitor-discharge': 'Capacitor discharge',
  'surge-1.2/50': 'Surge 1.2/50 µs',
  'surge-10/700': 'Surge 10/700 µs',
};

/** `rectangular~voltage~100~duration~1ms`: the form a pulse has in an address. */
export function pulseToAddress({ shape, entries }: PulseText): string {
  return [shape, ...pulseEntryNames.flatMap((name) => (entries[name] ? [name, entries[name]] : []))].join(
    '~',
  );
}

export function pulseFromAddress(text: string): PulseText | undefined {
  const [shapeText, ...rest] = text.split('~');
  const shape = typedShapes.find((known) => known === shapeText);
  if (shape === undefined) return undefined;
  const entries: PulseText['entries'] = {};
  for (let at = 0; at + 1 < rest.length; at += 2) {
    const name = pulseEntryNames.find((known) => known === rest[at]);
    if (name !== undefined) entries[name] = rest[at + 1];
  }
  return { shape, entries };
}

export type PulseValues = Omit<Pulse, 'samples'>;
