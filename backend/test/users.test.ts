import { startApplication, type StartedApplication } from './support/application';
import type { SignedInPerson } from './support/people-builder';
import type { ProblemBody } from './support/problem-body';

describe('keeping accounts', () => {
  let application: StartedApplication;
  let administrator: SignedInPerson;
  let person: SignedInPerson;
  beforeAll(async () => {
    application = await startApplication();
    administrator = await application.people.signIn('administrator');
  });
  afterAll(() => application.stop());
  beforeEach(async () => {
    person = await application.people.signIn('designer');
  });

  const path = (deed: string, id = person.person.id): string => `/api/users/${id}/${deed}`;
  const reason = 'moved to another site';

  it('lists everybody and reads one', async () => {
    const list = await administrator.get('/api/users').expect(200);
    const one = await administrator.get(`/api/users/${person.person.id}`).expect(200);
    expect(one.body).toMatchObject({ ...person.person, roles: ['designer'], state: 'active', version: 1 });
    expect((list.body as { items: unknown[] }).items).toContainEqual(one.body);
    expect(JSON.stringify(list.body)).not.toMatch(/hash|\$2b\$/);
    await administrator.get('/api/users/999999').expect(404);
    await administrator.get('/api/users/x').expect(400);
  });

  it('changes roles and writes that down', async () => {
    const answer = await administrator
      .put(path('roles'), { roles: ['purchasing', 'librarian'], version: 1, reason })
      .expect(200);
    expect(answer.body).toMatchObject({ roles: ['librarian', 'purchasing'], version: 2 });
    const audit = await administrator
      .get(`/api/audit?subjectType=User&subjectId=${person.person.id}`)
      .expect(200);
    expect((audit.body as { items: unknown[] }).items).toEqual([
      expect.objectContaining({
        action: 'change-roles',
        actorId: administrator.person.id,
        before: { roles: ['designer'] },
        after: { roles: ['librarian', 'purchasing'] },
        reason,
      }),
    ]);
  });

  it('refuses a stale edit and changes nothing', async () => {
    await administrator.put(path('roles'), { roles: ['librarian'], version: 1, reason }).expect(200);
    const stale = await administrator
      .put(path('roles'), { roles: ['purchasing'], version: 1, reason })
      .expect(409);
    expect((stale.body as ProblemBody).type).toBe('urn:resistry:problem:stale');
    const now = await administrator.get(`/api/users/${person.person.id}`);
    expect(now.body).toMatchObject({ roles: ['librarian'], version: 2 });
  });

  it.each([
    [{ roles: [], version: 1 }, '/roles'],
    [{ roles: ['king'], version: 1 }, '/roles'],
    [{ roles: 'designer', version: 1 }, '/roles'],
    [{ roles: ['designer'] }, '/version'],
    [{ roles: ['designer'], version: '1' }, '/version'],
    [{ roles: ['designer'], version: 1, reason: 'r', state: 'active' }, '/state'],
    [{ roles: ['designer'], version: 1 }, '/reason'],
    [{ roles: ['designer'], version: 1, reason: ' \n' }, '/reason'],
  ])('refuses the roles %j', async (body, pointer) => {
    const answer = await administrator.put(path('roles'), body).expect(400);
    expect((answer.body as ProblemBody).errors?.map((error) => error.pointer)).toContain(pointer);
  });

  it('keeps a deactivated person out at once, and lets a reactivated one in', async () => {
    await administrator.post(path('deactivate'), { reason, version: 1 }).expect(200);
    await person.get('/api/auth/me').expect(401);
    await administrator.post(path('deactivate'), { reason, version: 2 }).expect(422);
    await administrator.post(path('reactivate'), { reason, version: 2 }).expect(200);
    await administrator.post(path('reactivate'), { reason, version: 3 }).expect(422);
    await person.get('/api/auth/me').expect(401);
    await (await application.people.signInAs(person.person)).get('/api/auth/me').expect(200);
    await administrator.post(path('deactivate'), { version: 3 }).expect(400);
    await administrator.post(path('deactivate', 999999), { reason, version: 1 }).expect(404);
  });

  it('does not let an administrator deactivate himself or herself, and names the rule', async () => {
    const answer = await administrator
      .post(path('deactivate', administrator.person.id), { reason, version: 1 })
      .expect(403);
    expect((answer.body as ProblemBody).rule).toBe('deactivate User');
    expect((answer.body as ProblemBody).detail).toContain('never his or her own');
  });

  it('keeps the last administrator', async () => {
    const second = await application.people.signIn('administrator');
    const body = { roles: ['designer'], version: 1, reason };
    await second.put(path('roles', administrator.person.id), body).expect(200);
    const answer = await second.put(path('roles', second.person.id), body).expect(422);
    expect((answer.body as ProblemBody).detail).toContain('nobody who can administer');
    await second
      .put(path('roles', administrator.person.id), { roles: ['administrator'], version: 2, reason })
      .expect(200);
  });

  it('lets nobody but administrators do any of it', async () => {
    for (const answer of [
      await person.get('/api/users'),
      await person.put(path('roles'), { roles: ['administrator'], version: 1, reason }),
      await person.post(path('deactivate', administrator.person.id), { reason, version: 1 }),
    ]) {
      expect(answer.status).toBe(403);
      expect((answer.body as ProblemBody).rule).toMatch(/ User$/);
    }
    const now = await administrator.get(`/api/users/${person.person.id}`);
    expect(now.body).toMatchObject({ roles: ['designer'], version: 1 });
  });
});
