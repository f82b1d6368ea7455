import { createHash } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import { Clock } from '../common/clock';
import { ThrottledProblem } from '../common/problems/problems';
import { Readers } from '../database/readers';
import { Writer } from '../database/writer';

const WINDOW_SECONDS = 15 * 60;
const FAILURES_PER_ACCOUNT = 5;
/** Higher, because a whole office may share one address. */
const FAILURES_PER_ADDRESS = 50;

const FIFTH_NEWEST_FAILURES = `
  SELECT
    (SELECT failed_at FROM failed_sign_ins WHERE account = $account AND forgiven = 0 AND failed_at > $since
      ORDER BY failed_at DESC LIMIT 1 OFFSET ${FAILURES_PER_ACCOUNT - 1}) AS account_locked_since,
    (SELECT failed_at FROM failed_sign_ins WHERE address = $address AND failed_at > $since
      ORDER BY failed_at DESC LIMIT 1 OFFSET ${FAILURES_PER_ADDRESS - 1}) AS address_locked_since`;

interface LockRow {
  account_locked_since: string | null;
  address_locked_since: string | null;
}

/** A sign-in attempt: the account it names and the address it came from. */
export interface Attempt {
  email: string;
  address: string;
}

/**
 * Slows guessing down. Only failed attempts count, by account (existing or not, so that the answer tells nothing) and
 * by address. An account may try again when its oldest counted failure is a quarter of an hour old.
 */
@Injectable()
export class SignInThrottle {
  constructor(
    private readonly readers: Readers,
    private readonly writer: Writer,
    private readonly clock: Clock,
  ) {}

  /** Turns away before the costly comparison. @throws ThrottledProblem */
  async check(attempt: Attempt): Promise<void> {
    this.refuseLocked(await this.readers.lookUp<LockRow>(FIFTH_NEWEST_FAILURES, this.bind(attempt)));
  }

  /**
   * Asked again when the outcome is known, one attempt at a time: of many guesses sent at once, only as many get an
   * answer as may fail. @throws ThrottledProblem
   */
  async checkAgain(transaction: Transaction, attempt: Attempt): Promise<void> {
    const [row] = await this.writer.select<LockRow>(transaction, FIFTH_NEWEST_FAILURES, this.bind(attempt));
    this.refuseLocked(row);
  }

  async recordFailure(transaction: Transaction, attempt: Attempt): Promise<void> {
    await this.writer.run(
      transaction,
      'INSERT INTO failed_sign_ins (account, address, failed_at) VALUES ($account, $address, $now)',
      { account: accountKey(attempt.email), address: attempt.address, now: this.clock.timestamp() },
    );
  }

  /** The right password, or a reset one, clears the account's failures; the address keeps its own. */
  async forgive(transaction: Transaction, email: string): Promise<void> {
    await this.writer.run(
      transaction,
      'UPDATE failed_sign_ins SET forgiven = 1 WHERE account = $account AND forgiven = 0',
      { account: accountKey(email) },
    );
  }

  private bind(attempt: Attempt): { account: string; address: string; since: string } {
    const since = this.clock.timestampIn(-WINDOW_SECONDS);
    return { account: accountKey(attempt.email), address: attempt.address, since };
  }

  private refuseLocked(row: LockRow | undefined): void {
    const account = row?.account_locked_since;
    const address = row?.address_locked_since;
    const wait = Math.max(this.secondsLeft(account), this.secondsLeft(address));
    if (wait <= 0) return;
    const minutes = Math.ceil(wait / 60);
    const whose = account ? 'for this account' : 'from your network';
    throw new ThrottledProblem(
      `Too many attempts have failed ${whose}, so signing in rests for a while. Try again in ${minutes} ` +
        `${minutes === 1 ? 'minute' : 'minutes'}${account ? ', or reset your password' : ''}.`,
      wait,
    );
  }

  private secondsLeft(since: string | null | undefined): number {
    return since ? (Date.parse(since) - this.clock.now().getTime()) / 1000 + WINDOW_SECONDS : 0;
  }
}

/** People type passwords into the wrong field: what they typed is not kept in the clear. */
function accountKey(email: string): string {
  return createHash('sha256').update(email).digest('hex');
}
