import { deviationRules } from '@resistry/engineering/duty/duty';
import { approvals, features, mountings, supplyStatuses } from '@resistry/engineering/ratings/technology';
import { type EntryName, entryNames } from './duty-entry';
import { type DutyText, defaultApprovals, defaultSupply } from './duty-text';
import { pulseFromAddress, pulseToAddress } from './pulse-text';

const sameMembers = <Value>(first: readonly Value[], second: readonly Value[]): boolean =>
  first.length === second.length && first.every((value) => second.includes(value));

/** Known members of a comma-separated list; unknown ones, from an old or a tampered link, are left out. */
function members<Value extends string>(text: string, known: readonly Value[]): Value[] {
  const parts = text.split(',');
  return known.filter((value) => parts.includes(value));
}

function list<Value extends string>(
  address: URLSearchParams,
  name: string,
  known: readonly Value[],
  otherwise: readonly Value[],
): Value[] {
  const text = address.get(name);
  return text === null ? [...otherwise] : members(text, known);
}

/** Writes the duty into an address, in words a person can read; what is as always is left out. */
export function writeDuty(duty: DutyText, address: URLSearchParams): void {
  for (const name of entryNames) {
    const text = duty.entries[name]?.trim();
    if (text) address.set(name, text);
  }
  for (const pulse of duty.pulses) address.append('pulse', pulseToAddress(pulse));
  if (duty.deviation !== 'worst-case') address.set('deviation', duty.deviation);
  if (duty.policy !== undefined) address.set('policy', duty.policy);
  if (duty.mounting !== undefined) address.set('mounting', duty.mounting);
  if (duty.features.length > 0) address.set('features', duty.features.join(','));
  for (const flag of ['mains', 'safetyFunction', 'secondSource'] as const) {
    if (duty[flag]) address.set(flag, 'yes');
  }
  if (!sameMembers(duty.approvals, defaultApprovals)) address.set('approval', duty.approvals.join(','));
  if (!sameMembers(duty.supply, defaultSupply)) address.set('supply', duty.supply.join(','));
}

/** Reads what writeDuty wrote. */
export function readDutyAddress(address: URLSearchParams): DutyText {
  const entries: Partial<Record<EntryName, string>> = {};
  for (const name of entryNames) {
    const text = address.get(name);
    if (text !== null) entries[name] = text;
  }
  return {
    entries,
    pulses: address.getAll('pulse').flatMap((text) => pulseFromAddress(text) ?? []),
    deviation: deviationRules.find((rule) => rule === address.get('deviation')) ?? 'worst-case',
    policy: address.get('policy') ?? undefined,
    mounting: mountings.find((mounting) => mounting === address.get('mounting')),
    features: list(address, 'features', features, []),
    mains: address.get('mains') === 'yes',
    safetyFunction: address.get('safetyFunction') === 'yes',
    secondSource: address.get('secondSource') === 'yes',
    approvals: list(address, 'approval', approvals, defaultApprovals),
    supply: list(address, 'supply', supplyStatuses, defaultSupply),
  };
}
