import request from 'supertest';
import { gunzipSync } from 'node:zlib';
import { startApplication, type StartedApplication } from './support/application';
import { CatalogueBuilder } from './support/catalogue-builder';
import { PASSWORD, type SignedInPerson } from './support/people-builder';

describe('the answers of the API', () => {
  let application: StartedApplication;
  let administrator: SignedInPerson;
  beforeAll(async () => {
    application = await startApplication();
    administrator = await application.people.signIn('administrator', 'designer');
    const catalogue = new CatalogueBuilder(application.nest, administrator.person.id);
    const family = await catalogue.family({
      code: 'SKUA',
      manufacturerId: await catalogue.manufacturer('NORVIK'),
    });
    for (let made = 1; made <= 10; made += 1) {
      await catalogue.part({ family, number: `SKUA-${made}`, approval: 'preferred' });
    }
    await catalogue.rebuild();
  });
  afterAll(() => application.stop());

  it.each([
    ['gzip, deflate, br', 'br'],
    ['gzip', 'gzip'],
    ['identity', undefined],
  ])('are compressed as the browser takes it: %s', async (accepted, encoding) => {
    const answer = await administrator
      .post('/api/parts/search', { filters: { text: 'SKUA' }, policy: 'none' })
      .set('Accept-Encoding', accepted)
      .expect(200);
    expect(answer.get('Content-Encoding')).toBe(encoding);
    expect(answer.get('Vary')).toContain('Accept-Encoding');
    expect(answer.get('Cache-Control')).toBe('no-store');
    expect((answer.body as { total: number }).total).toBe(10);
  });

  it('are the same, byte by byte, once unpacked', async () => {
    const get = (accepted: string) =>
      administrator
        .get('/api/permissions')
        .set('Accept-Encoding', accepted)
        .buffer(true)
        .parse((answer, done) => {
          const chunks: Buffer[] = [];
          answer.on('data', (chunk: Buffer) => chunks.push(chunk));
          answer.on('end', () => done(null, Buffer.concat(chunks)));
        })
        .expect(200);
    const plain = (await get('identity')).body as Buffer;
    expect(plain.length).toBeGreaterThan(2048);
    const packed = await get('gzip');
    // superagent unpacks gzip by itself where it can; either way the bytes are those of the plain answer.
    const body = packed.body as Buffer;
    const unpacked = body[0] === 0x1f && body[1] === 0x8b ? gunzipSync(body) : body;
    expect(packed.get('Content-Encoding')).toBe('gzip');
    expect(unpacked.equals(plain)).toBe(true);
  });

  it('stay as they are where they are short', async () => {
    const answer = await administrator.get('/api/health').set('Accept-Encoding', 'br').expect(200);
    expect(answer.get('Content-Encoding')).toBeUndefined();
    expect(answer.get('Content-Length')).toBeDefined();
  });

  it('are compressed where they are long problem documents', async () => {
    const body = Object.fromEntries(Array.from({ length: 200 }, (_, at) => [`unknown-${at}`, 1]));
    const answer = await administrator
      .post('/api/parts/search', body)
      .set('Accept-Encoding', 'gzip')
      .expect(400);
    expect(answer.get('Content-Type')).toContain('application/problem+json');
    expect(answer.get('Content-Encoding')).toBe('gzip');
  });

  it.each(['/api/auth/sign-in', '/API/AUTH/sign-in'])(
    'are never compressed where they hold a token: %s',
    async (path) => {
      // Holding all roles, a person's rules make the answer long enough to be compressed.
      const person = await application.people.add(
        'administrator',
        'librarian',
        'component-engineer',
        'designer',
        'purchasing',
      );
      const answer = await request(application.server)
        .post(path)
        .set('Accept-Encoding', 'gzip, br')
        .send({ email: person.email, password: PASSWORD })
        .expect(200);
      expect(answer.text.length).toBeGreaterThan(2048);
      expect(answer.get('Content-Encoding')).toBeUndefined();
    },
  );
});
