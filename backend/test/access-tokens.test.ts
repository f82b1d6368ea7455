import request, { type Response } from 'supertest';
import { Secrets } from '../src/config/secrets';
import { startApplication, type StartedApplication } from './support/application';
import { type Claims, claimsOf, encoded, forge } from './support/forge-token';
import type { SignedInPerson } from './support/people-builder';
import type { ProblemBody } from './support/problem-body';

describe('access tokens', () => {
  let application: StartedApplication;
  let designer: SignedInPerson;
  let claims: Claims;
  let key: string;
  beforeAll(async () => {
    application = await startApplication();
    designer = await application.people.signIn('designer');
    claims = claimsOf(designer.accessToken);
    key = application.nest.get(Secrets).accessTokenKey;
  });
  afterAll(() => application.stop());

  const me = (token: string): Promise<Response> =>
    Promise.resolve(request(application.server).get('/api/auth/me').set('Authorization', `Bearer ${token}`));

  it('are good for ten minutes and say nothing but whose they are', () => {
    expect(Number(claims['exp']) - Number(claims['iat'])).toBe(600);
    expect(Object.keys(claims).sort()).toEqual(['aud', 'exp', 'iat', 'iss', 'sid', 'sub']);
  });

  it('are taken when they are made as ours are, so that the refusals below mean something', async () => {
    expect((await me(forge(claims, key))).status).toBe(200);
  });

  const past = Math.floor(Date.UTC(2020, 0, 1) / 1000);
  it.each<[string, () => string]>([
    ['an expired one', () => forge({ ...claims, iat: past, exp: past + 600 }, key)],
    ["another key's", () => forge(claims, 'x'.repeat(64))],
    ['one of another issuer', () => forge({ ...claims, iss: 'somebody' }, key)],
    ['one for another audience', () => forge({ ...claims, aud: 'somebody' }, key)],
    ["another person's session", () => forge({ ...claims, sub: '4711' }, key)],
    ['an unknown session', () => forge({ ...claims, sid: 'none' }, key)],
    ['a session that is no text', () => forge({ ...claims, sid: { $ne: '' } }, key)],
    ['an unsigned one', () => `${encoded({ alg: 'none', typ: 'JWT' })}.${encoded(claims)}.`],
    ['another algorithm', () => forge(claims, key, { alg: 'HS512', typ: 'JWT' })],
    ['a changed one', () => designer.accessToken.replace(/.$/, (last) => (last === 'A' ? 'B' : 'A'))],
    ['no token at all', () => 'x'],
  ])('are refused: %s', async (_what, token) => {
    const answer = await me(token());
    expect(answer.status).toBe(401);
    expect(answer.get('WWW-Authenticate')).toBe('Bearer');
    expect(answer.get('Content-Type')).toContain('application/problem+json');
    expect((answer.body as ProblemBody).type).toBe('urn:resistry:problem:unauthenticated');
  });

  it('are not taken from the address or a cookie', async () => {
    await request(application.server).get(`/api/auth/me?access_token=${designer.accessToken}`).expect(401);
    await request(application.server)
      .get('/api/auth/me')
      .set('Cookie', `token=${designer.accessToken}`)
      .expect(401);
  });

  it('give the roles that the person has now, not those at sign-in', async () => {
    const administrator = await application.people.signIn('administrator');
    const person = await application.people.signIn('designer');
    await person.get('/api/users').expect(403);
    const roles = { roles: ['designer', 'administrator'], version: 1, reason: 'Stands in' };
    await administrator.put(`/api/users/${person.person.id}/roles`, roles).expect(200);
    await person.get('/api/users').expect(200);
  });
});
