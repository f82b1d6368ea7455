import { Injectable } from '@nestjs/common';
import { Op } from 'sequelize';
import { AuditTrail } from '../audit/audit-trail';
import { tokenHash } from '../auth/token-hash';
import { Clock } from '../common/clock';
import { ClashProblem } from '../common/problems/problems';
import { Readers } from '../database/readers';
import { Writer } from '../database/writer';
import { readRoles } from '../permissions/read-roles';
import type { InvitationPreview } from './dto/invitation.dto';
import { InvitationModel } from './models/invitation.model';
import { UserAccounts } from './user-accounts';

interface OpenInvitationRow {
  email: string;
  roles: string;
  expires_at: string;
}

/** Coming in by an invitation. */
@Injectable()
export class InvitationAcceptance {
  constructor(
    private readonly readers: Readers,
    private readonly writer: Writer,
    private readonly accounts: UserAccounts,
    private readonly audit: AuditTrail,
    private readonly clock: Clock,
  ) {}

  /** What an open invitation offers. @throws ClashProblem when it is unknown, used, withdrawn or has run out */
  async preview(token: string): Promise<InvitationPreview> {
    const row = await this.readers.lookUp<OpenInvitationRow>(
      `SELECT email, roles, expires_at FROM invitations WHERE token_hash = $hash AND accepted_at IS NULL
        AND withdrawn_at IS NULL AND expires_at > $now`,
      { hash: tokenHash(token), now: this.clock.timestamp() },
    );
    if (!row) throw spentInvitation();
    return { email: row.email, roles: readRoles(row.roles), expiresAt: row.expires_at };
  }

  /**
   * Makes the account.
   *
   * @throws ClashProblem when the invitation is no longer open
   * @throws MalformedProblem when the password will not do
   */
  async accept(token: string, name: string, password: string): Promise<void> {
    const { email } = await this.preview(token);
    const passwordHash = await this.accounts.hashChosenPassword(password, '/password', [email, name]);
    await this.writer.transaction(async (transaction) => {
      const now = this.clock.timestamp();
      const invitation = await InvitationModel.findOne({
        where: {
          tokenHash: tokenHash(token),
          acceptedAt: null,
          withdrawnAt: null,
          expiresAt: { [Op.gt]: now },
        },
        transaction,
      });
      if (!invitation) throw spentInvitation();
      const roles = readRoles(invitation.roles);
      const userId = await this.accounts.create(transaction, {
        email: invitation.email,
        name,
        roles,
        passwordHash,
      });
      await invitation.update({ acceptedAt: now, userId }, { transaction });
      await this.audit.record(transaction, {
        actor: { id: userId, name },
        action: 'accept-invitation',
        subjectType: 'User',
        subjectId: userId,
        after: { email: invitation.email, name, roles },
      });
    });
  }
}

function spentInvitation(): ClashProblem {
  return new ClashProblem('This invitation has been used, withdrawn or has run out. Ask for a new one.', [
    { pointer: '/token', message: 'has been used, withdrawn or has run out' },
  ]);
}
