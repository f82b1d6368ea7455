import { Injectable } from '@nestjs/common';
import { compare, hash } from 'bcrypt';
import { ApplicationOptions } from '../config/application-options';

/** Turns passwords into what may be stored, and compares. */
@Injectable()
export class PasswordHasher {
  private readonly cost: number;
  /** Compared against where there is no account, so that the answer takes as long as where there is one. */
  private readonly nobodysHash: Promise<string>;

  constructor(options: ApplicationOptions) {
    this.cost = options.passwordHashCost;
    this.nobodysHash = hash('nobody has this password', this.cost);
  }

  async hash(password: string): Promise<string> {
    return hash(password, this.cost);
  }

  /** @param storedHash undefined where there is no such account: never matches, but takes its time */
  async matches(password: string, storedHash: string | undefined): Promise<boolean> {
    const same = await compare(password, storedHash ?? (await this.nobodysHash));
    return same && storedHash !== undefined;
  }
}
