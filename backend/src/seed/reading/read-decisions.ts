import {
  type Approval,
  approvals,
  type SupplyStatus,
  supplyStatuses,
} from '@resistry/engineering/ratings/technology';
import type { Deed } from '../family';
import { Fields } from './fields';
import { readDeed } from './read-revision';
import { type PartSelection, readSelection } from './read-selection';

/** A decision on the approval of some parts. */
export interface ApprovalRule {
  readonly selection: PartSelection;
  readonly to: Approval;
  /** Who submitted the parts; only where they are drafts until then. */
  readonly submitted: Deed | null;
  readonly decided: Deed;
  readonly reason: string;
  readonly words: string | null;
  readonly scope: string | null;
}

/** A vendor's word on the supply of some parts, as purchasing entered it. */
export interface SupplyRule {
  readonly selection: PartSelection;
  readonly to: SupplyStatus;
  readonly lastOrderOn: string | null;
  readonly decided: Deed;
  readonly reason: string;
}

export function readApprovalRules(file: string, content: unknown): ApprovalRule[] {
  return Fields.read(file, '', content, (fields) =>
    fields.list('decisions', (inner) => {
      const to = inner.choice('to', approvals);
      const restricted = to === 'restricted';
      if (inner.has('words') !== restricted) {
        throw inner.refusal('words', 'belong to a restriction, and every restriction has them');
      }
      return {
        selection: readSelection(inner),
        to,
        submitted: inner.optional('submitted', () => inner.one('submitted', readDeed)) ?? null,
        decided: inner.one('decided', readDeed),
        reason: inner.text('reason'),
        words: restricted ? inner.text('words') : null,
        scope: inner.optional('scope', () => inner.text('scope')) ?? null,
      };
    }),
  );
}

export function readSupplyRules(file: string, content: unknown): SupplyRule[] {
  return Fields.read(file, '', content, (fields) =>
    fields.list('changes', (inner) => {
      const to = inner.choice('to', supplyStatuses);
      if (to === 'last-time-buy' && !inner.has('lastOrderOn')) {
        throw inner.refusal('lastOrderOn', 'is missing: a last-time buy has a last day');
      }
      return {
        selection: readSelection(inner),
        to,
        lastOrderOn: inner.optional('lastOrderOn', () => inner.day('lastOrderOn')) ?? null,
        decided: inner.one('decided', readDeed),
        reason: inner.text('reason'),
      };
    }),
  );
}
