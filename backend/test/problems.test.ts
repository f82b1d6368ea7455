import request from 'supertest';
import { startApplication, type StartedApplication } from './support/application';
import { Readers } from '../src/database/readers';
import type { ProblemBody } from './support/problem-body';

describe('problem documents', () => {
  let application: StartedApplication;
  beforeAll(async () => {
    application = await startApplication();
  });
  afterAll(() => application.stop());

  const post = (body: string, type = 'application/json'): request.Test =>
    request(application.server).post('/api/auth/sign-in').set('Content-Type', type).send(body);

  it.each<[string, () => request.Test, number, string]>([
    ['an unknown address', () => request(application.server).get('/api/nothing'), 404, 'not-found'],
    ['a wrong method', () => request(application.server).delete('/api/health'), 404, 'not-found'],
    ['broken JSON', () => post('{"email":'), 400, 'malformed'],
    ['JSON that is a bare number', () => post('7'), 400, 'malformed'],
    [
      'a badly encoded address',
      () => request(application.server).get('/api/mail/%E0%A4%A'),
      400,
      'malformed',
    ],
    ['more than a megabyte', () => post(`{"email":"${'x'.repeat(1_100_000)}"}`), 413, 'too-large'],
    [
      'a charset that nobody knows',
      () => post('{}', 'application/json; charset=klingon'),
      415,
      'unsupported-media',
    ],
    ['no body', () => request(application.server).post('/api/auth/sign-in'), 400, 'malformed'],
    ['a form', () => post('email=x', 'application/x-www-form-urlencoded'), 400, 'malformed'],
  ])('answer %s', async (_what, send, status, kind) => {
    const answer = await send();
    const problem = answer.body as ProblemBody;
    expect([answer.status, problem.status, problem.type]).toEqual([
      status,
      status,
      `urn:resistry:problem:${kind}`,
    ]);
    expect(answer.get('Content-Type')).toBe('application/problem+json; charset=utf-8');
    expect(problem.instance).toBe(`urn:uuid:${answer.get('X-Request-Id')}`);
    expect(problem.instance).toMatch(/^urn:uuid:[0-9a-f-]{36}$/);
    expect(problem.title.length * problem.detail.length).toBeGreaterThan(0);
  });

  it('give each request an id of ours, whatever the client says', async () => {
    const answer = await request(application.server).get('/api/health').set('X-Request-Id', 'mine');
    expect(answer.get('X-Request-Id')).toMatch(/^[0-9a-f-]{36}$/);
  });

  it('tell nothing of the inside when something breaks', async () => {
    const broken = jest
      .spyOn(application.nest.get(Readers), 'lookUp')
      .mockRejectedValue(new Error('SQLITE_CORRUPT: /srv/data/resistry.sqlite'));
    const answer = await request(application.server).get('/api/health').expect(500);
    broken.mockRestore();
    expect(answer.text).not.toMatch(/SQLITE|srv|stack/);
    expect((answer.body as ProblemBody).type).toBe('urn:resistry:problem:unexpected');
  });
});
