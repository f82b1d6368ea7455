import request from 'supertest';
import { Readers } from '../src/database/readers';
import { Housekeeping } from '../src/housekeeping/housekeeping.service';
import { startApplication, type StartedApplication } from './support/application';

const DAY = 24 * 3600;

describe('the nightly housekeeping', () => {
  let application: StartedApplication;
  beforeAll(async () => {
    application = await startApplication();
  });
  afterAll(() => application.stop());

  const counts = async (): Promise<Record<string, number>> => {
    const row = await application.nest.get(Readers).lookUp<Record<string, number>>(
      `SELECT (SELECT count(*) FROM failed_sign_ins) AS failures, (SELECT count(*) FROM sessions) AS sessions,
        (SELECT count(*) FROM refresh_tokens) AS tokens, (SELECT count(*) FROM password_resets) AS resets,
        (SELECT count(*) FROM password_reset_requests) AS requests, (SELECT count(*) FROM outbox_messages) AS messages`,
    );
    return row ?? {};
  };
  const run = (): Promise<void> => application.nest.get(Housekeeping, { strict: false }).run();

  it('lets go what has had its time, and nothing earlier', async () => {
    const person = await application.people.signIn('designer');
    const { email } = person.person;
    await request(application.server)
      .post('/api/auth/sign-in')
      .send({ email, password: 'wrong' })
      .expect(401);
    await request(application.server).post('/api/auth/password-resets').send({ email }).expect(202);
    await application.delivered();
    const all = { failures: 1, sessions: 1, tokens: 1, resets: 1, requests: 1, messages: 1 };
    await run();
    expect(await counts()).toEqual(all);
    application.clock.forward(DAY + 60);
    await run();
    expect(await counts()).toEqual({ ...all, failures: 0, requests: 0 });
    await person.get('/api/auth/me').expect(200);
    application.clock.forward(30 * DAY);
    await run();
    // The session ran out after 30 days: it stays another 30, so that a stolen token would still be noticed.
    expect(await counts()).toEqual({
      failures: 0,
      requests: 0,
      resets: 0,
      messages: 0,
      sessions: 1,
      tokens: 1,
    });
    application.clock.forward(30 * DAY);
    await run();
    expect(await counts()).toEqual({
      failures: 0,
      requests: 0,
      resets: 0,
      messages: 0,
      sessions: 0,
      tokens: 0,
    });
  });
});
