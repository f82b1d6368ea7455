import type { DeviationRule } from '@resistry/engineering/duty/duty';
import type { Approval, Feature, Mounting, SupplyStatus } from '@resistry/engineering/ratings/technology';
import type { EntryName } from './duty-entry';
import type { PulseText } from './pulse-text';

/**
 * The duty as it is typed: texts in the notation of the trade, and what is chosen from lists. It is what the address
 * holds, so that a mailed link shows what the sender typed.
 */
export interface DutyText {
  entries: Partial<Record<EntryName, string>>;
  pulses: PulseText[];
  deviation: DeviationRule;
  /** Id of a policy version, `none` for the manufacturer's own ratings, absent for the company's policy in force. */
  policy?: string;
  mounting?: Mounting;
  features: Feature[];
  mains: boolean;
  safetyFunction: boolean;
  secondSource: boolean;
  approvals: Approval[];
  supply: SupplyStatus[];
}

/** What Find asks for where nothing else is said; it is sent openly and stands in the sentence. */
export const defaultApprovals: readonly Approval[] = ['approved', 'preferred'];
export const defaultSupply: readonly SupplyStatus[] = ['active'];

export const emptyDutyText: DutyText = {
  entries: {},
  pulses: [],
  deviation: 'worst-case',
  features: [],
  mains: false,
  safetyFunction: false,
  secondSource: false,
  approvals: [...defaultApprovals],
  supply: [...defaultSupply],
};
