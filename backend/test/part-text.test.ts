import { PartText } from '../src/parts/part-text';
import { startApplication, type StartedApplication } from './support/application';
import { CatalogueBuilder } from './support/catalogue-builder';
import type { SignedInPerson } from './support/people-builder';

describe('finding parts by text', () => {
  let application: StartedApplication;
  let designer: SignedInPerson;
  const ids: Record<string, number> = {};
  beforeAll(async () => {
    application = await startApplication();
    designer = await application.people.signIn('designer');
    const catalogue = new CatalogueBuilder(application.nest, designer.person.id);
    const norvik = await catalogue.manufacturer('NORVIK', 'Norvik Resistorer');
    const odd = await catalogue.manufacturer('ODD', '<b>100%</b> "Or" AND* Ltd');
    const skua = await catalogue.family({ code: 'SKUA', manufacturerId: norvik });
    const teal = await catalogue.family({ code: 'TEAL', name: 'Film_strip', manufacturerId: odd });
    for (const number of ['SKUA0603F4701', 'SKUA0603F4702', 'SKUA0603F1_0']) {
      ids[number] = await catalogue.part({ family: skua, number });
    }
    ids['TEAL0603F4701'] = await catalogue.part({
      family: teal,
      number: 'TEAL0603F4701',
      approval: 'preferred',
    });
    await catalogue.companyPartNumber('BW-R-00417', [ids['SKUA0603F4702']!]);
    await catalogue.rebuild();
  });
  afterAll(() => application.stop());

  const SKUAS = ['SKUA0603F4701', 'SKUA0603F4702', 'SKUA0603F1_0'];
  it.each([
    ['SKUA0603F4701', ['SKUA0603F4701']],
    ['f4701', ['SKUA0603F4701', 'TEAL0603F4701']],
    ['skua', SKUAS],
    ['norvik 4702', ['SKUA0603F4702']],
    ['4702 norvik', ['SKUA0603F4702']],
    ['norvik teal', []],
    ['00417', ['SKUA0603F4702']],
    ['thick film', SKUAS],
    // Three characters and more are found anywhere, fewer only where a name begins.
    ['kua', SKUAS],
    ['ku', []],
    ['sk', SKUAS],
    ['s', SKUAS],
    ['bw', ['SKUA0603F4702']],
    ['no', SKUAS],
    ['sk 4702', ['SKUA0603F4702']],
    ['s b', ['SKUA0603F4702']],
    // What means something to SQL or to the text index means itself.
    ['100%', ['TEAL0603F4701']],
    ['%', []],
    ['_', []],
    ['1_0', ['SKUA0603F1_0']],
    ['m_s', ['TEAL0603F4701']],
    ['"Or"', ['TEAL0603F4701']],
    ['"', []],
    ['and*', ['TEAL0603F4701']],
    ['skua*', []],
    ['skua OR teal', []],
    ['NOT', []],
    ['manufacturer:norvik', []],
    ['^skua', []],
    ['NEAR(skua)', []],
    ["' OR 1=1 --", []],
    ['<b>', ['TEAL0603F4701']],
    ['', [...SKUAS, 'TEAL0603F4701']],
    ['  ', [...SKUAS, 'TEAL0603F4701']],
    ['skua '.repeat(50), SKUAS],
  ])('%j', async (text, numbers) => {
    const found = await application.nest.get(PartText, { strict: false }).idsOf(text);
    expect(found).toEqual(numbers.map((number) => ids[number]));
    if (text.trim() === '' || text.length > 100) return;
    const answer = await designer.get(`/api/text-search?q=${encodeURIComponent(text)}`).expect(200);
    const { parts } = answer.body as { parts: { total: number; items: { id: number }[] } };
    expect(parts.total).toBe(numbers.length);
    expect(parts.items.map(({ id }) => id).sort()).toEqual(found);
  });

  it('shows a number that is the text first, then the preferred', async () => {
    const numbersFor = async (text: string): Promise<string[]> => {
      const answer = await designer.get(`/api/text-search?q=${text}&limit=3`).expect(200);
      const { parts } = answer.body as { parts: { items: { manufacturerPartNumber: string }[] } };
      return parts.items.map(({ manufacturerPartNumber }) => manufacturerPartNumber);
    };
    expect(await numbersFor('F4701')).toEqual(['TEAL0603F4701', 'SKUA0603F4701']);
    expect(await numbersFor('skua0603f4702')).toEqual(['SKUA0603F4702']);
    expect(await numbersFor('BW-R-00417')).toEqual(['SKUA0603F4702']);
    expect(await numbersFor('0603')).toEqual(['TEAL0603F4701', 'SKUA0603F1_0', 'SKUA0603F4701']);
  });

  it('groups what it finds and tells how many there are', async () => {
    const answer = await designer.get('/api/text-search?q=skua&limit=1').expect(200);
    expect(answer.body).toMatchObject({
      parts: { total: 3, items: [{ family: { code: 'SKUA' } }] },
      families: { total: 1, items: [{ code: 'SKUA', manufacturer: { name: 'Norvik Resistorer' } }] },
      manufacturers: { total: 0, items: [] },
    });
    const other = await designer.get('/api/text-search?q=AND').expect(200);
    expect(other.body).toMatchObject({
      families: { items: [{ code: 'TEAL' }] },
      manufacturers: { total: 1, items: [{ name: '<b>100%</b> "Or" AND* Ltd' }] },
    });
    expect(other.get('Content-Type')).toMatch(/^application\/json/);
  });

  it.each([
    '',
    '?q=',
    '?q=%20',
    `?q=${'x'.repeat(101)}`,
    '?q=a&limit=0',
    '?q=a&limit=51',
    '?q=a&limit=1e9',
    '?q=a&page=2',
    '?q=a%00',
    '?q=a&q=b',
  ])('refuses %s', async (query) => {
    await designer.get(`/api/text-search${query}`).expect(400);
  });
});
