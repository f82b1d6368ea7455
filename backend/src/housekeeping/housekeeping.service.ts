import { Injectable } from '@nestjs/common';
import { Cron } from '@nestjs/schedule';
import { PinoLogger } from 'nestjs-pino';
import { Clock } from '../common/clock';
import { Writer } from '../database/writer';

const DAY_SECONDS = 24 * 3600;

/** What is of no use any more, and after how many days it goes. Accounts and the audit trail never go. */
const LEFTOVERS = [
  { days: 1, sql: 'DELETE FROM failed_sign_ins WHERE failed_at < $limit' },
  { days: 1, sql: 'DELETE FROM password_reset_requests WHERE requested_at < $limit' },
  { days: 30, sql: 'DELETE FROM password_resets WHERE expires_at < $limit' },
  // A token is kept well beyond its life: presented again, it still tells of a theft.
  { days: 30, sql: 'DELETE FROM sessions WHERE coalesce(ended_at, expires_at) < $limit' },
  { days: 30, sql: `DELETE FROM outbox_messages WHERE state = 'delivered' AND delivered_at < $limit` },
] as const;

/** Clears away, each night, what has had its time. */
@Injectable()
export class Housekeeping {
  constructor(
    private readonly writer: Writer,
    private readonly clock: Clock,
    private readonly logger: PinoLogger,
  ) {}

  @Cron('0 0 3 * * *', { name: 'housekeeping' })
  async run(): Promise<void> {
    try {
      for (const { days, sql } of LEFTOVERS) {
        const limit = this.clock.timestampIn(-days * DAY_SECONDS);
        await this.writer.transaction((transaction) => this.writer.run(transaction, sql, { limit }));
      }
    } catch (error) {
      this.logger.error({ err: error }, 'the nightly housekeeping failed');
    }
  }
}
