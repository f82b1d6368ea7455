import request, { type Response } from 'supertest';
import { startApplication, type StartedApplication } from './support/application';
import { PASSWORD, type TestPerson } from './support/people-builder';
import type { ProblemBody } from './support/problem-body';

interface SignedInBody {
  accessToken: string;
  user: { id: number; email: string; name: string; roles: string[] };
  rules: unknown[];
}

const MINUTE = 60;

describe('signing in', () => {
  let application: StartedApplication;
  beforeAll(async () => {
    application = await startApplication();
  });
  afterAll(() => application.stop());

  const signIn = (email: string, password: string): Promise<Response> =>
    Promise.resolve(request(application.server).post('/api/auth/sign-in').send({ email, password }));
  const fail = async (person: TestPerson, times: number): Promise<number[]> => {
    const statuses: number[] = [];
    for (let made = 0; made < times; made += 1) statuses.push((await signIn(person.email, 'wrong')).status);
    return statuses;
  };

  it('answers with an access token, the person and the rules, and sets the refresh cookie', async () => {
    const person = await application.people.add('designer', 'librarian');
    const answer = await signIn(person.email.toUpperCase(), PASSWORD);
    expect(answer.status).toBe(200);
    const { accessToken, user, rules } = answer.body as SignedInBody;
    expect(user).toEqual({ ...person, roles: ['librarian', 'designer'] });
    const me = await request(application.server)
      .get('/api/auth/me')
      .set('Authorization', `Bearer ${accessToken}`)
      .expect(200);
    expect(me.body).toEqual({ user, rules });
    expect(answer.get('Set-Cookie')?.[0]).toMatch(
      /^resistry_refresh=[\w-]{43}; Max-Age=604800; Path=\/api\/auth; .*HttpOnly; SameSite=Strict$/,
    );
  });

  it('says the same of a wrong password, an unknown address and a deactivated account', async () => {
    const administrator = await application.people.signIn('administrator');
    const person = await application.people.add('designer');
    const gone = await application.people.add('designer');
    await administrator
      .post(`/api/users/${gone.id}/deactivate`, { reason: 'has left', version: 1 })
      .expect(200);
    const answers = [
      await signIn(person.email, 'not the password'),
      await signIn('nobody@brackwater.example.com', PASSWORD),
      await signIn(gone.email, PASSWORD),
    ];
    const bodies = answers.map((answer) => ({ ...(answer.body as ProblemBody), instance: '' }));
    expect(bodies[0]).toMatchObject({ status: 401, type: 'urn:resistry:problem:unauthenticated' });
    expect(bodies).toEqual([bodies[0], bodies[0], bodies[0]]);
    expect(answers.map((answer) => answer.get('Set-Cookie'))).toEqual([undefined, undefined, undefined]);
  });

  it.each([
    [{ email: 'x@example.com' }, '/password'],
    [{ email: 'x', password: 'y' }, '/email'],
    [{ email: 'x@example.com', password: ['y'] }, '/password'],
    [{ email: { $ne: '' }, password: 'y' }, '/email'],
    [{ email: 'x@example.com', password: 'y', admin: true }, '/admin'],
  ])('refuses %j', async (body, pointer) => {
    const answer = await request(application.server).post('/api/auth/sign-in').send(body).expect(400);
    expect((answer.body as ProblemBody).errors?.map((error) => error.pointer)).toContain(pointer);
  });

  it('rests an account after five failures, says for how long, and lets it in again after that', async () => {
    const person = await application.people.add('designer');
    expect(await fail(person, 6)).toEqual([401, 401, 401, 401, 401, 429]);
    const locked = await signIn(person.email, PASSWORD);
    expect(locked.status).toBe(429);
    const problem = locked.body as ProblemBody;
    expect(problem.detail).toContain('Try again in 15 minutes, or reset your password.');
    expect(Number(locked.get('Retry-After'))).toBeGreaterThan(14 * MINUTE);
    expect(problem.retryAfter).toBe(Number(locked.get('Retry-After')));
    application.clock.forward(15 * MINUTE);
    expect((await signIn(person.email, PASSWORD)).status).toBe(200);
  });

  it('rests an address that has no account just the same', async () => {
    const nobody = { id: 0, name: '', email: 'never-there@brackwater.example.com' };
    expect(await fail(nobody, 6)).toEqual([401, 401, 401, 401, 401, 429]);
  });

  it('counts failed attempts only, and starts anew after a success', async () => {
    const person = await application.people.add('designer');
    for (let made = 0; made < 8; made += 1) expect((await signIn(person.email, PASSWORD)).status).toBe(200);
    expect(await fail(person, 4)).toEqual([401, 401, 401, 401]);
    expect((await signIn(person.email, PASSWORD)).status).toBe(200);
    expect(await fail(person, 5)).toEqual([401, 401, 401, 401, 401]);
    application.clock.forward(15 * MINUTE);
  });

  it('answers no more guesses than may fail when they all come at once', async () => {
    const person = await application.people.add('designer');
    const guesses = Array.from({ length: 20 }, (_, index) => (index === 19 ? PASSWORD : `guess ${index}`));
    const statuses = (await Promise.all(guesses.map((guess) => signIn(person.email, guess)))).map(
      ({ status }) => status,
    );
    expect(statuses.filter((status) => status === 401).length).toBeLessThanOrEqual(5);
    expect(statuses.filter((status) => status !== 401 && status !== 429 && status !== 200)).toEqual([]);
    application.clock.forward(15 * MINUTE);
  });

  it('rests a network address after fifty failures over many accounts', async () => {
    const bystander = await application.people.add('designer');
    for (let made = 0; made < 50; made += 1) {
      expect((await signIn(`guess-${made}@brackwater.example.com`, 'wrong')).status).toBe(401);
    }
    const answer = await signIn(bystander.email, PASSWORD);
    expect(answer.status).toBe(429);
    expect((answer.body as ProblemBody).detail).toContain('from your network');
    application.clock.forward(15 * MINUTE);
    expect((await signIn(bystander.email, PASSWORD)).status).toBe(200);
  });

  it('does not believe a client about its address', async () => {
    const statuses: number[] = [];
    for (let made = 0; made < 51; made += 1) {
      const answer = await request(application.server)
        .post('/api/auth/sign-in')
        .set('X-Forwarded-For', `10.0.0.${made}`)
        .send({ email: `elsewhere-${made}@brackwater.example.com`, password: 'wrong' });
      statuses.push(answer.status);
    }
    expect(statuses.at(-1)).toBe(429);
  });
});
