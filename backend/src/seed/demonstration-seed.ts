import { randomBytes } from 'node:crypto';
import { join } from 'node:path';
import { Injectable, Logger, type OnModuleInit } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import { Clock } from '../common/clock';
import { Environment, REPOSITORY_ROOT } from '../config/environment';
import { Writer } from '../database/writer';
import { UserAccounts } from '../users/user-accounts';
import { loadSeedData } from './load-seed-data';
import { momentOf } from './moments';
import type { SeedPeople, SeedPerson } from './reading/read-people';
import { Roster } from './roster';
import { readSeedData } from './seed-data';

/** A person with the hash of the password, which takes too long to make inside a transaction. */
interface HashedPerson {
  readonly person: SeedPerson;
  readonly passwordHash: string;
}

/**
 * With SEED=demo an empty database gets the demonstration, all of it in one transaction: a load that is cut off leaves
 * the database empty, and the next start loads again.
 */
@Injectable()
export class DemonstrationSeed implements OnModuleInit {
  private readonly logger = new Logger('Seed');

  constructor(
    private readonly environment: Environment,
    private readonly writer: Writer,
    private readonly accounts: UserAccounts,
    private readonly clock: Clock,
  ) {}

  async onModuleInit(): Promise<void> {
    if (this.environment.seed !== 'demo') return;
    if (!(await this.writer.transaction((transaction) => this.isEmpty(transaction)))) return;
    const started = performance.now();
    this.logger.log('seeding: reading seed-data');
    const data = readSeedData(join(REPOSITORY_ROOT, 'seed-data'));
    const people = await this.withHashes(data.people);
    await this.writer.transaction(async (transaction) => {
      if (!(await this.isEmpty(transaction))) return;
      this.logger.log('seeding: people');
      const roster = new Roster(await this.createAccounts(transaction, people, data.people.domain));
      await loadSeedData(data, transaction, {
        writer: this.writer,
        roster,
        today: this.clock.timestamp().slice(0, 10),
        progress: (stage) => this.logger.log(`seeding: ${stage}`),
      });
    });
    this.logger.log(`seeding: done in ${((performance.now() - started) / 1000).toFixed(1)} s`);
  }

  private async isEmpty(transaction: Transaction): Promise<boolean> {
    const [row] = await this.writer.select<{ filled: number }>(
      transaction,
      'SELECT EXISTS (SELECT 1 FROM users) OR EXISTS (SELECT 1 FROM manufacturers) AS filled',
    );
    return row?.filled === 0;
  }

  private async withHashes({ people, knownPassword }: SeedPeople): Promise<HashedPerson[]> {
    return Promise.all(
      people.map(async (person) => {
        const password = person.signsIn ? knownPassword : randomBytes(24).toString('base64url');
        const passwordHash = await this.accounts.hashChosenPassword(password, '/knownPassword', []);
        return { person, passwordHash };
      }),
    );
  }

  private async createAccounts(
    transaction: Transaction,
    people: readonly HashedPerson[],
    domain: string,
  ): Promise<{ person: SeedPerson; id: number }[]> {
    const created: { person: SeedPerson; id: number }[] = [];
    for (const { person, passwordHash } of people) {
      const { name, roles, joined, left } = person;
      const email = `${person.address}@${domain}`;
      const id = await this.accounts.create(transaction, { email, name, roles, passwordHash });
      await this.writer.run(
        transaction,
        `UPDATE users SET created_at = $joined, updated_at = $changed, state = $state WHERE id = $id`,
        {
          id,
          joined: momentOf(joined, 8),
          changed: momentOf(left ?? joined, 8),
          state: left === null ? 'active' : 'deactivated',
        },
      );
      created.push({ person, id });
    }
    return created;
  }
}
