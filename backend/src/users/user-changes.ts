import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import { AuditTrail } from '../audit/audit-trail';
import { Sessions } from '../auth/sessions';
import { Clock } from '../common/clock';
import { ClashProblem, NotFoundProblem, StaleEditProblem } from '../common/problems/problems';
import { Writer } from '../database/writer';
import type { Action } from '../permissions/actions-and-subjects';
import type { Person } from '../permissions/person';
import { type Role, ROLES } from '../permissions/roles';
import { UserRoleModel } from './models/user-role.model';
import { UserModel } from './models/user.model';
import { UserAccounts } from './user-accounts';

/** The one door through which an account's roles and state change. */
@Injectable()
export class UserChanges {
  constructor(
    private readonly writer: Writer,
    private readonly accounts: UserAccounts,
    private readonly sessions: Sessions,
    private readonly audit: AuditTrail,
    private readonly clock: Clock,
  ) {}

  /** @throws ClashProblem when no administrator would be left */
  async changeRoles(
    actor: Person,
    id: number,
    { roles, version, reason }: { roles: readonly Role[]; version: number; reason: string },
  ): Promise<void> {
    await this.change(actor, 'change-roles', id, version, async (transaction, user) => {
      const before = await rolesOf(transaction, user.id);
      await this.accounts.setRoles(transaction, user.id, roles);
      const after = await rolesOf(transaction, user.id);
      return { before: { roles: before }, after: { roles: after }, reason };
    });
  }

  /** Ends the person's sessions too. @throws ClashProblem when no administrator would be left */
  async deactivate(actor: Person, id: number, version: number, reason: string): Promise<void> {
    await this.change(actor, 'deactivate', id, version, async (transaction, user) => {
      if (user.state === 'deactivated') throw new ClashProblem('The account is deactivated already.');
      await user.update({ state: 'deactivated' }, { transaction });
      await this.sessions.end(transaction, { userId: user.id }, 'deactivated');
      return { before: { state: 'active' }, after: { state: 'deactivated' }, reason };
    });
  }

  async reactivate(actor: Person, id: number, version: number, reason: string): Promise<void> {
    await this.change(actor, 'reactivate', id, version, async (transaction, user) => {
      if (user.state === 'active') throw new ClashProblem('The account is active already.');
      await user.update({ state: 'active' }, { transaction });
      return { before: { state: 'deactivated' }, after: { state: 'active' }, reason };
    });
  }

  private async change(
    actor: Person,
    action: Action,
    id: number,
    version: number,
    apply: (
      transaction: Transaction,
      user: UserModel,
    ) => Promise<{ before: object; after: object; reason?: string }>,
  ): Promise<void> {
    await this.writer.transaction(async (transaction) => {
      const user = await UserModel.findByPk(id, { transaction });
      if (!user) throw new NotFoundProblem('There is no such account.');
      actor.demand(action, 'User', { id });
      if (user.version !== version) throw new StaleEditProblem(`The account of ${user.name}`);
      const outcome = await apply(transaction, user);
      await user.update({ version: version + 1, updatedAt: this.clock.timestamp() }, { transaction });
      await refuseWithoutAdministrator(transaction, this.writer);
      await this.audit.record(transaction, { actor, action, subjectType: 'User', subjectId: id, ...outcome });
    });
  }
}

async function rolesOf(transaction: Transaction, userId: number): Promise<Role[]> {
  const held = (await UserRoleModel.findAll({ where: { userId }, transaction })).map(({ role }) => role);
  return ROLES.filter((role) => held.includes(role));
}

async function refuseWithoutAdministrator(transaction: Transaction, writer: Writer): Promise<void> {
  const left = await writer.select(
    transaction,
    `SELECT 1 FROM user_roles JOIN users ON users.id = user_roles.user_id
      WHERE role = 'administrator' AND state = 'active' LIMIT 1`,
  );
  if (left.length === 0)
    throw new ClashProblem('This would leave nobody who can administer: name another one first.');
}
