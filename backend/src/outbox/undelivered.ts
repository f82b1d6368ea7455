import { Injectable } from '@nestjs/common';
import { AuditTrail } from '../audit/audit-trail';
import { Clock } from '../common/clock';
import { NotFoundProblem } from '../common/problems/problems';
import { Readers } from '../database/readers';
import { Writer } from '../database/writer';
import type { Person } from '../permissions/person';
import type { UndeliveredMessage } from './dto/outbox.dto';
import { OutboxDispatcher } from './outbox-dispatcher';

interface MessageRow {
  id: string;
  kind: string;
  state: 'pending' | 'dead';
  attempts: number;
  created_at: string;
  next_attempt_at: string;
  last_error: string | null;
}

/** What could not be delivered yet, for administrators to see and to try again. */
@Injectable()
export class Undelivered {
  constructor(
    private readonly readers: Readers,
    private readonly writer: Writer,
    private readonly dispatcher: OutboxDispatcher,
    private readonly audit: AuditTrail,
    private readonly clock: Clock,
  ) {}

  /** The dead and those that have failed at least once. */
  async list(): Promise<UndeliveredMessage[]> {
    const rows = await this.readers.select<MessageRow>(
      `SELECT id, kind, state, attempts, created_at, next_attempt_at, last_error FROM outbox_messages
        WHERE state = 'dead' OR (state = 'pending' AND attempts > 0) ORDER BY sequence LIMIT 200`,
    );
    return rows.map((row) => ({
      id: row.id,
      kind: row.kind,
      state: row.state,
      attempts: row.attempts,
      createdAt: row.created_at,
      nextAttemptAt: row.next_attempt_at,
      ...(row.last_error !== null && { lastError: row.last_error }),
    }));
  }

  /** Brings a dead message back. @throws NotFoundProblem when there is no dead one of that id */
  async retry(person: Person, id: string): Promise<void> {
    await this.writer.transaction(async (transaction) => {
      const revived = await this.writer.run(
        transaction,
        `UPDATE outbox_messages SET state = 'pending', attempts = 0, next_attempt_at = $now
          WHERE id = $id AND state = 'dead'`,
        { id, now: this.clock.timestamp() },
      );
      if (revived === 0) throw new NotFoundProblem('There is no such message that has been given up.');
      await this.audit.record(transaction, {
        actor: person,
        action: 'retry',
        subjectType: 'OutboxMessage',
        subjectId: id,
      });
    });
    this.dispatcher.wake();
  }
}
