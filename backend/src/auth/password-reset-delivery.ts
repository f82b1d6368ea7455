import { Injectable, type OnModuleInit } from '@nestjs/common';
import { Clock } from '../common/clock';
import { Environment } from '../config/environment';
import { Secrets } from '../config/secrets';
import { Readers } from '../database/readers';
import { Writer } from '../database/writer';
import { Mailer } from '../mail/mailer';
import { OutboxHandlers } from '../outbox/outbox-handlers';
import { PasswordResetModel } from './models/password-reset.model';
import { passwordResetLetter } from './password-reset-letter';
import { PASSWORD_RESET_REQUESTED } from './password-reset-topic';
import { tokenHash } from './token-hash';

const VALID_SECONDS = 3600;

/** Makes the token for a requested reset and sends it, where the address has an account. */
@Injectable()
export class PasswordResetDelivery implements OnModuleInit {
  constructor(
    private readonly handlers: OutboxHandlers,
    private readonly readers: Readers,
    private readonly writer: Writer,
    private readonly mailer: Mailer,
    private readonly secrets: Secrets,
    private readonly environment: Environment,
    private readonly clock: Clock,
  ) {}

  onModuleInit(): void {
    this.handlers.register(PASSWORD_RESET_REQUESTED, async ({ email, silent }, messageId) => {
      if (!silent) await this.deliver(email, messageId);
    });
  }

  private async deliver(email: string, messageId: string): Promise<void> {
    const user = await this.readers.lookUp<{ id: number; name: string }>(
      "SELECT id, name FROM users WHERE email = $email AND state = 'active'",
      { email },
    );
    if (!user) return;
    const token = this.secrets.mailedToken('password-reset', messageId);
    await this.writer.transaction(async (transaction) => {
      // A second delivery of the message finds the row, used or not, and makes no second one.
      if (await PasswordResetModel.findByPk(messageId, { transaction })) return;
      await PasswordResetModel.create(
        {
          id: messageId,
          userId: user.id,
          tokenHash: tokenHash(token),
          createdAt: this.clock.timestamp(),
          expiresAt: this.clock.timestampIn(VALID_SECONDS),
        },
        { transaction },
      );
    });
    await this.mailer.send(passwordResetLetter(email, user.name, this.environment.appUrl, token), messageId);
  }
}
