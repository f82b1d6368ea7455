import type { Duty, Pulse } from '@resistry/engineering/duty/duty';
import { parseQuantity } from '@resistry/engineering/notation/parse-quantity';
import type { DutyText } from './duty-text';
import { type EntryErrors, EntryReader } from './entry-reader';
import { type PulseEntry, type PulseText, entriesOfShape, pulseEntries } from './pulse-text';

export interface ReadDuty {
  /** Undefined while anything cannot be read: half a duty would be answered as if it were the whole. */
  duty: Duty | undefined;
  errors: EntryErrors;
  /** By the pulse's place in the list. */
  pulseErrors: Partial<Record<PulseEntry, string>>[];
}

const secondsPerHour = 3600;

function windowOf(reader: EntryReader): Duty['window'] {
  if (!reader.has('lower', 'nominal', 'upper')) return undefined;
  const nominal = reader.parsed('nominal');
  if (nominal?.tolerance !== undefined && !reader.has('lower', 'upper')) {
    const { value, tolerance } = nominal;
    return { lower: value * (1 - tolerance), upper: value * (1 + tolerance), nominal: value };
  }
  reader.demand('lower', 'Give the lowest value too, or the nominal with its tolerance (4k7 5 %).');
  reader.demand('upper', 'Give the highest value too, or the nominal with its tolerance (4k7 5 %).');
  const lower = reader.value('lower');
  const upper = reader.value('upper');
  if (lower === undefined || upper === undefined) return undefined;
  return { lower, upper, ...(nominal && { nominal: nominal.value }) };
}

function limitsOf(reader: EntryReader): Duty['limits'] {
  if (!reader.has('limitVoltage', 'limitCurrent')) return undefined;
  reader.demand('limitVoltage', 'Give the voltage across it too.');
  reader.demand('limitCurrent', 'Give the current it shall stay inside too.');
  const voltage = reader.interval('limitVoltage');
  const current = reader.interval('limitCurrent');
  return voltage && current && { voltage, current };
}

function loadOf(reader: EntryReader): Duty['load'] {
  if (!reader.has('voltage', 'current', 'power')) return undefined;
  const voltage = reader.interval('voltage');
  const current = reader.interval('current');
  const power = reader.value('power');
  return {
    ...(voltage && { voltage }),
    ...(current && { current }),
    ...(power !== undefined && { power: { max: power } }),
  };
}

function ambientOf(reader: EntryReader): Duty['ambient'] {
  if (!reader.has('ambient', 'rise', 'terminal', 'case', 'altitude')) return undefined;
  reader.demand('ambient', 'Give the ambient temperatures too.');
  const ends = reader.interval('ambient');
  const others = {
    enclosureRise: reader.value('rise'),
    terminal: reader.value('terminal'),
    case: reader.value('case'),
    altitude: reader.value('altitude'),
  };
  return ends && { ...ends, ...defined(others) };
}

function noiseOf(reader: EntryReader): Duty['noise'] {
  if (!reader.has('noiseFrom', 'noiseTo', 'noiseLimit', 'noiseBias')) return undefined;
  reader.demand('noiseFrom', 'Give the lower frequency too.');
  reader.demand('noiseTo', 'Give the upper frequency too.');
  reader.demand('noiseLimit', 'Give the largest noise too.');
  const from = reader.value('noiseFrom');
  const to = reader.value('noiseTo');
  const limit = reader.value('noiseLimit');
  const bias = reader.value('noiseBias');
  if (from === undefined || to === undefined || limit === undefined) return undefined;
  return { from, to, limit, ...(bias !== undefined && { bias }) };
}

function frequencyOf(reader: EntryReader): Duty['frequency'] {
  if (!reader.has('frequency', 'within')) return undefined;
  reader.demand('frequency', 'Give the frequency too.');
  reader.demand('within', 'Give how far |Z| may be from R too.');
  const at = reader.value('frequency');
  const within = reader.value('within');
  return at === undefined || within === undefined ? undefined : { at, within };
}

function lifeOf(reader: EntryReader): Duty['life'] {
  const seconds = reader.value('life');
  return seconds === undefined ? undefined : { hours: seconds / secondsPerHour };
}

function insulationOf(reader: EntryReader): Duty['insulation'] {
  const voltage = reader.value('insulation');
  return voltage === undefined ? undefined : { voltage };
}

function bodyOf(reader: EntryReader): Duty['body'] {
  if (!reader.has('length', 'width', 'height')) return undefined;
  return defined({
    length: reader.value('length'),
    width: reader.value('width'),
    height: reader.value('height'),
  });
}

function pulseOf(text: PulseText, errors: Partial<Record<PulseEntry, string>>): Pulse {
  const values: Partial<Record<PulseEntry, number>> = {};
  for (const name of entriesOfShape[text.shape]) {
    const typed = text.entries[name]?.trim() ?? '';
    if (typed === '') continue;
    const parsed = parseQuantity(typed, pulseEntries[name].quantity);
    if (parsed.ok) values[name] = parsed.value;
    else errors[name] = parsed.message;
  }
  return { shape: text.shape, ...values };
}

/** Leaves out what is undefined: the server takes an absent field, and refuses one that is null. */
function defined<Fields extends object>(fields: Fields): Partial<Fields> {
  return Object.fromEntries(
    Object.entries(fields).filter(([, value]: [string, unknown]) => value !== undefined),
  ) as Partial<Fields>;
}

/** The duty that the typed texts state, in SI, or what is wrong with them, entry by entry. */
export function readDuty(text: DutyText): ReadDuty {
  const reader = new EntryReader(text.entries);
  const pulseErrors = text.pulses.map((): Partial<Record<PulseEntry, string>> => ({}));
  const pulses = text.pulses.map((pulse, index) => pulseOf(pulse, pulseErrors[index] ?? {}));
  const safety = text.mains || text.safetyFunction;
  const duty: Duty = {
    ...defined({
      window: windowOf(reader),
      limits: limitsOf(reader),
      load: loadOf(reader),
      ambient: ambientOf(reader),
      life: lifeOf(reader),
      noise: noiseOf(reader),
      frequency: frequencyOf(reader),
      insulation: insulationOf(reader),
      body: bodyOf(reader),
      mounting: text.mounting,
      pulses: pulses.length > 0 ? pulses : undefined,
      features: text.features.length > 0 ? text.features : undefined,
      safety: safety
        ? defined({ mains: text.mains || undefined, function: text.safetyFunction || undefined })
        : undefined,
      secondSource: text.secondSource ? true : undefined,
    }),
    deviation: text.deviation,
    approvals: text.approvals,
    supply: text.supply,
  };
  const wrong =
    Object.keys(reader.errors).length > 0 || pulseErrors.some((errors) => Object.keys(errors).length > 0);
  return { duty: wrong ? undefined : duty, errors: reader.errors, pulseErrors };
}
