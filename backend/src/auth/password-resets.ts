import { Injectable } from '@nestjs/common';
import { Op } from 'sequelize';
import { AuditTrail } from '../audit/audit-trail';
import { Clock } from '../common/clock';
import { ClashProblem, ThrottledProblem } from '../common/problems/problems';
import { Readers } from '../database/readers';
import { Writer } from '../database/writer';
import { Outbox } from '../outbox/outbox';
import { normalisedEmail } from '../users/email-address';
import { UserAccounts } from '../users/user-accounts';
import { PasswordResetModel } from './models/password-reset.model';
import { PasswordResetRequestModel } from './models/password-reset-request.model';
import { PASSWORD_RESET_REQUESTED } from './password-reset-topic';
import { Sessions } from './sessions';
import { SignInThrottle } from './sign-in-throttle';
import { tokenHash } from './token-hash';

const HOUR_SECONDS = 3600;
const LETTERS_PER_ACCOUNT_AND_HOUR = 3;
const REQUESTS_PER_ADDRESS_AND_HOUR = 30;

interface ResetRow {
  user_id: number;
  email: string;
  name: string;
}

/** New passwords for those who have lost theirs. */
@Injectable()
export class PasswordResets {
  constructor(
    private readonly readers: Readers,
    private readonly writer: Writer,
    private readonly outbox: Outbox,
    private readonly accounts: UserAccounts,
    private readonly sessions: Sessions,
    private readonly throttle: SignInThrottle,
    private readonly audit: AuditTrail,
    private readonly clock: Clock,
  ) {}

  /**
   * Takes the request. Whether the address has an account is looked at only after the answer has gone, so neither its
   * words nor its time tell.
   *
   * @throws ThrottledProblem when one network address asks without end
   */
  async request(typedEmail: string, address: string): Promise<void> {
    const email = normalisedEmail(typedEmail);
    const since = { [Op.gt]: this.clock.timestampIn(-HOUR_SECONDS) };
    await this.writer.transaction(async (transaction) => {
      const fromAddress = await PasswordResetRequestModel.count({
        where: { address, requestedAt: since },
        transaction,
      });
      if (fromAddress >= REQUESTS_PER_ADDRESS_AND_HOUR) {
        throw new ThrottledProblem('Too many new passwords were asked for from your network.', HOUR_SECONDS);
      }
      const forAccount = await PasswordResetRequestModel.count({
        where: { email, requestedAt: since },
        transaction,
      });
      const id = await this.outbox.add(transaction, PASSWORD_RESET_REQUESTED, {
        email,
        // Beyond a few letters an hour nothing is sent, but the answer stays the same.
        silent: forAccount >= LETTERS_PER_ACCOUNT_AND_HOUR,
      });
      await PasswordResetRequestModel.create(
        { id, email, address, requestedAt: this.clock.timestamp() },
        { transaction },
      );
    });
  }

  /**
   * Sets the new password, ends every session of the account and lets it sign in again at once.
   *
   * @throws ClashProblem when the token is unknown, used or run out
   * @throws MalformedProblem when the password will not do
   */
  async redeem(token: string, password: string): Promise<void> {
    const hash = tokenHash(token);
    const found = await this.readers.lookUp<ResetRow>(
      `SELECT users.id AS user_id, users.email, users.name FROM password_resets
        JOIN users ON users.id = password_resets.user_id WHERE password_resets.token_hash = $hash`,
      { hash },
    );
    if (!found) throw spentToken();
    const passwordHash = await this.accounts.hashChosenPassword(password, '/password', [
      found.email,
      found.name,
    ]);
    await this.writer.transaction(async (transaction) => {
      const now = this.clock.timestamp();
      const [redeemed] = await PasswordResetModel.update(
        { usedAt: now },
        { where: { tokenHash: hash, usedAt: null, expiresAt: { [Op.gt]: now } }, transaction },
      );
      if (redeemed !== 1) throw spentToken();
      // The other letters that are still under way are worth nothing from now on.
      await PasswordResetModel.update(
        { usedAt: now },
        { where: { userId: found.user_id, usedAt: null }, transaction },
      );
      await this.accounts.setPasswordHash(transaction, found.user_id, passwordHash);
      await this.sessions.end(transaction, { userId: found.user_id }, 'password-changed');
      await this.throttle.forgive(transaction, found.email);
      await this.audit.record(transaction, {
        actor: { id: found.user_id, name: found.name },
        action: 'reset-password',
        subjectType: 'User',
        subjectId: found.user_id,
      });
    });
  }
}

function spentToken(): ClashProblem {
  return new ClashProblem('This link has been used or has run out. Ask for a new one.', [
    { pointer: '/token', message: 'has been used or has run out' },
  ]);
}
