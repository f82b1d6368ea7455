import { Injectable, type OnModuleDestroy } from '@nestjs/common';
import { createTransport, type Transporter } from 'nodemailer';
import { Environment } from '../config/environment';
import { MailCatcher } from './mail-catcher';
import type { Letter } from './mail-topic';

const TIMEOUT_MILLISECONDS = 15_000;

/** Hands letters to the mail server of MAIL_URL, or to the local catcher where there is none. */
@Injectable()
export class Mailer implements OnModuleDestroy {
  private transport: Transporter | undefined;

  constructor(
    private readonly environment: Environment,
    private readonly catcher: MailCatcher,
  ) {}

  /**
   * Sends one letter. The Message-ID follows from the outbox message, so that a letter which leaves twice after a
   * kill can be recognised as one by whoever receives it.
   *
   * @throws Error when the server does not take it
   */
  async send(letter: Letter, outboxMessageId: string): Promise<void> {
    const host = new URL(this.environment.appUrl).hostname;
    await this.open().sendMail({
      from: { name: 'Resistry', address: `no-reply@${host}` },
      to: { name: '', address: letter.to },
      subject: letter.subject,
      text: letter.text,
      messageId: `<${outboxMessageId}@${host}>`,
    });
  }

  onModuleDestroy(): void {
    this.transport?.close();
  }

  private open(): Transporter {
    this.transport ??= createTransport({
      ...this.server(),
      connectionTimeout: TIMEOUT_MILLISECONDS,
      greetingTimeout: TIMEOUT_MILLISECONDS,
      socketTimeout: TIMEOUT_MILLISECONDS,
    });
    return this.transport;
  }

  private server(): object {
    const { mailUrl } = this.environment;
    return mailUrl ? { url: mailUrl } : { host: '127.0.0.1', port: this.catcher.port, ignoreTLS: true };
  }
}
