import request from 'supertest';
import { startApplication, type StartedApplication } from './support/application';
import { type BuiltFamily, CatalogueBuilder } from './support/catalogue-builder';
import type { SignedInPerson } from './support/people-builder';

const MARKUP = '<img src=x onerror=alert(1)> & "Sons"';

describe('reading the catalogue', () => {
  let application: StartedApplication;
  let designer: SignedInPerson;
  let catalogue: CatalogueBuilder;
  let norvik: number;
  let skua: BuiltFamily;
  let teal: BuiltFamily;
  let part: number;
  let link: number;
  let source: number;
  beforeAll(async () => {
    application = await startApplication();
    designer = await application.people.signIn('designer');
    const librarian = await application.people.add('librarian');
    catalogue = new CatalogueBuilder(application.nest, librarian.id);
    norvik = await catalogue.manufacturer('NORVIK');
    skua = await catalogue.family({ code: 'SKUA', manufacturerId: norvik });
    teal = await catalogue.family({
      code: 'TEAL',
      name: MARKUP,
      technology: 'thin-film',
      manufacturerId: await catalogue.manufacturer('OSTVIK', MARKUP),
    });
    part = await catalogue.part({ family: skua, number: 'SKUA0603F4701', approval: 'approved' });
    link = await catalogue.part({ family: skua, number: 'SKUA060300000', resistance: 0 });
    source = await catalogue.part({ family: teal, number: 'TEAL0603F4701', approval: 'preferred' });
    await catalogue.companyPartNumber('BW-R-1/2 %', [part, source]);
    await catalogue.offer(part, { from: '2025-01-01', until: '2025-12-31', price: 0.004 });
    await catalogue.offer(part, { price: 0.0123456 });
    await catalogue.rebuild();
  });
  afterAll(() => application.stop());

  const read = async (path: string): Promise<unknown> => (await designer.get(path).expect(200)).body;

  it('shows a part with everything known of it', async () => {
    const body = (await read(`/api/parts/${part}`)) as Record<string, unknown>;
    expect(body).toMatchObject({
      id: part,
      version: 1,
      manufacturerPartNumber: 'SKUA0603F4701',
      companyPartNumber: { number: 'BW-R-1/2 %' },
      manufacturer: { id: norvik, code: 'NORVIK', name: 'NORVIK Works' },
      family: { id: skua.id, code: 'SKUA' },
      size: { code: '0603', metricCode: '1608M' },
      bodyStyle: 'chip',
      landPattern: 'rect-chip 1608 nominal',
      resistance: 4700,
      tolerance: 0.01,
      tcr: 1e-4,
      approval: 'approved',
      supply: 'active',
      // 12,345.6 millionths of a euro are kept whole.
      unitPrice: 0.012346,
      secondSource: true,
      enteredBy: { name: 'Person 2' },
      revision: { number: 1, datasheet: { documentNumber: 'SKUA-1', revision: 'A' } },
      modes: [{ ratings: { resistance: 4700, ratedDissipation: 0.1, limitingElementVoltage: 75 } }],
      citations: [{ field: 'ratedDissipation', page: 2, datasheet: { documentNumber: 'SKUA-1' } }],
      orderingCodes: [{ packaging: 'T5', quantity: 5000, code: 'SKUA0603F4701-T5' }],
      sources: [
        { id: part, position: 1, approval: 'approved', unitPrice: 0.012346 },
        { id: source, position: 2, approval: 'preferred', manufacturer: { name: MARKUP } },
      ],
      offers: [
        {
          inForce: true,
          supplier: { code: 'GULL' },
          priceBreaks: [
            { quantity: 1, unitPrice: 0.037037 },
            { quantity: 1000, unitPrice: 0.012346 },
          ],
        },
        { inForce: false, validUntil: '2025-12-31' },
      ],
      approvalHistory: [],
      supplyHistory: [],
      openReviews: [],
    });
    // What the datasheet does not state is absent, never null or 0.
    const [{ ratings }] = body['modes'] as [{ ratings: object }];
    for (const field of ['noiseIndex', 'drift', 'inductance', 'pulses', 'link']) {
      expect(ratings).not.toHaveProperty(field);
    }
    expect(JSON.stringify(body)).not.toContain('null');
  });

  it('shows a zero-ohm link without what a link does not have', async () => {
    const body = await read(`/api/parts/${link}`);
    expect(body).toMatchObject({ resistance: 0, sources: [], offers: [], secondSource: false });
    for (const field of ['tolerance', 'tcr', 'companyPartNumber', 'unitPrice']) {
      expect(body).not.toHaveProperty(field);
    }
  });

  it('gives back markup in names as the text that it is', async () => {
    const answer = await designer.get(`/api/families/${teal.id}`).expect(200);
    expect(answer.get('Content-Type')).toMatch(/^application\/json/);
    expect(answer.get('X-Content-Type-Options')).toBe('nosniff');
    expect(answer.body).toMatchObject({ name: MARKUP, manufacturer: { name: MARKUP } });
  });

  it('shows a family with its ratings, ranges, papers and ordering codes', async () => {
    const body = await read(`/api/families/${skua.id}`);
    expect(body).toMatchObject({
      code: 'SKUA',
      technology: 'thick-film',
      parts: 2,
      approvals: { draft: 1, 'in-review': 0, approved: 1, preferred: 0, restricted: 0, withdrawn: 0 },
      revision: {
        number: 1,
        state: 'published',
        current: true,
        datasheet: { documentNumber: 'SKUA-1', pageCount: 9 },
        orderingCodeExamples: [
          { code: 'SKUA0603F4701-T5', resistance: 4700, tolerance: 0.01, packaging: 'T5' },
          { code: 'SKUA060300000-T5', resistance: 0 },
        ],
        sizes: [
          {
            size: { code: '0603' },
            parts: 2,
            modes: [
              {
                name: 'standard',
                ratings: {
                  derating: {
                    axis: 'ambient',
                    points: [
                      [70, 1],
                      [155, 0],
                    ],
                  },
                },
              },
            ],
          },
        ],
        ranges: [{ tolerance: 0.01, tcr: 1e-4, min: 1, max: 1e7, series: ['E24', 'E96'] }],
        packagings: [{ code: 'T5' }],
        citations: [{ field: 'ratedDissipation', page: 2 }],
      },
      revisions: [{ number: 1, current: true }],
      datasheets: [{ documentNumber: 'SKUA-1' }],
    });
    expect(JSON.stringify(body)).not.toContain('null');
    expect(await read(`/api/families/${skua.id}/revisions/1`)).toEqual(
      (body as { revision: object }).revision,
    );
  });

  it.each([
    ['', ['SKUA', 'TEAL']],
    ['?q=skua', ['SKUA']],
    ['?q=norvik%20thick', ['SKUA']],
    ['?q=%22sons%22', ['TEAL']],
    ['?q=%25', []],
    ['?q=_', []],
    ['?technology=thin-film', ['TEAL']],
    ['?technology=wirewound', []],
    ['?technology=thick-film&q=teal', []],
  ])('lists families%s', async (query, codes) => {
    const { items } = (await read(`/api/families${query}`)) as { items: { code: string }[] };
    expect(items.map(({ code }) => code)).toEqual(codes);
  });

  it('lists the families of a manufacturer, and manufacturers with what they have', async () => {
    const { items } = (await read(`/api/families?manufacturer=${norvik}`)) as { items: { code: string }[] };
    expect(items.map(({ code }) => code)).toEqual(['SKUA']);
    expect(await read('/api/manufacturers')).toMatchObject({
      items: [
        { name: MARKUP, families: 1, parts: 1 },
        { code: 'NORVIK', families: 1, parts: 2, country: 'Vessmark' },
      ],
    });
  });

  it('counts what a search can be narrowed to', async () => {
    expect(await read('/api/facets')).toEqual({
      manufacturers: [
        expect.objectContaining({ name: MARKUP, parts: 1 }),
        { id: norvik, code: 'NORVIK', name: 'NORVIK Works', parts: 2 },
      ],
      families: [
        expect.objectContaining({ code: 'TEAL', parts: 1 }),
        { id: skua.id, code: 'SKUA', name: 'Thick film chip', manufacturerId: norvik, parts: 2 },
      ],
      technologies: [
        { value: 'thin-film', parts: 1 },
        { value: 'thick-film', parts: 2 },
      ],
      sizes: [{ code: '0603', metricCodes: ['1608M'], parts: 3 }],
      // 4.7 kΩ is in E3 (1, 2.2, 4.7) and so in E6, E12 and E24, which E48 to E192 accept beside their own (IEC 60063).
      series: ['E3', 'E6', 'E12', 'E24', 'E48', 'E96', 'E192'].map((value) => ({ value, parts: 2 })),
      tolerances: [{ value: 0.01, parts: 2 }],
      tcrs: [{ value: 1e-4, parts: 2 }],
      mountings: [{ value: 'surface', parts: 3 }],
    });
  });

  it('counts anew when a part has come', async () => {
    await catalogue.part({ family: teal, number: 'TEAL0603F1001', resistance: 1000 });
    const { technologies } = (await read('/api/facets')) as { technologies: object[] };
    expect(technologies).toContainEqual({ value: 'thin-film', parts: 2 });
  });

  it('finds company part numbers and shows their approved manufacturer lists', async () => {
    const list = await read('/api/company-part-numbers?q=bw%20%25');
    expect(list).toMatchObject({ total: 1, items: [{ number: 'BW-R-1/2 %', sources: 2, soundSources: 2 }] });
    expect(await read('/api/company-part-numbers?q=_')).toEqual({ total: 0, items: [] });
    const path = `/api/company-part-numbers/${encodeURIComponent('BW-R-1/2 %')}`;
    expect(await read(path)).toMatchObject({
      number: 'BW-R-1/2 %',
      sources: [
        { position: 1, part: { id: part } },
        { position: 2, part: { id: source, approval: 'preferred' } },
      ],
    });
    await designer.get('/api/company-part-numbers/BW-R').expect(404);
  });

  it.each([
    '/api/families?technology=paper',
    '/api/families?manufacturer=0',
    '/api/families?manufacturer=1e400',
    '/api/families?manufacturer=x',
    '/api/families?colour=red',
    `/api/families?q=${'x'.repeat(101)}`,
    '/api/families/x',
    '/api/families/1/revisions/-1',
    '/api/parts/1.5',
    '/api/company-part-numbers?pageSize=201',
    '/api/company-part-numbers?pageSize=0',
    '/api/company-part-numbers?page=-1',
    '/api/company-part-numbers?page=99999999',
    '/api/reviews?state=half',
    '/api/reviews?pageSize=1e9',
  ])('refuses %s', async (path) => {
    const answer = await designer.get(path).expect(400);
    expect(answer.get('Content-Type')).toMatch(/^application\/problem\+json/);
  });

  it.each([
    '/api/parts/999999',
    '/api/families/999999',
    '/api/families/1/revisions/7',
    '/api/parts/999999/alternates',
    '/api/parts/999999/transitions',
  ])('finds nothing at %s', async (path) => {
    await designer.get(path).expect(404);
  });

  it('is for those who are signed in', async () => {
    for (const path of [
      'manufacturers',
      'families',
      'parts/1',
      'facets',
      'text-search?q=a',
      'company-part-numbers',
    ]) {
      await request(application.server).get(`/api/${path}`).expect(401);
    }
    for (const role of ['librarian', 'administrator'] as const) {
      const person = await application.people.signIn(role);
      const answer = await person.get('/api/reviews').expect(403);
      expect((answer.body as { rule: string }).rule).toBe('read Review');
    }
  });
});
