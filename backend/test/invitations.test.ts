import request, { type Response } from 'supertest';
import { startApplication, type StartedApplication } from './support/application';
import { lettersTo, tokenIn } from './support/mail';
import type { SignedInPerson } from './support/people-builder';
import type { ProblemBody } from './support/problem-body';

const DAY = 24 * 3600;
const PASSWORD = 'harbour-light-9';

describe('inviting people', () => {
  let application: StartedApplication;
  let administrator: SignedInPerson;
  let invited = 0;
  beforeAll(async () => {
    application = await startApplication();
  });
  afterAll(() => application.stop());
  beforeEach(async () => {
    administrator = await application.people.signIn('administrator');
  });

  const newAddress = (): string => `new-${(invited += 1)}@brackwater.example.com`;
  const invite = async (email: string, roles: string[] = ['designer']): Promise<Response> => {
    const answer = await administrator.post('/api/invitations', { email, roles });
    await application.delivered();
    return answer;
  };
  const tokenFor = async (email: string): Promise<string> =>
    tokenIn((await lettersTo(administrator, email))[0]);
  const accept = (token: string, form: object = {}): Promise<Response> =>
    Promise.resolve(
      request(application.server)
        .post('/api/invitations/accept')
        .send({ token, name: 'Robin Ferry', password: PASSWORD, ...form }),
    );
  const preview = (token: string): Promise<Response> =>
    Promise.resolve(request(application.server).post('/api/invitations/preview').send({ token }));

  it('sends a link, by which the person comes in with the roles given', async () => {
    const email = newAddress();
    expect((await invite(email.toUpperCase(), ['purchasing', 'designer'])).status).toBe(201);
    const token = await tokenFor(email);
    expect((await preview(token)).body).toMatchObject({ email, roles: ['designer', 'purchasing'] });
    expect((await accept(token)).status).toBe(204);
    const answer = await request(application.server)
      .post('/api/auth/sign-in')
      .send({ email, password: PASSWORD })
      .expect(200);
    expect(answer.body).toMatchObject({
      user: { email, name: 'Robin Ferry', roles: ['designer', 'purchasing'] },
    });
    expect((await accept(token)).status).toBe(422);
  });

  it('lists the open ones, and withdraws one', async () => {
    const email = newAddress();
    const { id } = (await invite(email)).body as { id: string };
    const token = await tokenFor(email);
    const list = await administrator.get('/api/invitations').expect(200);
    expect((list.body as { items: unknown[] }).items).toContainEqual(
      expect.objectContaining({
        id,
        email,
        roles: ['designer'],
        invitedBy: administrator.person.name,
        state: 'open',
      }),
    );
    await administrator.delete(`/api/invitations/${id}`).expect(204);
    expect((await accept(token)).status).toBe(422);
    await administrator.delete(`/api/invitations/${id}`).expect(404);
    await administrator.delete('/api/invitations/7').expect(400);
  });

  it('replaces an open invitation by the next one to the same address', async () => {
    const email = newAddress();
    await invite(email);
    const first = await tokenFor(email);
    application.clock.forward(60);
    await invite(email, ['librarian']);
    expect((await accept(first)).status).toBe(422);
    expect((await accept(await tokenFor(email))).status).toBe(204);
  });

  it('runs out after seven days', async () => {
    const email = newAddress();
    await invite(email);
    const token = await tokenFor(email);
    application.clock.forward(7 * DAY + 1);
    expect((await preview(token)).status).toBe(422);
    expect((await accept(token)).status).toBe(422);
  });

  it('refuses an address that has an account', async () => {
    const person = await application.people.add('designer');
    const answer = await invite(person.email);
    expect(answer.status).toBe(409);
    expect((answer.body as ProblemBody).errors).toEqual([
      { pointer: '/email', message: 'has an account already' },
    ]);
  });

  it.each([
    [{ email: 'x', roles: ['designer'] }, '/email'],
    [{ email: 'x@example.com', roles: [] }, '/roles'],
    [{ email: 'x@example.com', roles: ['king'] }, '/roles'],
    [{ email: 'x@example.com', roles: ['designer', 'designer'] }, '/roles'],
    [{ email: 'x@example.com' }, '/roles'],
  ])('refuses the invitation %j', async (body, pointer) => {
    const answer = await administrator.post('/api/invitations', body).expect(400);
    expect((answer.body as ProblemBody).errors?.map((error) => error.pointer)).toContain(pointer);
  });

  it.each([
    [{ name: '  ' }, '/name'],
    [{ name: 'Robin\r\nBcc: x' }, '/name'],
    [{ password: 'short' }, '/password'],
    [{ password: 'Robin Ferry' }, '/password'],
  ])('refuses the acceptance %j and leaves the invitation open', async (form, pointer) => {
    const email = newAddress();
    await invite(email);
    const token = await tokenFor(email);
    const answer = await accept(token, form);
    expect(answer.status).toBe(400);
    expect((answer.body as ProblemBody).errors?.map((error) => error.pointer)).toContain(pointer);
    expect((await accept(token)).status).toBe(204);
  });

  it('keeps a name with markup as the text that it is', async () => {
    const email = newAddress();
    await invite(email);
    const name = `<img src=x onerror=alert(1)> "O'Neil" & co`;
    expect((await accept(await tokenFor(email), { name })).status).toBe(204);
    const list = await administrator.get('/api/users').expect(200);
    expect(list.get('Content-Type')).toContain('application/json');
    expect((list.body as { items: unknown[] }).items).toContainEqual(
      expect.objectContaining({ email, name }),
    );
  });
});
