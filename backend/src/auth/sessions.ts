import { randomBytes, randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { Op, type Transaction } from 'sequelize';
import { Clock } from '../common/clock';
import { RefreshTokenModel } from './models/refresh-token.model';
import { type SessionEnd, SessionModel } from './models/session.model';
import { tokenHash } from './token-hash';

const DAY_SECONDS = 24 * 3600;
/** After so long a person signs in anew, however busy. */
const SESSION_SECONDS = 30 * DAY_SECONDS;
/** A token not used for so long is worth nothing. */
export const REFRESH_TOKEN_SECONDS = 7 * DAY_SECONDS;
/** Two tabs that refresh at once both present the same token; that much later it is a theft. */
const GRACE_SECONDS = 20;
const LONGEST_USER_AGENT = 300;

/** Where a request came from, as shown to the person in the list of sessions. */
export interface Device {
  userAgent: string;
  address: string;
}

export interface OpenSession {
  id: string;
  userId: number;
  refreshToken: string;
}

export type Renewal =
  { kind: 'renewed'; session: OpenSession } | { kind: 'unknown' } | { kind: 'reused'; userId: number };

/** Sign-ins and their chains of refresh tokens, each of which is used once. */
@Injectable()
export class Sessions {
  constructor(private readonly clock: Clock) {}

  async open(transaction: Transaction, userId: number, device: Device): Promise<OpenSession> {
    const id = randomUUID();
    const now = this.clock.timestamp();
    await SessionModel.create(
      {
        id,
        userId,
        userAgent: device.userAgent.slice(0, LONGEST_USER_AGENT),
        address: device.address,
        createdAt: now,
        lastUsedAt: now,
        expiresAt: this.clock.timestampIn(SESSION_SECONDS),
      },
      { transaction },
    );
    return { id, userId, refreshToken: await this.issue(transaction, id) };
  }

  /**
   * Takes a refresh token and gives the next one. A token that was replaced a while ago has been copied: its whole
   * session ends, for the thief and for the person.
   */
  async renew(transaction: Transaction, refreshToken: string): Promise<Renewal> {
    const now = this.clock.timestamp();
    const token = await RefreshTokenModel.findByPk(tokenHash(refreshToken), { transaction });
    const session = token && (await SessionModel.findByPk(token.sessionId, { transaction }));
    if (
      !token ||
      !session ||
      session.endedAt !== null ||
      session.expiresAt <= now ||
      token.expiresAt <= now
    ) {
      return { kind: 'unknown' };
    }
    if (token.replacedAt !== null && token.replacedAt < this.clock.timestampIn(-GRACE_SECONDS)) {
      await this.end(transaction, { id: session.id }, 'token-reused');
      return { kind: 'reused', userId: session.userId };
    }
    if (token.replacedAt === null) await token.update({ replacedAt: now }, { transaction });
    await session.update({ lastUsedAt: now }, { transaction });
    const next = await this.issue(transaction, session.id);
    return { kind: 'renewed', session: { id: session.id, userId: session.userId, refreshToken: next } };
  }

  /** The session that a refresh token belongs to, whatever its state. */
  async sessionOf(transaction: Transaction, refreshToken: string): Promise<string | undefined> {
    return (await RefreshTokenModel.findByPk(tokenHash(refreshToken), { transaction }))?.sessionId;
  }

  /**
   * Ends sessions, and with them the access tokens that were issued for them.
   *
   * @returns how many were open
   */
  async end(
    transaction: Transaction,
    which: { id: string; userId?: number } | { userId: number },
    reason: SessionEnd,
  ): Promise<number> {
    const [ended] = await SessionModel.update(
      { endedAt: this.clock.timestamp(), endedReason: reason },
      { where: { ...which, endedAt: null }, transaction },
    );
    return ended;
  }

  /** Ends all sessions of a person but the one that he or she is using. */
  async endOthers(
    transaction: Transaction,
    userId: number,
    ownId: string,
    reason: SessionEnd,
  ): Promise<void> {
    await SessionModel.update(
      { endedAt: this.clock.timestamp(), endedReason: reason },
      { where: { userId, id: { [Op.ne]: ownId }, endedAt: null }, transaction },
    );
  }

  private async issue(transaction: Transaction, sessionId: string): Promise<string> {
    const token = randomBytes(32).toString('base64url');
    await RefreshTokenModel.create(
      {
        tokenHash: tokenHash(token),
        sessionId,
        issuedAt: this.clock.timestamp(),
        expiresAt: this.clock.timestampIn(REFRESH_TOKEN_SECONDS),
      },
      { transaction },
    );
    return token;
  }
}
