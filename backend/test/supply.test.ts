import { startApplication, type StartedApplication } from './support/application';
import { type BuiltFamily, CatalogueBuilder } from './support/catalogue-builder';
import { catalogueState, rowsOf } from './support/catalogue-state';
import { lettersTo } from './support/mail';
import type { SignedInPerson } from './support/people-builder';
import type { ProblemBody } from './support/problem-body';

const DAY_SECONDS = 24 * 3600;

describe('changing the supply status of a part', () => {
  let application: StartedApplication;
  let catalogue: CatalogueBuilder;
  let administrator: SignedInPerson;
  let purchasing: SignedInPerson;
  let engineer: SignedInPerson;
  let family: BuiltFamily;
  let today: string;
  let made = 0;
  beforeAll(async () => {
    application = await startApplication();
    today = application.clock.today();
    administrator = await application.people.signIn('administrator');
    purchasing = await application.people.signIn('purchasing');
    engineer = await application.people.signIn('component-engineer');
    const librarian = await application.people.add('librarian');
    catalogue = new CatalogueBuilder(application.nest, librarian.id);
    family = await catalogue.family({ code: 'SKUA', manufacturerId: await catalogue.manufacturer('NORVIK') });
  });
  afterAll(() => application.stop());

  const part = async (approval: 'draft' | 'approved' | 'preferred' = 'preferred'): Promise<number> => {
    made += 1;
    const id = await catalogue.part({ family, number: `SKUA0603F${made}`, approval });
    await catalogue.rebuild();
    return id;
  };
  const set = (id: number, to: string, version: number, fields: object = {}) =>
    purchasing.post(`/api/parts/${id}/supply`, { to, version, reason: 'Vendor notice 12', ...fields });
  const daysFromToday = (days: number): string =>
    application.clock.timestampIn(days * DAY_SECONDS).slice(0, 10);

  it('ends the life of a preferred part: last-time buy, review, letters, then discontinued', async () => {
    const id = await part();
    const lastOrderDate = daysFromToday(90);
    const answer = await set(id, 'last-time-buy', 1, { lastOrderDate }).expect(200);
    expect(answer.body).toMatchObject({
      supply: 'last-time-buy',
      lastOrderOn: lastOrderDate,
      approval: 'preferred',
      version: 2,
      supplyHistory: [
        { from: 'active', to: 'last-time-buy', lastOrderOn: lastOrderDate, reason: 'Vendor notice 12' },
      ],
      openReviews: [{ cause: 'left-active-supply', openedBy: { id: purchasing.person.id } }],
    });
    const audit = await administrator.get(`/api/audit?subjectType=Part&subjectId=${id}`).expect(200);
    expect(audit.body).toMatchObject({
      items: [
        {
          action: 'set-supply-status',
          before: { supply: 'active' },
          after: { supply: 'last-time-buy', lastOrderOn: lastOrderDate },
        },
      ],
    });
    await application.delivered();
    const [letter] = await lettersTo(administrator, engineer.person.email);
    expect(letter?.subject).toBe(`SKUA0603F${made} is now a last-time buy in supply; it was active`);
    expect(letter?.text).toContain('a review of it is open');

    await set(id, 'discontinued', 2).expect(200);
    expect(await rowsOf(application.nest, 'reviews', id)).toHaveLength(1);
    const again = await set(id, 'active', 3).expect(200);
    expect(again.body).not.toHaveProperty('lastOrderOn');
    expect(again.body).toMatchObject({ openReviews: [{ cause: 'left-active-supply' }] });
    await set(id, 'not-recommended', 4).expect(200);
    expect(await rowsOf(application.nest, 'reviews', id)).toHaveLength(1);
  });

  it('takes the part out of what Find shows by itself, before it answers', async () => {
    const id = await part();
    const found = async (): Promise<number[]> => {
      const search = { filters: { text: `SKUA0603F${made}` }, policy: 'none' };
      const answer = await engineer.post('/api/parts/search', search).expect(200);
      return (answer.body as { items: { part: { id: number } }[] }).items.map(
        ({ part: { id: partId } }) => partId,
      );
    };
    expect(await found()).toContain(id);
    await set(id, 'discontinued', 1).expect(200);
    expect(await found()).not.toContain(id);
    await set(id, 'active', 2).expect(200);
    expect(await found()).toContain(id);
  });

  it('opens no review of a draft and sends no letter', async () => {
    const id = await part('draft');
    await application.delivered();
    const before = await lettersTo(administrator, engineer.person.email);
    await set(id, 'discontinued', 1).expect(200);
    await application.delivered();
    expect(await rowsOf(application.nest, 'reviews', id)).toEqual([]);
    expect(await lettersTo(administrator, engineer.person.email)).toHaveLength(before.length);
  });

  it('demands the last order date of a last-time buy, which must not have passed', async () => {
    const id = await part();
    const before = await catalogueState(application.nest);
    const missing = (await set(id, 'last-time-buy', 1).expect(422)).body as ProblemBody;
    expect(missing.errors).toEqual([
      { pointer: '/lastOrderDate', message: 'A last-time buy needs its last order date.' },
    ]);
    const passed = await set(id, 'last-time-buy', 1, { lastOrderDate: daysFromToday(-1) }).expect(422);
    expect((passed.body as ProblemBody).errors?.[0]?.message).toContain('has passed');
    expect(await catalogueState(application.nest)).toEqual(before);
    await set(id, 'last-time-buy', 1, { lastOrderDate: today }).expect(200);
    const later = await set(id, 'last-time-buy', 2, { lastOrderDate: daysFromToday(30) }).expect(200);
    expect(later.body).toMatchObject({ lastOrderOn: daysFromToday(30) });
  });

  it('keeps the last order date of a discontinued part only where it has passed', async () => {
    const id = await part();
    await set(id, 'last-time-buy', 1, { lastOrderDate: daysFromToday(30) }).expect(200);
    const early = await set(id, 'discontinued', 2).expect(200);
    expect(early.body).not.toHaveProperty('lastOrderOn');
    await set(id, 'last-time-buy', 3, { lastOrderDate: today }).expect(200);
    const late = await set(id, 'discontinued', 4).expect(200);
    expect(late.body).toMatchObject({ lastOrderOn: today });
    const future = await set(await part(), 'discontinued', 1, { lastOrderDate: daysFromToday(1) }).expect(
      422,
    );
    expect((future.body as ProblemBody).errors?.[0]?.pointer).toBe('/lastOrderDate');
    const known = await set(await part(), 'discontinued', 1, { lastOrderDate: '2026-01-31' }).expect(200);
    expect(known.body).toMatchObject({ lastOrderOn: '2026-01-31' });
  });

  it.each(['active', 'not-recommended'])('refuses a last order date of a part that is %s', async (to) => {
    const id = await part();
    await set(id, 'last-time-buy', 1, { lastOrderDate: daysFromToday(9) }).expect(200);
    const problem = (await set(id, to, 2, { lastOrderDate: daysFromToday(9) }).expect(422))
      .body as ProblemBody;
    expect(problem.errors?.[0]?.pointer).toBe('/lastOrderDate');
  });

  it.each(['2026-02-30', '30.6.2027', '2027-6-1', '2027-06-30T12:00:00Z', 20270630, ''])(
    'refuses the day %j',
    async (lastOrderDate) => {
      const problem = (await set(1, 'last-time-buy', 1, { lastOrderDate }).expect(400)).body as ProblemBody;
      expect([...new Set(problem.errors?.map(({ pointer }) => pointer))]).toEqual(['/lastOrderDate']);
    },
  );

  it('is made on the version that one saw', async () => {
    const id = await part();
    await set(id, 'discontinued', 1).expect(200);
    const before = await catalogueState(application.nest);
    await set(id, 'discontinued', 1).expect(409);
    expect(await catalogueState(application.nest)).toEqual(before);
  });

  it('takes away the second source that the part was for another', async () => {
    const other = await catalogue.family({
      code: 'TEAL',
      manufacturerId: await catalogue.manufacturer('OSTVIK'),
    });
    const first = await part();
    const second = await catalogue.part({ family: other, number: 'TEAL0603F1', approval: 'approved' });
    await catalogue.companyPartNumber('BW-R-1', [first, second]);
    await catalogue.rebuild();
    const hasSecond = async (): Promise<unknown> =>
      ((await engineer.get(`/api/parts/${first}`).expect(200)).body as { secondSource: boolean })
        .secondSource;
    expect(await hasSecond()).toBe(true);
    await set(second, 'not-recommended', 1).expect(200);
    expect(await hasSecond()).toBe(false);
  });
});
