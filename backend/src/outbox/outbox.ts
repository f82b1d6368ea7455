import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import { Clock } from '../common/clock';
import { OutboxMessageModel } from './models/outbox-message.model';
import { OutboxDispatcher } from './outbox-dispatcher';
import type { OutboxTopic } from './outbox-topic';

/** Takes what must happen after a change, in the transaction of the change: both are kept or neither is. */
@Injectable()
export class Outbox {
  constructor(
    private readonly clock: Clock,
    private readonly dispatcher: OutboxDispatcher,
  ) {}

  /**
   * Adds a message; its topic's handler gets it after the commit, at least once.
   *
   * @returns the id of the message
   */
  async add<Payload extends object>(
    transaction: Transaction,
    topic: OutboxTopic<Payload>,
    payload: Payload,
  ): Promise<string> {
    const id = randomUUID();
    const now = this.clock.timestamp();
    const newest = await OutboxMessageModel.max<number | null, OutboxMessageModel>('sequence', {
      transaction,
    });
    await OutboxMessageModel.create(
      {
        id,
        sequence: (newest ?? 0) + 1,
        kind: topic.name,
        payload: topic.write(payload),
        state: 'pending',
        attempts: 0,
        createdAt: now,
        nextAttemptAt: now,
      },
      { transaction },
    );
    transaction.afterCommit(() => this.dispatcher.wake());
    return id;
  }
}
