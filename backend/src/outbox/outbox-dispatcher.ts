import { AsyncResource } from 'node:async_hooks';
import { Injectable, type OnApplicationBootstrap, type OnModuleDestroy } from '@nestjs/common';
import { PinoLogger } from 'nestjs-pino';
import { Clock } from '../common/clock';
import { Readers } from '../database/readers';
import { Writer } from '../database/writer';
import { OutboxHandlers } from './outbox-handlers';
import { waitAfter } from './retry-plan';

interface DueMessage {
  id: string;
  kind: string;
  payload: string;
  attempts: number;
}

const POLL_MILLISECONDS = 2000;
const LONGEST_ERROR = 500;

/**
 * Delivers the outbox's messages after their commit, one after the other, at least once. What a kill left behind is
 * found at the next start; what fails is tried again, later and later, and at last laid aside as dead, to be seen.
 */
@Injectable()
export class OutboxDispatcher implements OnApplicationBootstrap, OnModuleDestroy {
  private running: Promise<void> | undefined;
  private wanted = false;
  private stopped = false;
  private timer: NodeJS.Timeout | undefined;
  /** Bound to the context of the start: it must not count as part of the transaction whose commit wakes it. */
  private readonly workApart = AsyncResource.bind(() => this.work());

  constructor(
    private readonly readers: Readers,
    private readonly writer: Writer,
    private readonly handlers: OutboxHandlers,
    private readonly clock: Clock,
    private readonly logger: PinoLogger,
  ) {}

  onApplicationBootstrap(): void {
    this.timer = setInterval(() => this.wake(), POLL_MILLISECONDS).unref();
    this.wake();
  }

  async onModuleDestroy(): Promise<void> {
    this.stopped = true;
    clearInterval(this.timer);
    await this.running;
  }

  /** Says that there may be something to deliver; never waits. */
  wake(): void {
    this.wanted = true;
    if (this.running || this.stopped) return;
    this.running = this.workApart().finally(() => {
      this.running = undefined;
    });
  }

  /** Resolves when everything that is due has been tried. */
  async drain(): Promise<void> {
    this.wake();
    await this.running;
  }

  private async work(): Promise<void> {
    try {
      while (this.wanted) {
        this.wanted = false;
        await this.deliverAllDue();
      }
    } catch (error) {
      // The next poll tries again; a failing handler does not come here, only a failing database does.
      this.logger.error({ err: error }, 'the outbox could not be read or written');
    }
  }

  private async deliverAllDue(): Promise<void> {
    for (let due = await this.nextDue(); due; due = await this.nextDue()) {
      if (this.stopped) return;
      await this.deliver(due);
    }
  }

  private async nextDue(): Promise<DueMessage | undefined> {
    return this.readers.lookUp<DueMessage>(
      `SELECT id, kind, payload, attempts FROM outbox_messages
        WHERE state = 'pending' AND next_attempt_at <= $now ORDER BY next_attempt_at, sequence LIMIT 1`,
      { now: this.clock.timestamp() },
    );
  }

  private async deliver(message: DueMessage): Promise<void> {
    try {
      await this.handlers.handle(message);
    } catch (error) {
      await this.markFailed(message, error);
      return;
    }
    await this.writer.transaction((transaction) =>
      this.writer.run(
        transaction,
        `UPDATE outbox_messages SET state = 'delivered', attempts = attempts + 1, delivered_at = $now, last_error = NULL
          WHERE id = $id`,
        { id: message.id, now: this.clock.timestamp() },
      ),
    );
  }

  private async markFailed(message: DueMessage, error: unknown): Promise<void> {
    const attempts = message.attempts + 1;
    const wait = waitAfter(attempts);
    this.logger.warn(
      { err: error, message: message.id, kind: message.kind, attempts },
      'an outbox message failed',
    );
    await this.writer.transaction((transaction) =>
      this.writer.run(
        transaction,
        `UPDATE outbox_messages SET attempts = $attempts, state = $state, next_attempt_at = $next, last_error = $error
          WHERE id = $id`,
        {
          id: message.id,
          attempts,
          state: wait === undefined ? 'dead' : 'pending',
          next: this.clock.timestampIn(wait ?? 0),
          error: (error instanceof Error ? error.message : String(error)).slice(0, LONGEST_ERROR),
        },
      ),
    );
  }
}
