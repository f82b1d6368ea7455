import type { Quantity } from '@resistry/engineering/notation/quantity';
import type { SingleMeaning } from '../../../components/interval-field';

export type EntryName =
  | 'lower'
  | 'nominal'
  | 'upper'
  | 'limitVoltage'
  | 'limitCurrent'
  | 'voltage'
  | 'current'
  | 'power'
  | 'ambient'
  | 'rise'
  | 'terminal'
  | 'case'
  | 'altitude'
  | 'life'
  | 'noiseFrom'
  | 'noiseTo'
  | 'noiseLimit'
  | 'noiseBias'
  | 'frequency'
  | 'within'
  | 'insulation'
  | 'length'
  | 'width'
  | 'height';

/** One typed entry of the duty: its words in the panel, what it measures, and the field of the duty it becomes. */
export interface EntryDefinition {
  label: string;
  quantity: Quantity;
  unit: string;
  /** JSON pointer into the duty; of an interval, to the object that holds its ends. */
  pointer: string;
  /** For intervals: what one number alone stands for. */
  interval?: SingleMeaning;
  /** An example of what can be typed. */
  placeholder?: string;
}

/** Said to be an example, so that an empty field never looks filled. */
const example = (text: string | undefined): string | undefined => text && `e.g. ${text}`;

const entry = (
  label: string,
  quantity: Quantity,
  unit: string,
  pointer: string,
  placeholder?: string,
): EntryDefinition => ({
  label,
  quantity,
  unit,
  pointer,
  placeholder: example(placeholder),
});

const interval = (
  label: string,
  quantity: Quantity,
  unit: string,
  pointer: string,
  single: SingleMeaning,
  placeholder?: string,
): EntryDefinition => ({
  label,
  quantity,
  unit,
  pointer,
  interval: single,
  placeholder: example(placeholder),
});

export const entryDefinitions: Record<EntryName, EntryDefinition> = {
  lower: entry('Lowest', 'resistance', 'Ω', '/window/lower', '4k5'),
  nominal: entry('Nominal', 'resistance', 'Ω', '/window/nominal', '4k7'),
  upper: entry('Highest', 'resistance', 'Ω', '/window/upper', '4k9'),
  limitVoltage: interval('Voltage across', 'voltage', 'V', '/limits/voltage', 'exact', '12…24'),
  limitCurrent: interval('Current inside', 'current', 'A', '/limits/current', 'exact', '2m…8m'),
  voltage: interval('Voltage', 'voltage', 'V', '/load/voltage', 'from-zero', '0…24'),
  current: interval('or current', 'current', 'A', '/load/current', 'from-zero', '0…5m'),
  power: entry('or power', 'power', 'W', '/load/power', '120m'),
  ambient: interval('Ambient', 'temperature', '°C', '/ambient', 'exact', '−20…70'),
  rise: entry('Enclosure adds', 'temperature-difference', 'K', '/ambient/enclosureRise', '10'),
  terminal: entry('Terminals', 'temperature', '°C', '/ambient/terminal', '85'),
  case: entry('Case', 'temperature', '°C', '/ambient/case', '85'),
  altitude: entry('Altitude', 'altitude', 'm', '/ambient/altitude', '2000'),
  life: entry('Service life', 'time', '', '/life/hours', '10 years'),
  noiseFrom: entry('From', 'frequency', 'Hz', '/noise/from', '10'),
  noiseTo: entry('To', 'frequency', 'Hz', '/noise/to', '10k'),
  noiseLimit: entry('Noise at most', 'voltage', 'V', '/noise/limit', '1u'),
  noiseBias: entry('Bias', 'voltage', 'V', '/noise/bias', '5'),
  frequency: entry('Frequency', 'frequency', 'Hz', '/frequency/at', '10M'),
  within: entry('|Z| within', 'tolerance', '', '/frequency/within', '5 %'),
  insulation: entry('Insulation', 'voltage', 'V', '/insulation/voltage', '250'),
  length: entry('Length at most', 'length', '', '/body/length', '3.2 mm'),
  width: entry('Width at most', 'length', '', '/body/width', '1.6 mm'),
  height: entry('Height at most', 'length', '', '/body/height', '1 mm'),
};

export const entryNames = Object.keys(entryDefinitions) as EntryName[];
