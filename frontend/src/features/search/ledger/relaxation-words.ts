import type { CheckName } from '@resistry/engineering/checks/check';
import { formatQuantity } from '@resistry/engineering/notation/format-quantity';
import { approvals, supplyStatuses } from '@resistry/engineering/ratings/technology';
import { approvalWords, supplyWords } from '../../../wording/standing-words';
import { entryDefinitions, entryNames, type EntryName } from '../duty/duty-entry';
import type { DutyText } from '../duty/duty-text';
import type { Relaxation } from '../requests/search-parts';

/** What a relaxation says on the ledger, and the duty with it made. */
export interface ReadyRelaxation {
  words: string;
  gains: number;
  /** The check it is shown under. */
  under: CheckName;
  relaxed: (duty: DutyText) => DutyText;
}

/** Under which check a field of the duty is best told; the first part of the pointer decides. */
const checkOfField: Record<string, CheckName> = {
  window: 'value',
  limits: 'value',
  life: 'value',
  deviation: 'value',
  load: 'dissipation',
  ambient: 'dissipation',
  noise: 'noise',
  frequency: 'frequency',
  insulation: 'insulation',
  body: 'body',
  mounting: 'mounting',
  features: 'features',
  safety: 'certificate',
  secondSource: 'second-source',
  approvals: 'approval',
  supply: 'supply',
};

const secondsPerHour = 3600;
const hoursPerYear = 8760;

/** Rounded down, because no more than that is promised; the entry itself takes the exact hours. */
const yearsWords = (hours: number): string => `${Math.floor((10 * hours) / hoursPerYear) / 10} years`;

function withEntry(name: EntryName, text: string): (duty: DutyText) => DutyText {
  return (duty) => ({ ...duty, entries: { ...duty.entries, [name]: text } });
}

/** A pointer to one end of an interval: `/load/voltage/max`, `/ambient/max`. */
function endOf(pointer: string): { name: EntryName; end: 'min' | 'max' } | undefined {
  const end = pointer.endsWith('/max') ? 'max' : pointer.endsWith('/min') ? 'min' : undefined;
  if (end === undefined) return undefined;
  const whole = pointer.slice(0, -4);
  const name = entryNames.find((each) => entryDefinitions[each].pointer === whole);
  return name && { name, end };
}

function added<Value extends string>(
  to: unknown,
  known: readonly Value[],
  before: readonly Value[],
): Value[] {
  const next = Array.isArray(to)
    ? known.filter((value) => to.includes(value))
    : known.filter((value) => value === to);
  return next.filter((value) => !before.includes(value));
}

interface Change {
  words: string;
  relaxed: (duty: DutyText) => DutyText;
}

function changeOfNumber(field: string, to: number, duty: DutyText): Change | undefined {
  const name = entryNames.find((each) => entryDefinitions[each].pointer === field);
  if (name !== undefined) {
    const { quantity, label } = entryDefinitions[name];
    const text = formatQuantity(name === 'life' ? to * secondsPerHour : to, quantity);
    const words = name === 'life' && to >= hoursPerYear ? yearsWords(to) : text;
    return { words: `${words} ${label.toLowerCase()}`, relaxed: withEntry(name, text) };
  }
  const interval = endOf(field);
  if (interval === undefined) return undefined;
  const { quantity, label } = entryDefinitions[interval.name];
  const text = formatQuantity(to, quantity);
  // The other end stays as it was typed, or at nothing where only one number was.
  const [low, high] = (duty.entries[interval.name] ?? '').split(/…|\.\.+| to /);
  const pair =
    interval.end === 'max'
      ? `${high === undefined ? '0' : (low ?? '0').trim()}…${text}`
      : `${text}…${(high ?? low ?? '0').trim()}`;
  return { words: `${text} ${label.toLowerCase()}`, relaxed: withEntry(interval.name, pair) };
}

function changeOf({ field, to }: Relaxation, duty: DutyText): Change | undefined {
  // No load at all is what the duty is not about.
  if (to === 0 && field.startsWith('/load/')) return undefined;
  if (typeof to === 'number') return changeOfNumber(field, to, duty);
  if (field === '/approvals') {
    const more = added(to, approvals, duty.approvals);
    return {
      words: more.map((approval) => approvalWords[approval].toLowerCase()).join(', '),
      relaxed: (before) => ({ ...before, approvals: [...before.approvals, ...more] }),
    };
  }
  if (field === '/supply') {
    const more = added(to, supplyStatuses, duty.supply);
    return {
      words: more.map((status) => supplyWords[status].toLowerCase()).join(', '),
      relaxed: (before) => ({ ...before, supply: [...before.supply, ...more] }),
    };
  }
  if (field === '/secondSource')
    return { words: 'without second source', relaxed: (before) => ({ ...before, secondSource: false }) };
  if (field === '/mounting')
    return { words: 'any mounting', relaxed: (before) => ({ ...before, mounting: undefined }) };
  if (field === '/deviation') {
    return {
      words: 'root sum of squares',
      relaxed: (before) => ({ ...before, deviation: 'root-sum-square' }),
    };
  }
  return undefined;
}

/** Relaxations that the duty as it is typed can express; others are left out rather than shown without effect. */
export function readyRelaxations(relaxations: readonly Relaxation[], duty: DutyText): ReadyRelaxation[] {
  return relaxations.flatMap((relaxation) => {
    const change = changeOf(relaxation, duty);
    const under = checkOfField[relaxation.field.split('/')[1] ?? ''];
    if (change === undefined || change.words === '' || under === undefined || relaxation.gains <= 0)
      return [];
    return [{ ...change, gains: relaxation.gains, under }];
  });
}
