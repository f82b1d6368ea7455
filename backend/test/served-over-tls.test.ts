import request from 'supertest';
import { startApplication, type StartedApplication } from './support/application';
import { PASSWORD } from './support/people-builder';

describe('behind a proxy that speaks TLS', () => {
  let application: StartedApplication;
  beforeAll(async () => {
    application = await startApplication({ environment: { APP_URL: 'https://resistry.example.com' } });
  });
  afterAll(() => application.stop());

  it('marks the cookie Secure and asks browsers to come by TLS only', async () => {
    const { email } = await application.people.add('designer');
    const answer = await request(application.server)
      .post('/api/auth/sign-in')
      .set('Origin', 'https://resistry.example.com')
      .send({ email, password: PASSWORD })
      .expect(200);
    expect(answer.get('Set-Cookie')?.[0]).toContain('; Secure;');
    expect(answer.get('Strict-Transport-Security')).toContain('max-age=31536000');
    expect(answer.get('Content-Security-Policy')).toContain('upgrade-insecure-requests');
  });

  it("takes the client's address from the proxy, for the list of sessions", async () => {
    const { email } = await application.people.add('designer');
    const answer = await request(application.server)
      .post('/api/auth/sign-in')
      .set('X-Forwarded-For', '203.0.113.7, 198.51.100.4')
      .send({ email, password: PASSWORD })
      .expect(200);
    const { accessToken } = answer.body as { accessToken: string };
    const sessions = await request(application.server)
      .get('/api/account/sessions')
      .set('Authorization', `Bearer ${accessToken}`);
    // The last entry is what the one trusted proxy saw; the ones before it are the client's own word.
    expect(sessions.body).toMatchObject({ items: [{ address: '198.51.100.4' }] });
  });
});
