import request from 'supertest';
import { startApplication, type StartedApplication } from './support/application';
import { PASSWORD } from './support/people-builder';

interface SignedInBody {
  accessToken: string;
  user: { id: number; email: string; name: string; roles: string[] };
  rules: unknown[];
}

describe('signing in', () => {
  let application: StartedApplication;
  beforeAll(async () => {
    application = await startApplication();
  });
  afterAll(() => application.stop());

  it('answers with an access token, the person and the rules, and sets the refresh cookie', async () => {
    const person = await application.people.add('designer', 'librarian');
    const answer = await request(application.server)
      .post('/api/auth/sign-in')
      .send({ email: person.email.toUpperCase(), password: PASSWORD })
      .expect(200);
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
});
