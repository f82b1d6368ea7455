import { Injectable } from '@nestjs/common';
import { AuditTrail } from '../audit/audit-trail';
import { PasswordHasher } from '../auth/password-hasher';
import { Sessions } from '../auth/sessions';
import { SignInThrottle } from '../auth/sign-in-throttle';
import { Clock } from '../common/clock';
import { ClashProblem, NotFoundProblem } from '../common/problems/problems';
import { Readers } from '../database/readers';
import { Writer } from '../database/writer';
import type { Person } from '../permissions/person';
import { UserModel } from '../users/models/user.model';
import { UserAccounts } from '../users/user-accounts';
import type { OwnSession } from './dto/account.dto';

interface SessionRow {
  id: string;
  user_agent: string;
  address: string;
  created_at: string;
  last_used_at: string;
}

/** What everybody does with his or her own account. */
@Injectable()
export class AccountService {
  constructor(
    private readonly readers: Readers,
    private readonly writer: Writer,
    private readonly accounts: UserAccounts,
    private readonly hasher: PasswordHasher,
    private readonly sessions: Sessions,
    private readonly throttle: SignInThrottle,
    private readonly audit: AuditTrail,
    private readonly clock: Clock,
  ) {}

  async rename(person: Person, name: string): Promise<void> {
    await this.writer.transaction(async (transaction) => {
      await UserModel.increment('version', { where: { id: person.id }, transaction });
      await UserModel.update(
        { name: name.trim(), updatedAt: this.clock.timestamp() },
        { where: { id: person.id }, transaction },
      );
      await this.audit.record(transaction, {
        actor: person,
        action: 'rename',
        subjectType: 'User',
        subjectId: person.id,
        before: { name: person.name },
        after: { name: name.trim() },
      });
    });
  }

  /**
   * Changes the password and ends every other session of the person.
   *
   * @throws ClashProblem when the current password is not right; such guesses count like failed sign-ins
   * @throws MalformedProblem when the new one will not do
   */
  async changePassword(person: Person, address: string, current: string, chosen: string): Promise<void> {
    const attempt = { email: person.email, address };
    await this.throttle.check(attempt);
    const stored = await this.readers.lookUp<{ password_hash: string }>(
      'SELECT password_hash FROM users WHERE id = $id',
      { id: person.id },
    );
    const matches = await this.hasher.matches(current, stored?.password_hash);
    if (!matches) {
      await this.writer.transaction(async (transaction) => {
        await this.throttle.checkAgain(transaction, attempt);
        await this.throttle.recordFailure(transaction, attempt);
      });
      throw new ClashProblem('The current password is not right.', [
        { pointer: '/currentPassword', message: 'is not right' },
      ]);
    }
    const passwordHash = await this.accounts.hashChosenPassword(chosen, '/newPassword', [
      person.email,
      person.name,
    ]);
    await this.writer.transaction(async (transaction) => {
      await this.throttle.checkAgain(transaction, attempt);
      await this.accounts.setPasswordHash(transaction, person.id, passwordHash);
      await this.sessions.endOthers(transaction, person.id, person.sessionId, 'password-changed');
      await this.audit.record(transaction, {
        actor: person,
        action: 'change-password',
        subjectType: 'User',
        subjectId: person.id,
      });
    });
  }

  async listSessions(person: Person): Promise<OwnSession[]> {
    const rows = await this.readers.select<SessionRow>(
      `SELECT id, user_agent, address, created_at, last_used_at FROM sessions
        WHERE user_id = $userId AND ended_at IS NULL AND expires_at > $now ORDER BY last_used_at DESC, id`,
      { userId: person.id, now: this.clock.timestamp() },
    );
    return rows.map((row) => ({
      id: row.id,
      userAgent: row.user_agent,
      address: row.address,
      createdAt: row.created_at,
      lastUsedAt: row.last_used_at,
      current: row.id === person.sessionId,
    }));
  }

  /** @throws NotFoundProblem when it is no open session of this person */
  async endSession(person: Person, id: string): Promise<void> {
    const ended = await this.writer.transaction((transaction) =>
      this.sessions.end(transaction, { id, userId: person.id }, 'signed-out'),
    );
    if (ended === 0) throw new NotFoundProblem('You have no such session.');
  }
}
