import { Injectable, type OnModuleInit } from '@nestjs/common';
import { OutboxHandlers } from '../outbox/outbox-handlers';
import { MAIL } from './mail-topic';
import { Mailer } from './mailer';

/** Sends the letters of the outbox. */
@Injectable()
export class MailDelivery implements OnModuleInit {
  constructor(
    private readonly handlers: OutboxHandlers,
    private readonly mailer: Mailer,
  ) {}

  onModuleInit(): void {
    this.handlers.register(MAIL, (letter, messageId) => this.mailer.send(letter, messageId));
  }
}
