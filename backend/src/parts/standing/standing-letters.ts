import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import { Environment } from '../../config/environment';
import { Writer } from '../../database/writer';
import { MAIL } from '../../mail/mail-topic';
import { Outbox } from '../../outbox/outbox';
import type { Person } from '../../permissions/person';
import { nameOf, type PartStanding } from './part-standing';

interface Recipient {
  email: string;
  name: string;
}

/** A change of a part's standing, as people are told of it. */
export interface StandingNews {
  part: PartStanding;
  actor: Person;
  /** What has become of the part, continuing its name: `is now preferred; it was approved`. */
  event: string;
  reason: string;
  /** What is asked of the reader; absent where it is for information. */
  request?: string;
}

/** Tells by mail those whom a change of a part's standing concerns. Nobody is told what he or she did. */
@Injectable()
export class StandingLetters {
  constructor(
    private readonly writer: Writer,
    private readonly outbox: Outbox,
    private readonly environment: Environment,
  ) {}

  /** To whoever entered the part or opened one of these reviews. */
  async toThoseWhoBroughtIt(
    transaction: Transaction,
    news: StandingNews,
    reviewIds: readonly number[],
  ): Promise<void> {
    const recipients = await this.writer.select<Recipient>(
      transaction,
      `SELECT email, name FROM users WHERE state = 'active' AND id <> $actorId AND (id = $enteredBy OR id IN
        (SELECT opened_by FROM reviews WHERE id IN (SELECT value FROM json_each($reviewIds)))) ORDER BY id`,
      {
        actorId: news.actor.id,
        enteredBy: news.part.entered_by,
        reviewIds: JSON.stringify(reviewIds),
      },
    );
    await this.send(transaction, recipients, news);
  }

  async toComponentEngineers(transaction: Transaction, news: StandingNews): Promise<void> {
    const recipients = await this.writer.select<Recipient>(
      transaction,
      `SELECT email, name FROM users JOIN user_roles ON user_roles.user_id = users.id
        WHERE role = 'component-engineer' AND state = 'active' AND id <> $actorId ORDER BY id`,
      { actorId: news.actor.id },
    );
    await this.send(transaction, recipients, news);
  }

  private async send(
    transaction: Transaction,
    recipients: readonly Recipient[],
    { part, actor, event, reason, request }: StandingNews,
  ): Promise<void> {
    const name = nameOf(part);
    for (const recipient of recipients) {
      await this.outbox.add(transaction, MAIL, {
        to: recipient.email,
        subject: `${name} ${event}`,
        text: [
          `Hello ${recipient.name},`,
          '',
          `${name} ${event}.`,
          `Changed by ${actor.name}, who gave this reason:`,
          '',
          ...reason.split(/\r?\n/).map((line) => `  ${line}`),
          '',
          ...(request === undefined ? [] : [request, '']),
          `${this.environment.appUrl}/parts/${part.id}`,
          '',
        ].join('\n'),
      });
    }
  }
}
