import { randomBytes, randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { SYSTEM } from '../audit/actor';
import { AuditTrail } from '../audit/audit-trail';
import { Clock } from '../common/clock';
import { ConflictProblem } from '../common/problems/problems';
import { Environment } from '../config/environment';
import { Secrets } from '../config/secrets';
import { Writer } from '../database/writer';
import { UserAccounts } from '../users/user-accounts';
import { PasswordResetModel } from './models/password-reset.model';
import { tokenHash } from './token-hash';

const VALID_SECONDS = 24 * 3600;

/** Makes the account that invites all the others, on an installation where nobody can do so yet. */
@Injectable()
export class FirstAdministrator {
  constructor(
    private readonly writer: Writer,
    private readonly accounts: UserAccounts,
    private readonly audit: AuditTrail,
    private readonly secrets: Secrets,
    private readonly environment: Environment,
    private readonly clock: Clock,
  ) {}

  /**
   * @returns the link under which the administrator chooses a password: good once, and for a day
   * @throws ConflictProblem where somebody administers already, or the address has an account
   */
  async create(email: string, name: string): Promise<string> {
    // Nobody ever learns this one: the link is the way to the first password that counts.
    const password = randomBytes(24).toString('base64url');
    const passwordHash = await this.accounts.hashChosenPassword(password, '/password', []);
    const id = randomUUID();
    const token = this.secrets.mailedToken('password-reset', id);
    await this.writer.transaction(async (transaction) => {
      const administrators = await this.writer.select(
        transaction,
        `SELECT 1 FROM user_roles JOIN users ON users.id = user_roles.user_id
          WHERE role = 'administrator' AND state = 'active' LIMIT 1`,
      );
      if (administrators.length > 0) {
        throw new ConflictProblem('There is an administrator already, who can invite others.');
      }
      const roles = ['administrator'] as const;
      const userId = await this.accounts.create(transaction, { email, name, roles, passwordHash });
      await PasswordResetModel.create(
        {
          id,
          userId,
          tokenHash: tokenHash(token),
          createdAt: this.clock.timestamp(),
          expiresAt: this.clock.timestampIn(VALID_SECONDS),
        },
        { transaction },
      );
      await this.audit.record(transaction, {
        actor: SYSTEM,
        action: 'create',
        subjectType: 'User',
        subjectId: userId,
        after: { email, name, roles },
        reason: 'by the command that makes the first administrator',
      });
    });
    return `${this.environment.appUrl}/reset-password#token=${token}`;
  }
}
