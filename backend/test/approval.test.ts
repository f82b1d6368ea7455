import { AuditTrail } from '../src/audit/audit-trail';
import { StandingChanges } from '../src/parts/standing-changes';
import { startApplication, type StartedApplication } from './support/application';
import { type BuiltFamily, CatalogueBuilder } from './support/catalogue-builder';
import { catalogueState, rowsOf } from './support/catalogue-state';
import { lettersTo } from './support/mail';
import type { SignedInPerson } from './support/people-builder';
import type { ProblemBody } from './support/problem-body';

describe('changing the approval of a part', () => {
  let application: StartedApplication;
  let catalogue: CatalogueBuilder;
  let administrator: SignedInPerson;
  let engineer: SignedInPerson;
  let librarian: SignedInPerson;
  let family: BuiltFamily;
  let rival: BuiltFamily;
  let made = 0;
  beforeAll(async () => {
    application = await startApplication();
    administrator = await application.people.signIn('administrator');
    engineer = await application.people.signIn('component-engineer');
    librarian = await application.people.signIn('librarian');
    catalogue = new CatalogueBuilder(application.nest, librarian.person.id);
    family = await catalogue.family({ code: 'SKUA', manufacturerId: await catalogue.manufacturer('NORVIK') });
    rival = await catalogue.family({ code: 'TEAL', manufacturerId: await catalogue.manufacturer('OSTVIK') });
  });
  afterAll(() => application.stop());

  /** An approved, active part with a second source and an offer: all that a promotion demands. */
  const readyPart = async (): Promise<{ id: number; number: string; secondId: number }> => {
    made += 1;
    const number = `SKUA0603F${made}`;
    const id = await catalogue.part({ family, number, approval: 'approved' });
    const secondId = await catalogue.part({
      family: rival,
      number: `TEAL0603F${made}`,
      approval: 'approved',
    });
    await catalogue.companyPartNumber(`BW-R-${made}`, [id, secondId]);
    await catalogue.offer(id);
    await catalogue.rebuild();
    return { id, number, secondId };
  };
  const promote = (id: number, change: object = {}) =>
    engineer.post(`/api/parts/${id}/approval`, {
      to: 'preferred',
      reason: 'Best of its row',
      version: 1,
      ...change,
    });

  it('leaves the part, its history, an audit entry and a letter', async () => {
    const { id, number } = await readyPart();
    const answer = await promote(id).expect(200);
    expect(answer.body).toMatchObject({ id, approval: 'preferred', version: 2, secondSource: true });
    const changedBy = { id: engineer.person.id, name: engineer.person.name };
    const [step] = (answer.body as { approvalHistory: object[] }).approvalHistory;
    expect(step).toMatchObject({ from: 'approved', to: 'preferred', reason: 'Best of its row', changedBy });
    const audit = await administrator.get(`/api/audit?subjectType=Part&subjectId=${id}`).expect(200);
    expect((audit.body as { items: object[] }).items).toEqual([
      expect.objectContaining({
        action: 'promote',
        actorId: engineer.person.id,
        before: { approval: 'approved' },
        after: { approval: 'preferred' },
        reason: 'Best of its row',
      }),
    ]);
    await application.delivered();
    const [letter] = await lettersTo(administrator, librarian.person.email);
    expect(letter?.subject).toBe(`${number} (BW-R-${made}) is now preferred; it was approved`);
    expect(letter?.text).toContain(`Changed by ${engineer.person.name}`);
    expect(letter?.text).toContain(`/parts/${id}`);
  });

  it('takes a reason of several lines, and writes it so in the letter', async () => {
    const { id } = await readyPart();
    const reason = 'Two things:\n- cracks when bent\n- drifts';
    const answer = await engineer
      .post(`/api/parts/${id}/approval`, { to: 'withdrawn', reason, version: 1 })
      .expect(200);
    expect((answer.body as { approvalHistory: object[] }).approvalHistory[0]).toMatchObject({ reason });
    await application.delivered();
    const letters = await lettersTo(administrator, librarian.person.email);
    expect(
      letters.some(({ text }) => text.includes('  Two things:\n  - cracks when bent\n  - drifts\n')),
    ).toBe(true);
  });

  it('is not for whoever entered the part', async () => {
    const both = await application.people.signIn('component-engineer', 'librarian');
    const id = await catalogue.part({
      family,
      number: 'SKUA0603FO',
      enteredBy: both.person.id,
      approval: 'in-review',
    });
    await catalogue.rebuild();
    const before = await catalogueState(application.nest);
    const change = { to: 'approved', reason: 'Mine', version: 1 };
    const problem = (await both.post(`/api/parts/${id}/approval`, change).expect(403)).body as ProblemBody;
    expect(problem.rule).toBe('approve Part');
    expect(problem.detail).toContain('none that he or she entered');
    expect(await catalogueState(application.nest)).toEqual(before);
    const transitions = await both.get(`/api/parts/${id}/transitions`).expect(200);
    expect((transitions.body as { approvalTransitions: object[] }).approvalTransitions[0]).toMatchObject({
      to: 'approved',
      allowed: false,
      forbiddenBy: { rule: 'approve Part' },
    });
    await engineer.post(`/api/parts/${id}/approval`, change).expect(200);
  });

  it('is made on the version that one saw: the same again is stale', async () => {
    const { id } = await readyPart();
    const change = { to: 'withdrawn', reason: 'Cracks when bent', version: 1 };
    await engineer.post(`/api/parts/${id}/approval`, change).expect(200);
    const before = await catalogueState(application.nest);
    const problem = (await engineer.post(`/api/parts/${id}/approval`, change).expect(409))
      .body as ProblemBody;
    expect(problem.type).toBe('urn:resistry:problem:stale');
    expect(await catalogueState(application.nest)).toEqual(before);
  });

  it('goes to one of two who decide at the same time', async () => {
    const { id } = await readyPart();
    const other = await application.people.signIn('component-engineer');
    const answers = await Promise.all(
      [engineer, other, engineer, other].map((person) =>
        person.post(`/api/parts/${id}/approval`, { to: 'preferred', reason: 'Now', version: 1 }),
      ),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409, 409, 409]);
    expect(await rowsOf(application.nest, 'approval_history', id)).toHaveLength(1);
  });

  it('restricts with words and scope, which later words replace and an approval takes away', async () => {
    const { id } = await readyPart();
    const restrict = (version: number, fields: object) =>
      engineer.post(`/api/parts/${id}/approval`, {
        to: 'restricted',
        reason: 'Field returns',
        version,
        ...fields,
      });
    const problem = (await restrict(1, {}).expect(422)).body as ProblemBody;
    expect(problem.errors?.map(({ pointer }) => pointer)).toEqual(['/words', '/scope']);
    const words = 'Only below <b>50 V</b> & "dry"';
    const first = await restrict(1, { words, scope: 'Buoy loggers' }).expect(200);
    expect(first.body).toMatchObject({ restriction: { words, scope: 'Buoy loggers' } });
    const second = await restrict(2, { words: 'Only indoors', scope: 'All' }).expect(200);
    expect(second.body).toMatchObject({ restriction: { words: 'Only indoors', scope: 'All' }, version: 3 });
    const approved = await engineer
      .post(`/api/parts/${id}/approval`, { to: 'approved', reason: 'Cause found', version: 3 })
      .expect(200);
    expect(approved.body).not.toHaveProperty('restriction');
    expect(approved.body).toMatchObject({
      approvalHistory: [{ to: 'approved' }, { words: 'Only indoors' }, { words, scope: 'Buoy loggers' }],
    });
  });

  it('refuses fields that mean nothing for the change', async () => {
    const { id } = await readyPart();
    const problem = (await promote(id, { words: 'w', scope: 's' }).expect(422)).body as ProblemBody;
    expect(problem.errors?.map(({ pointer }) => pointer)).toEqual(['/words', '/scope']);
    const change = { to: 'withdrawn', reason: 'r', version: 1, exception: 'e' };
    const other = (await engineer.post(`/api/parts/${id}/approval`, change).expect(422)).body as ProblemBody;
    expect(other.errors?.map(({ pointer }) => pointer)).toEqual(['/exception']);
  });

  it.each([
    [{}, ['/reason', '/to', '/version']],
    [{ to: 'drafted', reason: 'r', version: 1 }, ['/to']],
    [{ to: 'approved', reason: ' ', version: 1 }, ['/reason']],
    [{ to: 'approved', reason: ' \n\t', version: 1 }, ['/reason']],
    [{ to: 'approved', reason: 'bell \u0007', version: 1 }, ['/reason']],
    [{ to: 'approved', reason: 'r'.repeat(1001), version: 1 }, ['/reason']],
    [{ to: 'approved', reason: 'r', version: '1' }, ['/version']],
    [{ to: 'approved', reason: 'r', version: 0 }, ['/version']],
    [{ to: 'approved', reason: 'r', version: 1.5 }, ['/version']],
    [{ to: 'approved', reason: null, version: 1 }, ['/reason']],
    [{ to: 'approved', reason: 'r', version: 1, enteredBy: 7 }, ['/enteredBy']],
    [{ to: ['approved'], reason: 'r', version: 1 }, ['/to']],
  ])('refuses %j', async (body, pointers) => {
    const before = await catalogueState(application.nest);
    const problem = (await engineer.post('/api/parts/1/approval', body).expect(400)).body as ProblemBody;
    expect([...new Set(problem.errors?.map(({ pointer }) => pointer))].sort()).toEqual(pointers);
    expect(await catalogueState(application.nest)).toEqual(before);
  });

  it('finds no part that is not there', async () => {
    await promote(999_999).expect(404);
  });

  it.each(['0x1', '1e0', '1.0', '-1', '0', '%201', '99999999999999999999', 'one'])(
    'takes %s for no id',
    async (id) => {
      await engineer
        .post(`/api/parts/${id}/approval`, { to: 'approved', reason: 'r', version: 1 })
        .expect(400);
      await engineer.get(`/api/parts/${id}`).expect(400);
    },
  );

  it('opens a review with a submission, which the decision closes, and tells both sides', async () => {
    const submitter = await application.people.signIn('librarian');
    const id = await catalogue.part({ family, number: 'SKUA0603FS' });
    await catalogue.rebuild();
    await submitter
      .post(`/api/parts/${id}/approval`, { to: 'in-review', reason: 'Read twice', version: 1 })
      .expect(200);
    const open = await engineer.get('/api/reviews').expect(200);
    expect(open.body).toMatchObject({
      total: 1,
      items: [
        { cause: 'submitted', words: 'Read twice', part: { id }, openedBy: { id: submitter.person.id } },
      ],
    });
    await application.delivered();
    expect((await lettersTo(administrator, engineer.person.email))[0]?.subject).toContain('is now in review');
    await engineer
      .post(`/api/parts/${id}/approval`, { to: 'approved', reason: 'Good', version: 2 })
      .expect(200);
    expect(await rowsOf(application.nest, 'reviews', id)).toEqual([
      expect.objectContaining({ state: 'closed', closed_by: engineer.person.id, outcome: 'approved' }),
    ]);
    await application.delivered();
    for (const person of [submitter, librarian]) {
      const [letter] = await lettersTo(administrator, person.person.email);
      expect(letter?.subject).toBe('SKUA0603FS is now approved; it was in review');
    }
    expect((await engineer.get('/api/reviews').expect(200)).body).toEqual({ total: 0, items: [] });
  });

  it('sends a part back to draft, which closes its review and tells who submitted it', async () => {
    const submitter = await application.people.signIn('librarian');
    const id = await catalogue.part({ family, number: 'SKUA0603FB', enteredBy: submitter.person.id });
    await catalogue.rebuild();
    const submit = (version: number) =>
      submitter.post(`/api/parts/${id}/approval`, { to: 'in-review', reason: 'Read twice', version });
    await submit(1).expect(200);
    const answer = await engineer
      .post(`/api/parts/${id}/approval`, { to: 'draft', reason: 'Page 3 says 50 V', version: 2 })
      .expect(200);
    expect(answer.body).toMatchObject({ approval: 'draft', openReviews: [] });
    expect(await rowsOf(application.nest, 'reviews', id)).toEqual([
      expect.objectContaining({ state: 'closed', outcome: 'draft' }),
    ]);
    const audit = await administrator.get(`/api/audit?subjectType=Part&subjectId=${id}`).expect(200);
    expect((audit.body as { items: object[] }).items[0]).toMatchObject({
      action: 'return',
      before: { approval: 'in-review' },
      after: { approval: 'draft' },
      reason: 'Page 3 says 50 V',
    });
    await application.delivered();
    const [letter] = await lettersTo(administrator, submitter.person.email);
    expect(letter?.subject).toBe('SKUA0603FB is now a draft; it was in review');
    await submit(3).expect(200);
  });

  it('gives the other source its second source, and tells of both before it answers', async () => {
    const { id, secondId } = await readyPart();
    await engineer
      .post(`/api/parts/${id}/approval`, { to: 'withdrawn', reason: 'r', version: 1 })
      .expect(200);
    const other = async (): Promise<unknown> =>
      (await engineer.get(`/api/parts/${secondId}`).expect(200)).body;
    expect(await other()).toMatchObject({ secondSource: false, version: 1 });
    const told: number[] = [];
    application.nest.get(StandingChanges, { strict: false }).subscribe(async (ids) => {
      await new Promise((resolve) => setImmediate(resolve));
      told.push(...ids);
    });
    await librarian
      .post(`/api/parts/${id}/approval`, { to: 'in-review', reason: 'r', version: 2 })
      .expect(200);
    expect(told).toEqual([id, secondId]);
    await engineer.post(`/api/parts/${id}/approval`, { to: 'approved', reason: 'r', version: 3 }).expect(200);
    expect(await other()).toMatchObject({ secondSource: true, version: 1 });
  });

  it('has not happened where any part of it fails', async () => {
    const { id } = await readyPart();
    const before = await catalogueState(application.nest);
    const failing = jest
      .spyOn(application.nest.get(AuditTrail), 'record')
      .mockRejectedValueOnce(new Error('no more room'));
    const answer = await promote(id).expect(500);
    expect(JSON.stringify(answer.body)).not.toContain('no more room');
    failing.mockRestore();
    expect(await catalogueState(application.nest)).toEqual(before);
    await promote(id).expect(200);
  });
});
