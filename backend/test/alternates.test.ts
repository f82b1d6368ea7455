import { startApplication, type StartedApplication } from './support/application';
import { type BuiltFamily, CatalogueBuilder } from './support/catalogue-builder';
import type { SignedInPerson } from './support/people-builder';

interface Alternate {
  part: { manufacturerPartNumber: string };
  sameCompanyPartNumber: boolean;
  otherManufacturer: boolean;
  sound: boolean;
  judgement: string;
  shortfalls: { field: string; sense: string }[];
  differences: { field: string; sense: string }[];
}

describe('alternates of a part', () => {
  let application: StartedApplication;
  let designer: SignedInPerson;
  let catalogue: CatalogueBuilder;
  const families: Record<string, BuiltFamily> = {};
  beforeAll(async () => {
    application = await startApplication();
    designer = await application.people.signIn('designer');
    catalogue = new CatalogueBuilder(application.nest, designer.person.id);
    const norvik = await catalogue.manufacturer('NORVIK');
    const ostvik = await catalogue.manufacturer('OSTVIK');
    const build = async (code: string, manufacturerId: number, columns = {}, mode = {}): Promise<void> => {
      families[code] = await catalogue.family({ code, manufacturerId }, { columns, mode });
    };
    await build('SKUA', norvik);
    await build('WREN', norvik);
    await build('TEAL', ostvik);
    await build('KITE', ostvik, { limiting_element_voltage_volt: 50 });
    await build('LARK', ostvik, { land_pattern: 'rect-chip 2012 nominal' });
    await build('PETR', ostvik, { land_pattern: null });
    await build('PEEP', ostvik, { land_pattern: null, body_height_metre: 0.0005 });
    await build('DOVE', ostvik, { land_pattern: null, body_style: 'melf' });
  });
  afterAll(() => application.stop());

  const part = (family: string, number: string, choice: object = {}): Promise<number> =>
    catalogue.part({ family: families[family]!, number, ...choice });
  const alternatesOf = async (id: number): Promise<Alternate[]> => {
    const answer = await designer.get(`/api/parts/${id}/alternates`).expect(200);
    const body = answer.body as { total: number; items: Alternate[] };
    expect(body.total).toBe(body.items.length);
    return body.items;
  };
  const numbersOf = (items: Alternate[]): string[] => items.map((item) => item.part.manufacturerPartNumber);

  it('fit the same place, have the same resistance and bear no less; in the order of use', async () => {
    const own = await part('SKUA', 'SKUA-1', { approval: 'preferred' });
    const source = await part('WREN', 'WREN-1', { approval: 'draft' });
    await part('WREN', 'WREN-TIGHT', { tolerance: 0.001, approval: 'approved' });
    const approved = await part('TEAL', 'TEAL-1', { approval: 'approved' });
    await part('TEAL', 'TEAL-ENDED', { approval: 'approved', supply: 'discontinued' });
    await part('TEAL', 'TEAL-DRAFT');
    await part('TEAL', 'TEAL-OTHER', { resistance: 4750 });
    await part('TEAL', 'TEAL-WIDE', { tolerance: 0.05 });
    await part('TEAL', 'TEAL-WARM', { tcr: 2e-4 });
    await part('TEAL', 'TEAL-UNSAID', { tcr: null });
    await part('KITE', 'KITE-LOW');
    await part('LARK', 'LARK-BIG');
    await catalogue.companyPartNumber('BW-R-1', [own, source]);
    await catalogue.offer(approved, { price: 0.02 });
    await catalogue.rebuild();
    const items = await alternatesOf(own);
    const equal = items.filter(({ judgement }) => judgement === 'equal');
    expect(numbersOf(equal)).toEqual(['WREN-1', 'TEAL-1', 'TEAL-ENDED', 'TEAL-DRAFT', 'WREN-TIGHT']);
    expect(equal.map(({ sound }) => sound)).toEqual([false, true, false, false, true]);
    expect(items[0]).toMatchObject({
      sameCompanyPartNumber: true,
      otherManufacturer: false,
      differences: [],
    });
    const rest = items.slice(equal.length);
    expect(numbersOf(rest)).toEqual(['TEAL-UNSAID']);
    expect(rest[0]).toMatchObject({
      judgement: 'undecided',
      shortfalls: [{ field: 'tcr', sense: 'unknown', own: '100 ppm/K' }],
    });
    expect(equal.at(-1)?.differences).toEqual([
      { field: 'tolerance', sense: 'better', own: '±1 %', alternate: '±0.1 %' },
    ]);
  });

  it('hold every source under the same company part number, whatever it lacks', async () => {
    const own = await part('SKUA', 'SKUA-SRC', { resistance: 470 });
    const lesser = await part('KITE', 'KITE-SRC', { resistance: 470, approval: 'approved' });
    const unsaid = await part('WREN', 'WREN-SRC', { resistance: 470, tcr: null });
    const bigger = await part('LARK', 'LARK-SRC', { resistance: 470, approval: 'approved' });
    await part('KITE', 'KITE-STRANGER', { resistance: 470, approval: 'approved' });
    await catalogue.companyPartNumber('BW-R-2', [own, lesser, unsaid, bigger]);
    await catalogue.rebuild();
    const items = await alternatesOf(own);
    expect(items.map((item) => [item.part.manufacturerPartNumber, item.judgement, item.shortfalls])).toEqual([
      [
        'KITE-SRC',
        'lesser',
        [{ field: 'limitingElementVoltage', sense: 'worse', own: '75 V', alternate: '50 V' }],
      ],
      [
        'LARK-SRC',
        'lesser',
        [
          {
            field: 'landPattern',
            sense: 'different',
            own: 'rect-chip 1608 nominal',
            alternate: 'rect-chip 2012 nominal',
          },
        ],
      ],
      ['WREN-SRC', 'undecided', [{ field: 'tcr', sense: 'unknown', own: '100 ppm/K' }]],
    ]);
    expect(items.every(({ sameCompanyPartNumber }) => sameCompanyPartNumber)).toBe(true);
  });

  it('are compared by body where the datasheet names no land pattern', async () => {
    const own = await part('PETR', 'PETR-1', { resistance: 100 });
    await part('PEEP', 'PEEP-1', { resistance: 100 });
    await part('DOVE', 'DOVE-1', { resistance: 100 });
    await part('SKUA', 'SKUA-100', { resistance: 100 });
    const items = await alternatesOf(own);
    expect(numbersOf(items)).toEqual(['PEEP-1']);
    expect(items[0]?.differences).toEqual([
      { field: 'body.height', sense: 'different', own: '0.45 mm', alternate: '0.5 mm' },
    ]);
  });
});
