import { Injectable } from '@nestjs/common';
import { AuditTrail } from '../audit/audit-trail';
import { SYSTEM } from '../audit/actor';
import { UnauthenticatedProblem } from '../common/problems/problems';
import { Readers } from '../database/readers';
import { Writer } from '../database/writer';
import { normalisedEmail } from '../users/email-address';
import { PasswordHasher } from './password-hasher';
import { type Device, type OpenSession, Sessions } from './sessions';
import { SignInThrottle } from './sign-in-throttle';

interface AccountRow {
  id: number;
  password_hash: string;
  state: string;
}

/** Letting people in, keeping them in, letting them out. */
@Injectable()
export class SignInService {
  constructor(
    private readonly readers: Readers,
    private readonly writer: Writer,
    private readonly hasher: PasswordHasher,
    private readonly throttle: SignInThrottle,
    private readonly sessions: Sessions,
    private readonly audit: AuditTrail,
  ) {}

  /**
   * @throws UnauthenticatedProblem in the same words and time whether the account is unknown, deactivated or the
   *   password wrong
   * @throws ThrottledProblem after too many failures
   */
  async signIn(typedEmail: string, password: string, device: Device): Promise<OpenSession> {
    const email = normalisedEmail(typedEmail);
    const attempt = { email, address: device.address };
    await this.throttle.check(attempt);
    const account = await this.readers.lookUp<AccountRow>(
      'SELECT id, password_hash, state FROM users WHERE email = $email',
      { email },
    );
    const matches = await this.hasher.matches(password, account?.password_hash);
    const session = await this.writer.transaction(async (transaction) => {
      await this.throttle.checkAgain(transaction, attempt);
      if (!account || !matches || account.state !== 'active') {
        await this.throttle.recordFailure(transaction, attempt);
        return undefined;
      }
      await this.throttle.forgive(transaction, email);
      return this.sessions.open(transaction, account.id, device);
    });
    if (!session) throw new UnauthenticatedProblem('The address or the password is not right.');
    return session;
  }

  /** @throws UnauthenticatedProblem when the token is unknown, run out, or has been used before */
  async refresh(refreshToken: string | undefined): Promise<OpenSession> {
    const renewal = await this.writer.transaction(async (transaction) => {
      if (!refreshToken) return { kind: 'unknown' } as const;
      const outcome = await this.sessions.renew(transaction, refreshToken);
      if (outcome.kind === 'reused') {
        await this.audit.record(transaction, {
          actor: SYSTEM,
          action: 'end-session',
          subjectType: 'User',
          subjectId: outcome.userId,
          reason: 'A refresh token was presented again after it had been replaced: it may have been copied.',
        });
      }
      return outcome;
    });
    if (renewal.kind !== 'renewed')
      throw new UnauthenticatedProblem('Your sign-in has ended. Sign in again.');
    return renewal.session;
  }

  async signOut(refreshToken: string | undefined): Promise<void> {
    if (!refreshToken) return;
    await this.writer.transaction(async (transaction) => {
      const id = await this.sessions.sessionOf(transaction, refreshToken);
      if (id) await this.sessions.end(transaction, { id }, 'signed-out');
    });
  }

  async signOutEverywhere(userId: number): Promise<void> {
    await this.writer.transaction((transaction) =>
      this.sessions.end(transaction, { userId }, 'signed-out-everywhere'),
    );
  }
}
