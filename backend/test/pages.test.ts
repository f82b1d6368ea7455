import { createHash } from 'node:crypto';
import { mkdirSync, mkdtempSync, rmSync, utimesSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { brotliCompressSync, gzipSync } from 'node:zlib';
import request from 'supertest';
import { startApplication, type StartedApplication } from './support/application';

const INLINE = `document.documentElement.dataset.mode = 'dark';`;
const INDEX = `<!doctype html><script>${INLINE}</script><script type="module" src="/assets/app-1a2b.js"></script><p>Resistry`;
const SCRIPT = 'export const ohms = 4700;';

describe('the pages', () => {
  let pages: string;
  let application: StartedApplication;
  beforeAll(async () => {
    pages = mkdtempSync(join(tmpdir(), 'resistry-pages-'));
    mkdirSync(join(pages, 'assets'));
    writeFileSync(join(pages, 'index.html'), INDEX);
    writeFileSync(join(pages, 'favicon.svg'), '<svg xmlns="http://www.w3.org/2000/svg"/>');
    writeFileSync(join(pages, 'assets', 'app-1a2b.js'), SCRIPT);
    writeFileSync(join(pages, 'assets', 'app-1a2b.js.gz'), gzipSync(SCRIPT));
    writeFileSync(join(pages, 'assets', 'app-1a2b.js.br'), brotliCompressSync(SCRIPT));
    application = await startApplication({ options: { pagesDirectory: pages } });
  });
  afterAll(async () => {
    await application.stop();
    rmSync(pages, { recursive: true });
  });

  it.each(['/', '/parts/7', '/find?duty=%7B%7D', '/apiary'])(
    'come at %s, never from a cache unasked',
    async (path) => {
      const answer = await request(application.server).get(path).expect(200);
      expect(answer.text).toBe(INDEX);
      expect(answer.get('Content-Type')).toContain('text/html');
      expect(answer.get('Cache-Control')).toBe('no-cache');
      expect(answer.get('Content-Encoding')).toBeUndefined();
    },
  );

  it('keep files with a hash in their name for ever', async () => {
    const answer = await request(application.server)
      .get('/assets/app-1a2b.js')
      .set('Accept-Encoding', 'identity')
      .expect(200);
    expect(answer.get('Cache-Control')).toBe('public, max-age=31536000, immutable');
    expect(answer.get('Content-Type')).toContain('javascript');
    expect(answer.text).toBe(SCRIPT);
  });

  it.each([
    ['gzip, deflate, br', 'br'],
    ['gzip', 'gzip'],
    ['br;q=0, gzip', 'gzip'],
    ['identity', undefined],
  ])('come compressed as the browser takes it: %s', async (accepted, encoding) => {
    const answer = await request(application.server)
      .get('/assets/app-1a2b.js')
      .set('Accept-Encoding', accepted)
      .expect(200);
    expect(answer.get('Content-Encoding')).toBe(encoding);
    expect(answer.get('Content-Type')).toContain('javascript');
    expect(answer.get('Vary')).toContain('Accept-Encoding');
    expect(answer.get('Cache-Control')).toContain('immutable');
  });

  it('come uncompressed where what lies beside a file is older than it', async () => {
    const file = join(pages, 'assets', 'app-9z.js');
    writeFileSync(`${file}.br`, brotliCompressSync('the old one'));
    writeFileSync(`${file}.gz`, gzipSync('the old one'));
    writeFileSync(file, 'the new one');
    const hourAgo = new Date(Date.now() - 3_600_000);
    utimesSync(`${file}.br`, hourAgo, hourAgo);
    utimesSync(`${file}.gz`, hourAgo, hourAgo);
    const get = () =>
      request(application.server).get('/assets/app-9z.js').set('Accept-Encoding', 'gzip, br').expect(200);
    const old = await get();
    expect([old.text, old.get('Content-Encoding')]).toEqual(['the new one', undefined]);
    writeFileSync(`${file}.gz`, gzipSync('the new one'));
    const now = await get();
    expect([now.text, now.get('Content-Encoding')]).toEqual(['the new one', 'gzip']);
  });

  it('run only scripts from here and the inline ones that the build wrote', async () => {
    const answer = await request(application.server).get('/');
    const policy = answer.get('Content-Security-Policy') ?? '';
    const hash = createHash('sha256').update(INLINE).digest('base64');
    expect(policy).toContain("default-src 'none'");
    expect(policy).toContain(`script-src 'self' 'sha256-${hash}';`);
    expect(policy).toContain("frame-ancestors 'none'");
    expect(policy).not.toContain('upgrade-insecure-requests');
    expect(answer.get('X-Content-Type-Options')).toBe('nosniff');
    expect(answer.get('X-Powered-By')).toBeUndefined();
  });

  it.each(['/assets/gone-9.js', '/../package.json', '/%2e%2e/package.json', '/.env'])(
    'have no file %s',
    async (path) => {
      await request(application.server).get(path).expect(404);
    },
  );

  it.each(['/api', '/api/', '/api/nothing'])('leave %s to the API', async (path) => {
    const answer = await request(application.server).get(path).expect(404);
    expect(answer.get('Content-Type')).toContain('application/problem+json');
    expect(answer.get('Cache-Control')).toBe('no-store');
  });

  it('answer no other method', async () => {
    await request(application.server).post('/parts/7').expect(404);
  });
});
