import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import { PasswordHasher } from '../auth/password-hasher';
import { passwordFaults } from '../auth/password-policy';
import { Clock } from '../common/clock';
import { ConflictProblem, MalformedProblem } from '../common/problems/problems';
import type { Role } from '../permissions/roles';
import { normalisedEmail } from './email-address';
import { UserRoleModel } from './models/user-role.model';
import { UserModel } from './models/user.model';

export interface NewUser {
  email: string;
  name: string;
  roles: readonly Role[];
  passwordHash: string;
}

/** Making accounts and giving them passwords. Who may do so is the caller's question. */
@Injectable()
export class UserAccounts {
  constructor(
    private readonly hasher: PasswordHasher,
    private readonly clock: Clock,
  ) {}

  /**
   * The hash of a password somebody chose. Slow on purpose: call it before the transaction, not inside.
   *
   * @param pointer JSON pointer of the field that holds the password
   * @throws MalformedProblem saying what is wrong with the password
   */
  async hashChosenPassword(password: string, pointer: string, personal: readonly string[]): Promise<string> {
    const faults = passwordFaults(password, personal);
    if (faults.length > 0) throw new MalformedProblem(faults.map((message) => ({ pointer, message })));
    return this.hasher.hash(password);
  }

  /**
   * @returns the id of the new account
   * @throws ConflictProblem when the address has an account already
   */
  async create(transaction: Transaction, user: NewUser): Promise<number> {
    const email = normalisedEmail(user.email);
    if (await UserModel.findOne({ where: { email }, transaction })) {
      throw new ConflictProblem(`${email} has an account already.`, [
        { pointer: '/email', message: 'has an account already' },
      ]);
    }
    const now = this.clock.timestamp();
    const { id } = await UserModel.create(
      {
        email,
        name: user.name.trim(),
        passwordHash: user.passwordHash,
        state: 'active',
        version: 1,
        createdAt: now,
        updatedAt: now,
      },
      { transaction },
    );
    await this.setRoles(transaction, id, user.roles);
    return id;
  }

  async setRoles(transaction: Transaction, userId: number, roles: readonly Role[]): Promise<void> {
    await UserRoleModel.destroy({ where: { userId }, transaction });
    await UserRoleModel.bulkCreate(
      [...new Set(roles)].map((role) => ({ userId, role })),
      { transaction },
    );
  }

  async setPasswordHash(transaction: Transaction, userId: number, passwordHash: string): Promise<void> {
    await UserModel.update(
      { passwordHash, updatedAt: this.clock.timestamp() },
      { where: { id: userId }, transaction },
    );
  }
}
