import { startApplication, type StartedApplication } from './support/application';
import { CatalogueBuilder } from './support/catalogue-builder';
import type { SignedInPerson } from './support/people-builder';
import type { ProblemBody } from './support/problem-body';

/** What means something to SQL's LIKE, to full-text search, to JSON or to a page, and nothing to us. */
const SIGNS = [
  '%',
  '_',
  '*',
  "'",
  '"',
  "' OR 1=1 --",
  'a" OR "b',
  'NEAR(',
  '^',
  '-',
  '\\',
  '<b>',
  '{}',
  '😀',
];

/** Every route that takes words, with the name of its parameter and where its answers lie. */
const WORDED = [
  { path: '/api/families', parameter: 'q' },
  { path: '/api/text-search', parameter: 'q' },
  { path: '/api/company-part-numbers', parameter: 'q' },
  { path: '/api/audit', parameter: 'text' },
  { path: '/api/audit', parameter: 'subjectId' },
  { path: '/api/notation', parameter: 'text', more: '&quantity=resistance' },
  { path: '/api/marking', parameter: 'text' },
] as const;

/** Every route that gives its answers in pages, with the parameters that set them. */
const PAGED = [
  { path: '/api/reviews', size: 'pageSize', place: 'page' },
  { path: '/api/company-part-numbers', size: 'pageSize', place: 'page' },
  { path: '/api/audit', size: 'limit', place: 'before' },
  { path: '/api/mail', size: 'limit', place: 'offset' },
] as const;

describe('bad input, on the routes that read', () => {
  let application: StartedApplication;
  let reader: SignedInPerson;
  beforeAll(async () => {
    application = await startApplication();
    reader = await application.people.signIn('administrator', 'designer');
    const catalogue = new CatalogueBuilder(application.nest, reader.person.id);
    const family = await catalogue.family({
      code: 'SKUA',
      manufacturerId: await catalogue.manufacturer('NORVIK'),
    });
    await catalogue.part({ family, number: 'SKUA-1', approval: 'preferred' });
    await catalogue.rebuild();
  });
  afterAll(() => application.stop());

  /** Whatever an answer lists, however deep. */
  const listed = (body: unknown): unknown[] => {
    if (Array.isArray(body)) return body;
    return typeof body === 'object' && body !== null ? Object.values(body).flatMap(listed) : [];
  };

  describe.each(WORDED)('$path?$parameter=', ({ path, parameter, ...rest }) => {
    const more = 'more' in rest ? rest.more : '';

    it.each(SIGNS)('takes %s for itself', async (sign) => {
      const answer = await reader.get(`${path}?${parameter}=${encodeURIComponent(sign)}${more}`);
      expect([sign, [200, 400, 422].includes(answer.status)]).toEqual([sign, true]);
      expect(answer.text).not.toMatch(/SQLITE|fts5|syntax error|\bat \//);
      // Nothing in this catalogue bears such a sign, so that whoever finds something has read it as a wildcard.
      if (answer.status === 200 && sign !== '-') expect(listed(answer.body)).toEqual([]);
    });

    it('refuses an endless text and one with a NUL character', async () => {
      for (const text of ['x'.repeat(2000), 'a%00b']) {
        const answer = await reader.get(`${path}?${parameter}=${text}${more}`);
        expect([text.length, answer.status]).toEqual([text.length, 400]);
      }
    });

    it('refuses a parameter that nobody knows', async () => {
      const answer = await reader.get(`${path}?${parameter}=SKUA${more}&admin=true`).expect(400);
      expect((answer.body as ProblemBody).errors?.map(({ pointer }) => pointer)).toEqual(['/admin']);
    });
  });

  describe.each(PAGED)('$path', ({ path, size, place }) => {
    it.each(['0', '-1', '1.5', '1e9', '201', 'NaN', 'Infinity', '1e999', '', 'ten', '0x10'])(
      'refuses a page of %s',
      async (text) => {
        const answer = await reader.get(`${path}?${size}=${text}`).expect(400);
        expect((answer.body as ProblemBody).errors?.map(({ pointer }) => pointer)).toContain(`/${size}`);
      },
    );

    it.each(['-1', '1.5', 'NaN', '1e999', 'first', '99999999999999999999'])(
      'refuses to begin at %s',
      async (text) => {
        const answer = await reader.get(`${path}?${place}=${text}`).expect(400);
        expect((answer.body as ProblemBody).errors?.map(({ pointer }) => pointer)).toContain(`/${place}`);
      },
    );
  });

  it.each([0, -1, 1.5, 201, 1e300])('refuses a page of %p search results', async (pageSize) => {
    const answer = await reader.post('/api/parts/search', { pageSize }).expect(400);
    expect((answer.body as ProblemBody).errors?.map(({ pointer }) => pointer)).toEqual(['/pageSize']);
  });

  it('searches for signs as they are', async () => {
    for (const text of SIGNS) {
      const answer = await reader.post('/api/parts/search', { filters: { text }, policy: 'none' });
      expect([text, answer.status]).toEqual([text, 200]);
      if (text !== '-') expect([text, (answer.body as { total: number }).total]).toEqual([text, 0]);
    }
    const found = await reader.post('/api/parts/search', { filters: { text: 'skua-1' }, policy: 'none' });
    expect((found.body as { total: number }).total).toBe(1);
  });
});
