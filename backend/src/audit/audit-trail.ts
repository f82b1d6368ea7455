import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import { Clock } from '../common/clock';
import type { Actor } from './actor';
import { AuditEntryModel } from './models/audit-entry.model';

export interface AuditRecord {
  actor: Actor;
  /** What was done, as a short word: `promote`, `deactivate`. */
  action: string;
  /** Kind of thing, in the words of the permissions. */
  subjectType: string;
  subjectId: string | number;
  /** The fields that changed, as they were and as they became; never a secret. */
  before?: object;
  after?: object;
  reason?: string;
}

/** Writes down who changed what, in the transaction that changes it. Entries are never changed or deleted. */
@Injectable()
export class AuditTrail {
  constructor(private readonly clock: Clock) {}

  async record(transaction: Transaction, record: AuditRecord): Promise<void> {
    await AuditEntryModel.create(
      {
        recordedAt: this.clock.timestamp(),
        actorId: record.actor.id,
        actorName: record.actor.name,
        action: record.action,
        subjectType: record.subjectType,
        subjectId: String(record.subjectId),
        before: record.before ? JSON.stringify(record.before) : null,
        after: record.after ? JSON.stringify(record.after) : null,
        reason: record.reason ?? null,
      },
      { transaction },
    );
  }
}
