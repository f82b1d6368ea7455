import type { Approval, SupplyStatus } from '@resistry/engineering/ratings/technology';
import type { FieldError } from '../../common/problems/problem';
import type { PartStanding } from './part-standing';
import { supplyWords } from './standing-words';

export const demandNames = [
  'datasheet',
  'second-source',
  'active-supply',
  'offer',
  'words',
  'scope',
  'last-order-date',
] as const;
export type DemandName = (typeof demandNames)[number];

/** What a transition asks of a part or of whoever makes it. */
export interface Demand {
  name: DemandName;
  met: boolean;
  /** How it is, in a sentence. */
  words: string;
  /** The field of the request that it is about; `to` where only the part itself can fulfil it. */
  field: 'to' | 'words' | 'scope' | 'exception' | 'lastOrderDate';
}

/** What a request brings along for a change of approval. */
export interface ApprovalInput {
  words?: string;
  scope?: string;
  exception?: string;
}

/** What must hold for the part to become this. */
export function approvalDemands(to: Approval, part: PartStanding, input: ApprovalInput): Demand[] {
  if (to === 'preferred') return demandsOfPreference(part, input);
  if (to === 'restricted') return demandsOfRestriction(input);
  return [];
}

/** @param today day, ISO 8601 */
export function supplyDemands(to: SupplyStatus, lastOrderDate: string | undefined, today: string): Demand[] {
  if (to !== 'last-time-buy') return [];
  const demand = { name: 'last-order-date', field: 'lastOrderDate' } as const;
  if (lastOrderDate === undefined) {
    return [{ ...demand, met: false, words: 'A last-time buy needs its last order date.' }];
  }
  if (lastOrderDate < today) {
    const words = `The last order date ${lastOrderDate} has passed: what can no longer be ordered is discontinued.`;
    return [{ ...demand, met: false, words }];
  }
  return [{ ...demand, met: true, words: `It can be ordered until ${lastOrderDate}.` }];
}

/** The demands that are not met, as errors of the request's fields. */
export function unmet(demands: readonly Demand[]): FieldError[] {
  return demands
    .filter(({ met }) => !met)
    .map(({ field, words }) => ({ pointer: `/${field}`, message: words }));
}

function demandsOfPreference(part: PartStanding, { exception }: ApprovalInput): Demand[] {
  return [
    {
      name: 'datasheet',
      field: 'to',
      met: part.datasheet === 1,
      words:
        part.datasheet === 1
          ? 'A datasheet is on record.'
          : 'No datasheet is on record for the family’s current revision.',
    },
    secondSource(part, exception),
    {
      name: 'active-supply',
      field: 'to',
      met: part.supply === 'active',
      words:
        part.supply === 'active'
          ? 'It is in active supply.'
          : `Its supply is ${supplyWords[part.supply]}, not active.`,
    },
    {
      name: 'offer',
      field: 'to',
      met: part.offer_in_force === 1,
      words: part.offer_in_force === 1 ? 'An offer is in force.' : 'No offer is in force today.',
    },
  ];
}

function secondSource(part: PartStanding, exception: string | undefined): Demand {
  const demand = { name: 'second-source', field: 'exception' } as const;
  if (part.second_source === 1) {
    const words =
      'Another manufacturer’s approved and active part stands under the same company part number.';
    return { ...demand, met: true, words };
  }
  if (exception !== undefined) {
    return { ...demand, met: true, words: `It has no second source, by exception: ${exception}` };
  }
  const words = 'It has no second source: state in an exception why it is promoted all the same.';
  return { ...demand, met: false, words };
}

function demandsOfRestriction({ words, scope }: ApprovalInput): Demand[] {
  return [
    {
      name: 'words',
      field: 'words',
      met: words !== undefined,
      words: words ?? 'A restriction says in words what the part may not be used for, or only for.',
    },
    {
      name: 'scope',
      field: 'scope',
      met: scope !== undefined,
      words: scope ?? 'A restriction names its scope: the products or sites that it holds for.',
    },
  ];
}
