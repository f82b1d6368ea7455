import { startApplication, type StartedApplication } from './support/application';
import { type BuiltFamily, CatalogueBuilder } from './support/catalogue-builder';
import { catalogueState, rowsOf } from './support/catalogue-state';
import type { SignedInPerson } from './support/people-builder';
import type { ProblemBody } from './support/problem-body';

describe('what a promotion demands', () => {
  let application: StartedApplication;
  let catalogue: CatalogueBuilder;
  let engineer: SignedInPerson;
  let family: BuiltFamily;
  let rival: BuiltFamily;
  beforeAll(async () => {
    application = await startApplication();
    engineer = await application.people.signIn('component-engineer');
    const librarian = await application.people.add('librarian');
    catalogue = new CatalogueBuilder(application.nest, librarian.id);
    family = await catalogue.family({ code: 'SKUA', manufacturerId: await catalogue.manufacturer('NORVIK') });
    rival = await catalogue.family({ code: 'TEAL', manufacturerId: await catalogue.manufacturer('OSTVIK') });
  });
  afterAll(() => application.stop());

  const promote = (id: number, change: object = {}) =>
    engineer.post(`/api/parts/${id}/approval`, {
      to: 'preferred',
      reason: 'Best of its row',
      version: 1,
      ...change,
    });

  it('is named, all of it that is not met', async () => {
    const bare = await catalogue.family({
      code: 'WREN',
      manufacturerId: await catalogue.manufacturer('SUNDVIK'),
      datasheet: false,
    });
    const id = await catalogue.part({
      family: bare,
      number: 'WREN0603F1',
      approval: 'approved',
      supply: 'not-recommended',
    });
    await catalogue.rebuild();
    const before = await catalogueState(application.nest);
    const problem = (await promote(id).expect(422)).body as ProblemBody;
    expect(problem.errors).toEqual([
      { pointer: '/to', message: expect.stringContaining('No datasheet is on record') as string },
      { pointer: '/exception', message: expect.stringContaining('no second source') as string },
      {
        pointer: '/to',
        message: expect.stringContaining('not recommended for new designs, not active') as string,
      },
      { pointer: '/to', message: expect.stringContaining('No offer is in force') as string },
    ]);
    expect(await catalogueState(application.nest)).toEqual(before);

    const transitions = await engineer.get(`/api/parts/${id}/transitions`).expect(200);
    const [promotion] = (transitions.body as { approvalTransitions: object[] }).approvalTransitions;
    expect(promotion).toMatchObject({
      to: 'preferred',
      allowed: true,
      demands: [
        { name: 'datasheet', met: false },
        { name: 'second-source', met: false, field: 'exception' },
        { name: 'active-supply', met: false },
        { name: 'offer', met: false },
      ],
    });
  });

  it('counts no offer that is out of force, and no source that is not approved and active', async () => {
    const id = await catalogue.part({ family, number: 'SKUA0603FX', approval: 'approved' });
    const draft = await catalogue.part({ family: rival, number: 'TEAL0603FX', approval: 'draft' });
    const sister = await catalogue.part({ family, number: 'SKUA0603FY', approval: 'approved' });
    await catalogue.companyPartNumber('BW-R-X', [id, draft, sister]);
    await catalogue.offer(id, { from: '2025-01-01', until: '2025-12-31' });
    await catalogue.rebuild();
    const problem = (await promote(id).expect(422)).body as ProblemBody;
    expect(problem.errors?.map(({ pointer }) => pointer)).toEqual(['/exception', '/to']);
  });

  it('takes a stated exception in place of a second source, and keeps it in the history', async () => {
    const id = await catalogue.part({ family, number: 'SKUA0603FZ', approval: 'approved' });
    await catalogue.offer(id);
    await catalogue.rebuild();
    await promote(id).expect(422);
    const exception = 'Only Norvik trims to this value';
    await promote(id, { exception }).expect(200);
    expect(await rowsOf(application.nest, 'approval_history', id)).toEqual([
      expect.objectContaining({ to_approval: 'preferred', exception }),
    ]);
  });
});
