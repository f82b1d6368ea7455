import request from 'supertest';
import { startApplication, type StartedApplication } from './support/application';
import { PASSWORD, type SignedInPerson } from './support/people-builder';
import type { ProblemBody } from './support/problem-body';

interface SessionsBody {
  items: { id: string; current: boolean; userAgent: string; address: string }[];
}

const NEW_PASSWORD = 'spring-tide-2026';

describe('the own account', () => {
  let application: StartedApplication;
  let person: SignedInPerson;
  beforeAll(async () => {
    application = await startApplication();
  });
  afterAll(() => application.stop());
  beforeEach(async () => {
    person = await application.people.signIn('designer');
  });

  it('changes its name', async () => {
    await person.put('/api/account/name', { name: ' Kim Shoal ' }).expect(204);
    expect((await person.get('/api/auth/me')).body).toMatchObject({ user: { name: 'Kim Shoal' } });
    for (const name of ['', '   ', 'a\nb', 7, 'x'.repeat(101)])
      await person.put('/api/account/name', { name }).expect(400);
  });

  it('changes its password with the current one, and ends the other sessions', async () => {
    const elsewhere = await application.people.signInAs(person.person);
    await person
      .post('/api/account/password', { currentPassword: PASSWORD, newPassword: NEW_PASSWORD })
      .expect(204);
    await person.get('/api/auth/me').expect(200);
    await elsewhere.get('/api/auth/me').expect(401);
    await application.people.signInAs(person.person, NEW_PASSWORD);
  });

  it('refuses without the current password, and a new one that will not do', async () => {
    const wrong = await person
      .post('/api/account/password', { currentPassword: 'guess', newPassword: NEW_PASSWORD })
      .expect(422);
    expect((wrong.body as ProblemBody).errors).toEqual([
      { pointer: '/currentPassword', message: 'is not right' },
    ]);
    const weak = await person
      .post('/api/account/password', { currentPassword: PASSWORD, newPassword: 'aaaaaaaaaaaa' })
      .expect(400);
    expect((weak.body as ProblemBody).errors?.[0]?.pointer).toBe('/newPassword');
    await application.people.signInAs(person.person);
  });

  it('counts guesses of the current password like failed sign-ins', async () => {
    const guess = { currentPassword: 'guess', newPassword: NEW_PASSWORD };
    for (let made = 0; made < 5; made += 1) await person.post('/api/account/password', guess).expect(422);
    await person.post('/api/account/password', guess).expect(429);
    const { email } = person.person;
    await request(application.server)
      .post('/api/auth/sign-in')
      .send({ email, password: PASSWORD })
      .expect(429);
  });

  it('lists its sessions and ends one of them', async () => {
    const elsewhere = await application.people.signInAs(person.person);
    const { items } = (await person.get('/api/account/sessions').expect(200)).body as SessionsBody;
    expect(items.map(({ current }) => current).sort()).toEqual([false, true]);
    const other = items.find(({ current }) => !current);
    await person.delete(`/api/account/sessions/${other?.id}`).expect(204);
    await elsewhere.get('/api/auth/me').expect(401);
    await person.delete(`/api/account/sessions/${other?.id}`).expect(404);
    expect(((await person.get('/api/account/sessions')).body as SessionsBody).items).toHaveLength(1);
  });

  it("does not end another person's session", async () => {
    const other = await application.people.signIn('administrator');
    const { items } = (await other.get('/api/account/sessions')).body as SessionsBody;
    await person.delete(`/api/account/sessions/${items[0]?.id}`).expect(404);
    await other.get('/api/auth/me').expect(200);
  });

  it('is closed to whoever is not signed in', async () => {
    await request(application.server).get('/api/account/sessions').expect(401);
    await request(application.server).put('/api/account/name').send({ name: 'x' }).expect(401);
  });
});
