import { startApplication, type StartedApplication } from './support/application';
import { type BuiltFamily, CatalogueBuilder } from './support/catalogue-builder';
import type { SignedInPerson } from './support/people-builder';
import type { ProblemBody } from './support/problem-body';
import { Readers } from '../src/database/readers';

interface Offer {
  id: number;
  version: number;
  inForce: boolean;
}

describe('offers', () => {
  let application: StartedApplication;
  let administrator: SignedInPerson;
  let purchasing: SignedInPerson;
  let engineer: SignedInPerson;
  let family: BuiltFamily;
  let catalogue: CatalogueBuilder;
  let supplierId: number;
  let made = 0;
  beforeAll(async () => {
    application = await startApplication();
    administrator = await application.people.signIn('administrator');
    purchasing = await application.people.signIn('purchasing');
    engineer = await application.people.signIn('component-engineer');
    const librarian = await application.people.add('librarian');
    catalogue = new CatalogueBuilder(application.nest, librarian.id);
    family = await catalogue.family({ code: 'SKUA', manufacturerId: await catalogue.manufacturer('NORVIK') });
    await catalogue.offer(await part());
    const suppliers = await engineer.get('/api/suppliers').expect(200);
    [{ id: supplierId }] = (suppliers.body as { items: [{ id: number }] }).items;
  });
  afterAll(() => application.stop());

  async function part(): Promise<number> {
    made += 1;
    const id = await catalogue.part({ family, number: `SKUA-${made}`, approval: 'approved' });
    await catalogue.rebuild();
    return id;
  }
  const day = (days: number): string => application.clock.timestampIn(days * 86_400).slice(0, 10);
  const terms = (change: object = {}): object => ({
    supplierId,
    packaging: 'T5',
    minimumOrder: 100,
    orderMultiple: 100,
    leadTimeDays: 14,
    validFrom: day(-1),
    validUntil: day(90),
    priceBreaks: [
      { quantity: 1000, unitPrice: 0.0069 },
      { quantity: 100, unitPrice: 0.0092 },
    ],
    reason: 'Quotation 4711',
    ...change,
  });
  const enter = async (partId: number, change: object = {}): Promise<Offer> =>
    (await purchasing.post('/api/offers', terms({ partId, ...change })).expect(201)).body as Offer;
  const priceOf = async (partId: number): Promise<unknown> =>
    ((await engineer.get(`/api/parts/${partId}`).expect(200)).body as { unitPrice?: number }).unitPrice;
  const trailOf = async (id: number): Promise<object[]> => {
    const answer = await administrator.get(`/api/audit?subjectType=Offer&subjectId=${id}`).expect(200);
    return (answer.body as { items: object[] }).items;
  };
  const state = async (): Promise<unknown> => {
    const readers = application.nest.get(Readers);
    return Promise.all(
      ['offers', 'offer_price_breaks', 'audit_entries', 'parts'].map((table) =>
        readers.select(`SELECT * FROM ${table}`),
      ),
    );
  };

  it('are entered, changed and ended, each with its entry in the trail', async () => {
    const partId = await part();
    const offer = await enter(partId);
    expect(offer).toMatchObject({
      inForce: true,
      version: 1,
      enteredBy: { id: purchasing.person.id },
      priceBreaks: [
        { quantity: 100, unitPrice: 0.0092 },
        { quantity: 1000, unitPrice: 0.0069 },
      ],
    });
    expect(await priceOf(partId)).toBe(0.0069);

    const change = terms({
      version: 1,
      reason: 'New price list',
      priceBreaks: [{ quantity: 100, unitPrice: 0.01 }],
    });
    const changed = await purchasing.put(`/api/offers/${offer.id}`, change).expect(200);
    expect(changed.body).toMatchObject({ version: 2, priceBreaks: [{ quantity: 100, unitPrice: 0.01 }] });
    expect(await priceOf(partId)).toBe(0.01);

    const ended = await purchasing
      .post(`/api/offers/${offer.id}/end`, { version: 2, reason: 'Supplier closed' })
      .expect(200);
    expect(ended.body).toMatchObject({ version: 3, inForce: false, endedAt: expect.any(String) as string });
    expect(await priceOf(partId)).toBeUndefined();

    const prices = ['100 at 0.0092 EUR', '1000 at 0.0069 EUR'];
    const [end, update, create] = await trailOf(offer.id);
    const actor = { actorId: purchasing.person.id, actorName: purchasing.person.name };
    expect(create).toMatchObject({
      ...actor,
      action: 'create',
      after: { part: `SKUA-${made}`, packaging: 'T5', minimumOrder: 100, prices },
      reason: 'Quotation 4711',
    });
    expect(create).not.toHaveProperty('before');
    expect(update).toMatchObject({
      ...actor,
      action: 'update',
      before: { prices },
      after: { prices: ['100 at 0.01 EUR'] },
      reason: 'New price list',
    });
    expect(end).toMatchObject({
      ...actor,
      action: 'end',
      before: { prices: ['100 at 0.01 EUR'] },
      after: { endedAt: expect.any(String) as string },
      reason: 'Supplier closed',
    });
  });

  it('count for a promotion while they are in force', async () => {
    const partId = await part();
    const offer = await enter(partId);
    const demand = async (): Promise<unknown> => {
      const answer = await engineer.get(`/api/parts/${partId}/transitions`).expect(200);
      const { approvalTransitions } = answer.body as {
        approvalTransitions: { to: string; demands: { name: string; met: boolean }[] }[];
      };
      return approvalTransitions
        .find(({ to }) => to === 'preferred')
        ?.demands.find(({ name }) => name === 'offer')?.met;
    };
    expect(await demand()).toBe(true);
    await purchasing.post(`/api/offers/${offer.id}/end`, { version: 1, reason: 'Gone' }).expect(200);
    expect(await demand()).toBe(false);
  });

  it('show their price in a search before the answer is given', async () => {
    const partId = await part();
    const found = async (): Promise<unknown> => {
      const search = { filters: { text: `SKUA-${made}` }, policy: 'none' };
      const answer = await engineer.post('/api/parts/search', search).expect(200);
      const { items } = answer.body as { items: { part: { id: number; unitPrice?: number } }[] };
      return items.find((item) => item.part.id === partId)?.part.unitPrice;
    };
    expect(await found()).toBeUndefined();
    await enter(partId);
    expect(await found()).toBe(0.0069);
  });

  it('are refused where they clash with the part, the suppliers or themselves, and nothing is kept', async () => {
    const partId = await part();
    const before = await state();
    const bad = { partId, supplierId: 999, packaging: 'T9', validUntil: day(-2), orderMultiple: 30 };
    const problem = (await purchasing.post('/api/offers', terms(bad)).expect(422)).body as ProblemBody;
    expect(problem.errors?.map(({ pointer }) => pointer)).toEqual([
      '/supplierId',
      '/packaging',
      '/validFrom',
      '/validUntil',
      '/minimumOrder',
      '/orderMultiple',
    ]);
    expect(problem.errors?.[1]?.message).toBe('It comes in T5.');
    await purchasing.post('/api/offers', terms({ partId: 999_999 })).expect(404);
    expect(await state()).toEqual(before);
  });

  it.each<[string, object, string]>([
    ['minimumOrder', { minimumOrder: 0 }, '/minimumOrder'],
    ['minimumOrder', { minimumOrder: 1.5 }, '/minimumOrder'],
    ['minimumOrder', { minimumOrder: 1e12 }, '/minimumOrder'],
    ['orderMultiple', { orderMultiple: '100' }, '/orderMultiple'],
    ['leadTimeDays', { leadTimeDays: -1 }, '/leadTimeDays'],
    ['validFrom', { validFrom: '2026-02-30' }, '/validFrom'],
    ['validUntil', { validUntil: null }, '/validUntil'],
    ['priceBreaks', { priceBreaks: [] }, '/priceBreaks'],
    ['priceBreaks', { priceBreaks: [{ quantity: 1, unitPrice: 0 }] }, '/priceBreaks/0/unitPrice'],
    ['priceBreaks', { priceBreaks: [{ quantity: 1, unitPrice: -1 }] }, '/priceBreaks/0/unitPrice'],
    [
      'priceBreaks',
      { priceBreaks: [{ quantity: 1, unitPrice: 1, currency: 'USD' }] },
      '/priceBreaks/0/currency',
    ],
    ['reason', { reason: ' ' }, '/reason'],
    ['an unknown field', { endedAt: '2026-01-01' }, '/endedAt'],
  ])('are refused for a bad %s: %j', async (_field, change, pointer) => {
    const before = await state();
    const problem = (await purchasing.post('/api/offers', terms({ partId: 1, ...change })).expect(400))
      .body as ProblemBody;
    expect([...new Set(problem.errors?.map((error) => error.pointer))]).toEqual([pointer]);
    expect(await state()).toEqual(before);
  });

  it('are changed only on the version that one saw, and not after they were ended', async () => {
    const offer = await enter(await part());
    const path = `/api/offers/${offer.id}`;
    await purchasing.put(path, terms({ version: 1, leadTimeDays: 20 })).expect(200);
    const before = await state();
    await purchasing.put(path, terms({ version: 1 })).expect(409);
    await purchasing.post(`${path}/end`, { version: 1, reason: 'r' }).expect(409);
    expect(await state()).toEqual(before);
    await purchasing.post(`${path}/end`, { version: 2, reason: 'r' }).expect(200);
    const problem = (await purchasing.put(path, terms({ version: 3 })).expect(422)).body as ProblemBody;
    expect(problem.detail).toContain('has been ended');
    await purchasing.post(`${path}/end`, { version: 3, reason: 'r' }).expect(422);
    await purchasing.put('/api/offers/999999', terms({ version: 1 })).expect(404);
  });

  it('are kept by purchasing alone', async () => {
    const offer = await enter(await part());
    for (const role of ['administrator', 'librarian', 'component-engineer', 'designer'] as const) {
      const person = await application.people.signIn(role);
      const answers = [
        await person.post('/api/offers', terms({ partId: 1 })),
        await person.put(`/api/offers/${offer.id}`, terms({ version: 1 })),
        await person.post(`/api/offers/${offer.id}/end`, { version: 1, reason: 'r' }),
      ];
      expect(answers.map(({ status, body }) => [status, (body as ProblemBody).rule])).toEqual([
        [403, 'create Offer'],
        [403, 'update Offer'],
        [403, 'end Offer'],
      ]);
    }
  });
});
