import { Injectable, type OnModuleInit } from '@nestjs/common';
import { Environment } from '../config/environment';
import { Secrets } from '../config/secrets';
import { Readers } from '../database/readers';
import { Mailer } from '../mail/mailer';
import { OutboxHandlers } from '../outbox/outbox-handlers';
import { invitationLetter } from './invitation-letter';
import { INVITED } from './invitation-topic';

/** Sends the letter of an invitation, unless it has been withdrawn meanwhile. */
@Injectable()
export class InvitationDelivery implements OnModuleInit {
  constructor(
    private readonly handlers: OutboxHandlers,
    private readonly readers: Readers,
    private readonly mailer: Mailer,
    private readonly secrets: Secrets,
    private readonly environment: Environment,
  ) {}

  onModuleInit(): void {
    this.handlers.register(INVITED, ({ invitationId }, messageId) => this.deliver(invitationId, messageId));
  }

  private async deliver(invitationId: string, messageId: string): Promise<void> {
    const row = await this.readers.lookUp<{ email: string; invited_by: string }>(
      `SELECT invitations.email, users.name AS invited_by FROM invitations
        JOIN users ON users.id = invitations.invited_by
        WHERE invitations.id = $invitationId AND accepted_at IS NULL AND withdrawn_at IS NULL`,
      { invitationId },
    );
    if (!row) return;
    const token = this.secrets.mailedToken('invitation', invitationId);
    await this.mailer.send(
      invitationLetter(row.email, row.invited_by, this.environment.appUrl, token),
      messageId,
    );
  }
}
