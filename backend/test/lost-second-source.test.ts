import type { Approval } from '@resistry/engineering/ratings/technology';
import { startApplication, type StartedApplication } from './support/application';
import { type BuiltFamily, CatalogueBuilder } from './support/catalogue-builder';
import { rowsOf } from './support/catalogue-state';
import { lettersTo } from './support/mail';
import type { SignedInPerson } from './support/people-builder';
import type { ProblemBody } from './support/problem-body';

describe('a preferred part that loses its second source', () => {
  let application: StartedApplication;
  let catalogue: CatalogueBuilder;
  let administrator: SignedInPerson;
  let engineer: SignedInPerson;
  let colleague: SignedInPerson;
  let purchasing: SignedInPerson;
  let family: BuiltFamily;
  let rival: BuiltFamily;
  let third: BuiltFamily;
  let made = 0;
  beforeAll(async () => {
    application = await startApplication();
    administrator = await application.people.signIn('administrator');
    engineer = await application.people.signIn('component-engineer');
    colleague = await application.people.signIn('component-engineer');
    purchasing = await application.people.signIn('purchasing');
    const librarian = await application.people.add('librarian');
    catalogue = new CatalogueBuilder(application.nest, librarian.id);
    family = await catalogue.family({ code: 'SKUA', manufacturerId: await catalogue.manufacturer('NORVIK') });
    rival = await catalogue.family({ code: 'TEAL', manufacturerId: await catalogue.manufacturer('OSTVIK') });
    third = await catalogue.family({ code: 'WREN', manufacturerId: await catalogue.manufacturer('SUNDVIK') });
  });
  afterAll(() => application.stop());

  /** A part with one approved source of another manufacturer beside it. */
  const pair = async (approval: Approval = 'preferred'): Promise<{ id: number; sourceId: number }> => {
    made += 1;
    const id = await catalogue.part({ family, number: `SKUA-${made}`, approval });
    const sourceId = await catalogue.part({ family: rival, number: `TEAL-${made}`, approval: 'approved' });
    await catalogue.companyPartNumber(`BW-R-${made}`, [id, sourceId]);
    await catalogue.offer(id);
    await catalogue.rebuild();
    return { id, sourceId };
  };
  const decide = (id: number, change: object) =>
    engineer.post(`/api/parts/${id}/approval`, { reason: 'Cracks when bent', version: 1, ...change });
  const supply = (id: number, change: object) =>
    purchasing.post(`/api/parts/${id}/supply`, { reason: 'Notice 12', version: 1, ...change });
  const reviewsOf = (id: number) =>
    rowsOf<{ cause: string; words: string; state: string; outcome: string | null }>(
      application.nest,
      'reviews',
      id,
    );

  it.each<[string, (sourceId: number) => Promise<unknown>]>([
    ['is withdrawn', (sourceId) => decide(sourceId, { to: 'withdrawn' }).expect(200)],
    [
      'is restricted',
      (sourceId) => decide(sourceId, { to: 'restricted', words: 'Indoors', scope: 'All' }).expect(200),
    ],
    ['is not recommended any more', (sourceId) => supply(sourceId, { to: 'not-recommended' }).expect(200)],
    ['is discontinued', (sourceId) => supply(sourceId, { to: 'discontinued' }).expect(200)],
  ])('is reviewed when that source %s', async (_how, change) => {
    const { id, sourceId } = await pair();
    await change(sourceId);
    expect(await reviewsOf(id)).toEqual([
      expect.objectContaining({ cause: 'lost-second-source', state: 'open' }),
    ]);
    expect((await engineer.get(`/api/parts/${id}`).expect(200)).body).toMatchObject({
      secondSource: false,
      openReviews: [{ cause: 'lost-second-source' }],
    });
  });

  it('names the source and the reason in the review and to the component engineers', async () => {
    const { id, sourceId } = await pair();
    await decide(sourceId, { to: 'withdrawn' }).expect(200);
    const [review] = await reviewsOf(id);
    expect(review?.words).toBe(`Its second source TEAL-${made} is now withdrawn: Cracks when bent`);
    await application.delivered();
    const letters = await lettersTo(administrator, colleague.person.email);
    const letter = letters.find(({ subject }) =>
      subject.startsWith(`SKUA-${made} (BW-R-${made}) has no second`),
    );
    expect(letter?.text).toContain('a review of it is open');
    expect(letter?.text).toContain(`/parts/${id}`);
  });

  it('is not reviewed while another source is left, nor where it is only approved', async () => {
    const { id, sourceId } = await pair();
    const otherId = await catalogue.part({ family: third, number: `WREN-${made}`, approval: 'approved' });
    await catalogue.addSource(`BW-R-${made}`, otherId);
    await catalogue.rebuild();
    await decide(sourceId, { to: 'withdrawn' }).expect(200);
    expect(await reviewsOf(id)).toEqual([]);
    await supply(otherId, { to: 'discontinued' }).expect(200);
    expect(await reviewsOf(id)).toHaveLength(1);

    const approved = await pair('approved');
    await decide(approved.sourceId, { to: 'withdrawn' }).expect(200);
    expect(await reviewsOf(approved.id)).toEqual([]);
  });

  it('opens one review, however often the source comes and goes', async () => {
    const { id, sourceId } = await pair();
    await supply(sourceId, { to: 'not-recommended' }).expect(200);
    await supply(sourceId, { to: 'active', version: 2 }).expect(200);
    await supply(sourceId, { to: 'discontinued', version: 3 }).expect(200);
    expect(await reviewsOf(id)).toHaveLength(1);
  });

  it('may stay preferred by a stated exception, which closes the review', async () => {
    const { id, sourceId } = await pair();
    const none = (await decide(id, { to: 'preferred' }).expect(422)).body as ProblemBody;
    expect(none.errors?.[0]).toMatchObject({ pointer: '/to' });
    await decide(sourceId, { to: 'withdrawn' }).expect(200);
    const transitions = await engineer.get(`/api/parts/${id}/transitions`).expect(200);
    expect((transitions.body as { approvalTransitions: object[] }).approvalTransitions[0]).toMatchObject({
      to: 'preferred',
      action: 'promote',
      allowed: true,
    });
    const bare = (await decide(id, { to: 'preferred' }).expect(422)).body as ProblemBody;
    expect(bare.errors?.map(({ pointer }) => pointer)).toEqual(['/exception']);
    const answer = await decide(id, { to: 'preferred', exception: 'Nobody else makes it' }).expect(200);
    expect(answer.body).toMatchObject({
      approval: 'preferred',
      openReviews: [],
      approvalHistory: [{ from: 'preferred', to: 'preferred', exception: 'Nobody else makes it' }],
    });
    expect(await reviewsOf(id)).toEqual([expect.objectContaining({ state: 'closed', outcome: 'preferred' })]);
  });

  it('may stay approved after it left active supply', async () => {
    const { id } = await pair('approved');
    await supply(id, { to: 'not-recommended' }).expect(200);
    const answer = await decide(id, { to: 'approved', version: 2 }).expect(200);
    expect(answer.body).toMatchObject({ approval: 'approved', supply: 'not-recommended', openReviews: [] });
    await decide(id, { to: 'approved', version: 3 }).expect(422);
  });
});
