import request, { type Response } from 'supertest';
import { Readers } from '../src/database/readers';
import { startApplication, type StartedApplication } from './support/application';
import { lettersTo, tokenIn } from './support/mail';
import { PASSWORD, type SignedInPerson, type TestPerson } from './support/people-builder';
import type { ProblemBody } from './support/problem-body';

const HOUR = 3600;
const NEW_PASSWORD = 'tide-table-1907';

describe('resetting a password', () => {
  let application: StartedApplication;
  let administrator: SignedInPerson;
  let person: TestPerson;
  beforeAll(async () => {
    application = await startApplication();
    administrator = await application.people.signIn('administrator');
  });
  afterAll(() => application.stop());
  beforeEach(async () => {
    person = await application.people.add('designer');
  });

  const ask = async (email: string): Promise<Response> => {
    const answer = await request(application.server).post('/api/auth/password-resets').send({ email });
    await application.delivered();
    return answer;
  };
  const redeem = (token: string, password: string = NEW_PASSWORD): Promise<Response> =>
    Promise.resolve(
      request(application.server).post('/api/auth/password-resets/redeem').send({ token, password }),
    );
  const signIn = async (password: string): Promise<number> =>
    (await request(application.server).post('/api/auth/sign-in').send({ email: person.email, password }))
      .status;

  it('sends a link, takes a new password once, and ends every session', async () => {
    const session = await application.people.signInAs(person);
    expect((await ask(person.email)).status).toBe(202);
    const [letter] = await lettersTo(administrator, person.email);
    expect(letter?.links[0]).toMatch(/^http:\/\/localhost:0\/reset-password#token=[\w-]{43}$/);
    expect((await redeem(tokenIn(letter))).status).toBe(204);
    await session.get('/api/auth/me').expect(401);
    expect([await signIn(PASSWORD), await signIn(NEW_PASSWORD)]).toEqual([401, 200]);
    const again = await redeem(tokenIn(letter));
    expect(again.status).toBe(422);
    expect((again.body as ProblemBody).errors?.[0]?.pointer).toBe('/token');
  });

  it('answers the same whether or not the address has an account', async () => {
    const known = await ask(person.email);
    const unknown = await ask('nobody@brackwater.example.com');
    expect([unknown.status, unknown.body]).toEqual([known.status, known.body]);
    expect(await lettersTo(administrator, 'nobody@brackwater.example.com')).toEqual([]);
  });

  it('sends nothing to a deactivated account', async () => {
    await administrator
      .post(`/api/users/${person.id}/deactivate`, { reason: 'has left', version: 1 })
      .expect(200);
    expect((await ask(person.email)).status).toBe(202);
    expect(await lettersTo(administrator, person.email)).toEqual([]);
  });

  it('keeps the token in neither database nor outbox', async () => {
    await ask(person.email);
    const [letter] = await lettersTo(administrator, person.email);
    const readers = application.nest.get(Readers);
    const kept = [
      await readers.select('SELECT * FROM password_resets'),
      await readers.select('SELECT * FROM outbox_messages'),
    ];
    expect(tokenIn(letter)).toHaveLength(43);
    expect(JSON.stringify(kept)).not.toContain(tokenIn(letter));
  });

  it('takes a token for an hour', async () => {
    await ask(person.email);
    const [letter] = await lettersTo(administrator, person.email);
    application.clock.forward(HOUR + 1);
    expect((await redeem(tokenIn(letter))).status).toBe(422);
    expect(await signIn(PASSWORD)).toBe(200);
  });

  it('makes the other links of the person worthless when one is used', async () => {
    await ask(person.email);
    await ask(person.email);
    const letters = await lettersTo(administrator, person.email);
    expect(letters).toHaveLength(2);
    expect((await redeem(tokenIn(letters[0]))).status).toBe(204);
    expect((await redeem(tokenIn(letters[1]))).status).toBe(422);
  });

  it('lets in an account that too many failures had locked', async () => {
    for (let made = 0; made < 5; made += 1) expect(await signIn('wrong')).toBe(401);
    expect(await signIn(PASSWORD)).toBe(429);
    await ask(person.email);
    const [letter] = await lettersTo(administrator, person.email);
    expect((await redeem(tokenIn(letter))).status).toBe(204);
    expect(await signIn(NEW_PASSWORD)).toBe(200);
  });

  it('refuses a password that will not do, and leaves the link good', async () => {
    await ask(person.email);
    const [letter] = await lettersTo(administrator, person.email);
    for (const password of ['short', person.email, 'x'.repeat(73)]) {
      const answer = await redeem(tokenIn(letter), password);
      expect(answer.status).toBe(400);
      expect((answer.body as ProblemBody).errors?.[0]?.pointer).toBe('/password');
    }
    expect((await redeem(tokenIn(letter))).status).toBe(204);
  });

  it('sends three letters an hour at most, and says nothing of it', async () => {
    for (let made = 0; made < 5; made += 1) expect((await ask(person.email)).status).toBe(202);
    expect(await lettersTo(administrator, person.email)).toHaveLength(3);
  });

  it('slows down a network address that asks without end', async () => {
    application.clock.forward(HOUR);
    const statuses: number[] = [];
    for (let made = 0; made < 31; made += 1) {
      const email = `guess-${made}@brackwater.example.com`;
      statuses.push(
        (await request(application.server).post('/api/auth/password-resets').send({ email })).status,
      );
    }
    expect(statuses.slice(0, 30).every((status) => status === 202)).toBe(true);
    expect(statuses[30]).toBe(429);
  });

  it('refuses tokens that were never sent', async () => {
    expect((await redeem('A'.repeat(43))).status).toBe(422);
  });
});
