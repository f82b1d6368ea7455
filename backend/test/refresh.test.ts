import request, { type Response } from 'supertest';
import { Readers } from '../src/database/readers';
import { startApplication, type StartedApplication } from './support/application';
import type { SignedInPerson } from './support/people-builder';
import type { ProblemBody } from './support/problem-body';

const DAY = 24 * 3600;

const cookieOf = (answer: Response): string => answer.get('Set-Cookie')?.[0]?.split(';')[0] ?? '';
const tokenOf = (answer: Response): string => (answer.body as { accessToken: string }).accessToken;

describe('refreshing a sign-in', () => {
  let application: StartedApplication;
  let person: SignedInPerson;
  beforeAll(async () => {
    application = await startApplication();
  });
  afterAll(() => application.stop());
  beforeEach(async () => {
    person = await application.people.signIn('designer');
  });

  const refresh = (cookie: string, headers: Record<string, string> = {}): Promise<Response> =>
    Promise.resolve(request(application.server).post('/api/auth/refresh').set('Cookie', cookie).set(headers));
  const me = async (token: string): Promise<number> =>
    (await request(application.server).get('/api/auth/me').set('Authorization', `Bearer ${token}`)).status;

  it('gives a new access token, the person, the rules and the next cookie', async () => {
    const answer = await refresh(person.cookie);
    expect(answer.status).toBe(200);
    expect(answer.body).toMatchObject({ user: person.person, rules: expect.any(Array) as unknown });
    expect(cookieOf(answer)).toMatch(/^resistry_refresh=[\w-]{43}$/);
    expect(cookieOf(answer)).not.toBe(person.cookie);
    expect(await me(tokenOf(answer))).toBe(200);
  });

  it('lets two tabs refresh at once', async () => {
    const [one, other] = await Promise.all([refresh(person.cookie), refresh(person.cookie)]);
    expect([one.status, other.status]).toEqual([200, 200]);
    expect((await refresh(cookieOf(one))).status).toBe(200);
    expect((await refresh(cookieOf(other))).status).toBe(200);
  });

  it('ends the whole session when a token comes again after it was replaced, and writes that down', async () => {
    const next = await refresh(person.cookie);
    application.clock.forward(21);
    expect((await refresh(person.cookie)).status).toBe(401);
    expect((await refresh(cookieOf(next))).status).toBe(401);
    expect(await me(tokenOf(next))).toBe(401);
    const entries = await application.nest
      .get(Readers)
      .select(`SELECT action FROM audit_entries WHERE subject_type = 'User' AND subject_id = $id`, {
        id: String(person.person.id),
      });
    expect(entries).toEqual([{ action: 'end-session' }]);
  });

  it('keeps no refresh token in the clear', async () => {
    const token = person.cookie.replace('resistry_refresh=', '');
    const rows = await application.nest.get(Readers).select('SELECT * FROM refresh_tokens');
    expect(rows.length).toBeGreaterThan(0);
    expect(JSON.stringify(rows)).not.toContain(token);
  });

  it('ends after a week without use, and after thirty days in any case', async () => {
    application.clock.forward(7 * DAY + 1);
    expect((await refresh(person.cookie)).status).toBe(401);
    let busy = (await application.people.signInAs(person.person)).cookie;
    for (let week = 0; week < 4; week += 1) {
      application.clock.forward(7 * DAY - 60);
      const answer = await refresh(busy);
      expect(answer.status).toBe(200);
      busy = cookieOf(answer);
    }
    application.clock.forward(3 * DAY);
    expect((await refresh(busy)).status).toBe(401);
  });

  it.each([
    ['no cookie', ''],
    ['another one', 'resistry_refresh=AAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAA'],
    ['a broken one', 'resistry_refresh=j%3A%7B%22a%22%3A1%7D'],
  ])('refuses %s', async (_what, cookie) => {
    const answer = await refresh(cookie);
    expect(answer.status).toBe(401);
    expect((answer.body as ProblemBody).type).toBe('urn:resistry:problem:unauthenticated');
  });

  it("refuses another site's page, and takes one of its own", async () => {
    expect((await refresh(person.cookie, { Origin: 'https://elsewhere.example.com' })).status).toBe(403);
    expect((await refresh(person.cookie, { Origin: 'null' })).status).toBe(403);
    expect((await refresh(person.cookie, { 'Sec-Fetch-Site': 'cross-site' })).status).toBe(403);
    expect((await refresh(person.cookie, { 'Sec-Fetch-Site': 'same-site' })).status).toBe(403);
    const own = await refresh(person.cookie, { Origin: application.url, 'Sec-Fetch-Site': 'same-origin' });
    expect(own.status).toBe(200);
  });

  it('signs out: cookie and access token end with the session, others stay', async () => {
    const elsewhere = await application.people.signInAs(person.person);
    const answer = await request(application.server)
      .post('/api/auth/sign-out')
      .set('Cookie', person.cookie)
      .expect(204);
    expect(cookieOf(answer)).toBe('resistry_refresh=');
    expect(await me(person.accessToken)).toBe(401);
    expect((await refresh(person.cookie)).status).toBe(401);
    expect(await me(elsewhere.accessToken)).toBe(200);
  });

  it('signs out without a cookie, as nothing is left to end', async () => {
    await request(application.server).post('/api/auth/sign-out').expect(204);
  });

  it('signs out everywhere, access tokens included', async () => {
    const elsewhere = await application.people.signInAs(person.person);
    const other = await application.people.signIn('designer');
    await person.post('/api/auth/sign-out-everywhere').expect(204);
    expect(await me(person.accessToken)).toBe(401);
    expect(await me(elsewhere.accessToken)).toBe(401);
    expect((await refresh(elsewhere.cookie)).status).toBe(401);
    expect(await me(other.accessToken)).toBe(200);
  });
});
