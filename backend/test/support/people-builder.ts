import type { Server } from 'node:net';
import type { NestExpressApplication } from '@nestjs/platform-express';
import request from 'supertest';
import { PasswordHasher } from '../../src/auth/password-hasher';
import { Writer } from '../../src/database/writer';
import type { Role } from '../../src/permissions/roles';
import { UserAccounts } from '../../src/users/user-accounts';

export const PASSWORD = 'river-gauge-42';

export interface TestPerson {
  id: number;
  email: string;
  name: string;
}

/** Somebody signed in, who sends requests with the access token. */
export class SignedInPerson {
  constructor(
    private readonly server: Server,
    readonly person: TestPerson,
    readonly accessToken: string,
    /** The `name=value` of the refresh cookie. */
    readonly cookie: string,
  ) {}

  get(path: string): request.Test {
    return request(this.server).get(path).set('Authorization', `Bearer ${this.accessToken}`);
  }

  post(path: string, body?: object): request.Test {
    return request(this.server).post(path).set('Authorization', `Bearer ${this.accessToken}`).send(body);
  }

  patch(path: string, body?: object): request.Test {
    return request(this.server).patch(path).set('Authorization', `Bearer ${this.accessToken}`).send(body);
  }

  put(path: string, body?: object): request.Test {
    return request(this.server).put(path).set('Authorization', `Bearer ${this.accessToken}`).send(body);
  }

  delete(path: string): request.Test {
    return request(this.server).delete(path).set('Authorization', `Bearer ${this.accessToken}`);
  }
}

/** Makes accounts and signs them in. */
export class PeopleBuilder {
  private made = 0;

  constructor(
    private readonly server: Server,
    private readonly application: NestExpressApplication,
  ) {}

  /** A new account with these roles, its password `PASSWORD`. */
  async add(...roles: Role[]): Promise<TestPerson> {
    this.made += 1;
    const email = `person-${this.made}@brackwater.example.com`;
    const name = `Person ${this.made}`;
    const passwordHash = await this.application.get(PasswordHasher, { strict: false }).hash(PASSWORD);
    const accounts = this.application.get(UserAccounts, { strict: false });
    const id = await this.application
      .get(Writer)
      .transaction((transaction) => accounts.create(transaction, { email, name, roles, passwordHash }));
    return { id, email, name };
  }

  /** Signs an account in through the front door. */
  async signInAs(person: TestPerson, password: string = PASSWORD): Promise<SignedInPerson> {
    const answer = await request(this.server)
      .post('/api/auth/sign-in')
      .send({ email: person.email, password })
      .expect(200);
    const body = answer.body as { accessToken: string };
    const [cookie = ''] = (answer.get('Set-Cookie') ?? []).map((text) => text.split(';')[0] ?? '');
    return new SignedInPerson(this.server, person, body.accessToken, cookie);
  }

  /** A new account with these roles, signed in. */
  async signIn(...roles: Role[]): Promise<SignedInPerson> {
    return this.signInAs(await this.add(...roles));
  }
}
