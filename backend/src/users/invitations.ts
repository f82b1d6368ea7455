import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { AuditTrail } from '../audit/audit-trail';
import { tokenHash } from '../auth/token-hash';
import { Clock } from '../common/clock';
import { ConflictProblem, NotFoundProblem } from '../common/problems/problems';
import { Secrets } from '../config/secrets';
import { Readers } from '../database/readers';
import { Writer } from '../database/writer';
import { Outbox } from '../outbox/outbox';
import type { Person } from '../permissions/person';
import { readRoles } from '../permissions/read-roles';
import type { Role } from '../permissions/roles';
import type { InvitationDetails } from './dto/invitation.dto';
import { normalisedEmail } from './email-address';
import { INVITED } from './invitation-topic';
import { InvitationModel } from './models/invitation.model';
import { UserModel } from './models/user.model';

const VALID_SECONDS = 7 * 24 * 3600;

interface InvitationRow {
  id: string;
  email: string;
  roles: string;
  invited_by: string;
  created_at: string;
  expires_at: string;
}

/** Sending people a way in, and taking it back. */
@Injectable()
export class Invitations {
  constructor(
    private readonly readers: Readers,
    private readonly writer: Writer,
    private readonly outbox: Outbox,
    private readonly audit: AuditTrail,
    private readonly secrets: Secrets,
    private readonly clock: Clock,
  ) {}

  async listOpen(): Promise<InvitationDetails[]> {
    const rows = await this.readers.select<InvitationRow>(
      `SELECT invitations.id, invitations.email, invitations.roles, users.name AS invited_by, invitations.created_at,
          invitations.expires_at
        FROM invitations JOIN users ON users.id = invitations.invited_by
        WHERE accepted_at IS NULL AND withdrawn_at IS NULL ORDER BY invitations.created_at DESC, invitations.id`,
    );
    const now = this.clock.timestamp();
    return rows.map((row) => ({
      id: row.id,
      email: row.email,
      roles: readRoles(row.roles),
      invitedBy: row.invited_by,
      createdAt: row.created_at,
      expiresAt: row.expires_at,
      state: row.expires_at > now ? 'open' : 'expired',
    }));
  }

  /**
   * Invites an address; an earlier invitation that is still open is withdrawn, so inviting again sends a new letter.
   *
   * @throws ConflictProblem when the address has an account
   */
  async invite(actor: Person, typedEmail: string, roles: readonly Role[]): Promise<string> {
    const email = normalisedEmail(typedEmail);
    const id = randomUUID();
    await this.writer.transaction(async (transaction) => {
      if (await UserModel.findOne({ where: { email }, transaction })) {
        throw new ConflictProblem(`${email} has an account already.`, [
          { pointer: '/email', message: 'has an account already' },
        ]);
      }
      const now = this.clock.timestamp();
      await InvitationModel.update(
        { withdrawnAt: now },
        { where: { email, acceptedAt: null, withdrawnAt: null }, transaction },
      );
      await InvitationModel.create(
        {
          id,
          email,
          roles: JSON.stringify(roles),
          tokenHash: tokenHash(this.secrets.mailedToken('invitation', id)),
          invitedBy: actor.id,
          createdAt: now,
          expiresAt: this.clock.timestampIn(VALID_SECONDS),
        },
        { transaction },
      );
      await this.outbox.add(transaction, INVITED, { invitationId: id });
      await this.audit.record(transaction, {
        actor,
        action: 'invite',
        subjectType: 'Invitation',
        subjectId: id,
        after: { email, roles },
      });
    });
    return id;
  }

  /** @throws NotFoundProblem when there is no open invitation of that id */
  async withdraw(actor: Person, id: string): Promise<void> {
    await this.writer.transaction(async (transaction) => {
      const [withdrawn] = await InvitationModel.update(
        { withdrawnAt: this.clock.timestamp() },
        { where: { id, acceptedAt: null, withdrawnAt: null }, transaction },
      );
      if (withdrawn !== 1) throw new NotFoundProblem('There is no such open invitation.');
      await this.audit.record(transaction, {
        actor,
        action: 'withdraw',
        subjectType: 'Invitation',
        subjectId: id,
      });
    });
  }
}
