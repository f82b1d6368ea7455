import type { Duty, Interval, Pulse } from './duty';
import type { Conflict } from './duty-conflict';

const absoluteZero = -273.15;

/**
 * What in a duty is impossible whatever the part: non-finite numbers, empty intervals, quantities outside what nature or
 * the trade allows. Bounds are wide; they catch a slipped unit, not an unusual circuit.
 */
export function refusalsOf(duty: Duty): Conflict[] {
  const conflicts: Conflict[] = [];
  refuseNonFinite(duty, '', conflicts);
  if (conflicts.length > 0) return conflicts;
  const refuse = (message: string, ...pointers: string[]): void => void conflicts.push({ pointers, message });
  const ordered = (interval: Interval | undefined, pointer: string, what: string): void => {
    if (interval !== undefined && interval.min > interval.max) {
      refuse(`The smallest ${what} is above the largest.`, `${pointer}/min`, `${pointer}/max`);
    }
  };
  ordered(duty.load?.voltage, '/load/voltage', 'voltage');
  ordered(duty.load?.current, '/load/current', 'current');
  if (duty.load?.power !== undefined && duty.load.power.max < 0)
    refuse('A power below 0 W is no load.', '/load/power/max');
  refuseAmbient(duty, refuse, ordered);
  if (duty.life !== undefined && !(duty.life.hours > 0 && duty.life.hours <= 1e7)) {
    refuse('The life must be above 0 h and at most 10 000 000 h.', '/life/hours');
  }
  if (duty.noise !== undefined) {
    if (duty.noise.from <= 0) refuse('The noise band must begin above 0 Hz.', '/noise/from');
    if (duty.noise.to <= duty.noise.from)
      refuse('The noise band ends before it begins.', '/noise/from', '/noise/to');
    if (duty.noise.limit <= 0) refuse('The noise limit must be above 0 V.', '/noise/limit');
  }
  if (duty.frequency !== undefined) {
    if (duty.frequency.at <= 0) refuse('The frequency must be above 0 Hz.', '/frequency/at');
    if (duty.frequency.within <= 0)
      refuse('The allowed change of impedance must be above 0.', '/frequency/within');
  }
  if (duty.insulation !== undefined && duty.insulation.voltage < 0) {
    refuse('The insulation voltage is a magnitude: not below 0 V.', '/insulation/voltage');
  }
  for (const [side, metre] of Object.entries<number>({ ...duty.body })) {
    if (!(metre > 0 && metre <= 1))
      refuse(`The largest ${side} must be above 0 m and at most 1 m.`, `/body/${side}`);
  }
  if (duty.approvals?.length === 0) refuse('No approval is allowed: name at least one.', '/approvals');
  if (duty.supply?.length === 0) refuse('No supply status is allowed: name at least one.', '/supply');
  duty.pulses?.forEach((pulse, index) => refusePulse(pulse, `/pulses/${String(index)}`, refuse));
  return conflicts;
}

type Refuse = (message: string, ...pointers: string[]) => void;

function refuseAmbient(
  duty: Duty,
  refuse: Refuse,
  ordered: (interval: Interval | undefined, pointer: string, what: string) => void,
): void {
  const ambient = duty.ambient;
  if (ambient === undefined) return;
  ordered(ambient, '/ambient', 'ambient temperature');
  for (const name of ['min', 'max', 'terminal', 'case'] as const) {
    const celsius = ambient[name];
    if (celsius !== undefined && (celsius < absoluteZero || celsius > 1000)) {
      refuse('The temperature must lie between absolute zero and 1000 °C.', `/ambient/${name}`);
    }
  }
  if (ambient.enclosureRise !== undefined && (ambient.enclosureRise < 0 || ambient.enclosureRise > 500)) {
    refuse('The rise inside the enclosure must lie between 0 and 500 K.', '/ambient/enclosureRise');
  }
  if (ambient.altitude !== undefined && (ambient.altitude < -500 || ambient.altitude > 100_000)) {
    refuse('The altitude must lie between −500 and 100 000 m.', '/ambient/altitude');
  }
  for (const name of ['terminal', 'case'] as const) {
    const celsius = ambient[name];
    if (celsius !== undefined && celsius < ambient.min) {
      refuse(`The ${name} is stated colder than the coldest ambient.`, `/ambient/${name}`, '/ambient/min');
    }
  }
}

function refusePulse(pulse: Pulse, pointer: string, refuse: Refuse): void {
  const stated = (['voltage', 'current', 'power'] as const).filter((name) => pulse[name] !== undefined);
  if (pulse.shape === 'waveform') {
    if (pulse.samples === undefined || pulse.samples.length < 2) {
      refuse('A waveform needs at least two samples.', `${pointer}/samples`);
    }
  } else {
    if (stated.length !== 1) {
      refuse(
        'State exactly one of voltage, current and power.',
        ...(stated.length === 0 ? ['voltage', 'current', 'power'] : stated).map(
          (name) => `${pointer}/${name}`,
        ),
      );
    }
    const surge = pulse.shape.startsWith('surge');
    if (pulse.shape === 'capacitor-discharge' && pulse.capacitance === undefined) {
      refuse('A capacitor discharge needs its capacitance.', `${pointer}/capacitance`);
    } else if (pulse.duration === undefined && !surge && pulse.shape !== 'capacitor-discharge') {
      refuse('The pulse needs a duration.', `${pointer}/duration`);
    }
  }
  for (const name of ['duration', 'period', 'count', 'capacitance'] as const) {
    const value = pulse[name];
    if (value !== undefined && value <= 0) refuse(`The ${name} must be above 0.`, `${pointer}/${name}`);
  }
  if (pulse.sourceResistance !== undefined && pulse.sourceResistance < 0) {
    refuse('The source resistance is negative.', `${pointer}/sourceResistance`);
  }
  if (pulse.period !== undefined && pulse.duration !== undefined && pulse.period < pulse.duration) {
    refuse('The pulse lasts longer than its period.', `${pointer}/duration`, `${pointer}/period`);
  }
}

function refuseNonFinite(value: unknown, pointer: string, conflicts: Conflict[]): void {
  if (value === null)
    conflicts.push({ pointers: [pointer], message: 'null is no value: leave the field out.' });
  else if (typeof value === 'number' && !Number.isFinite(value)) {
    conflicts.push({ pointers: [pointer], message: 'The number is not finite.' });
  } else if (typeof value === 'object') {
    for (const [key, part] of Object.entries(value)) refuseNonFinite(part, `${pointer}/${key}`, conflicts);
  }
}
