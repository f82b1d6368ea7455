import type { Approval, SupplyStatus } from '@resistry/engineering/ratings/technology';
import { approvals, supplyStatuses } from '@resistry/engineering/ratings/technology';
import request from 'supertest';
import { type Role, ROLES } from '../src/permissions/roles';
import { startApplication, type StartedApplication } from './support/application';
import { CatalogueBuilder } from './support/catalogue-builder';
import { catalogueState } from './support/catalogue-state';
import type { SignedInPerson } from './support/people-builder';
import type { ProblemBody } from './support/problem-body';

/**
 * Who makes what of which, by hand from the product's words: a librarian submits and may take that back, a component engineer
 * decides, only an approved part is promoted, and what was withdrawn begins again with a review.
 */
const DECIDED: Record<Approval, string> = {
  draft:
    'in-review:librarian approved:component-engineer restricted:component-engineer withdrawn:component-engineer',
  'in-review':
    'approved:component-engineer restricted:component-engineer withdrawn:component-engineer draft:component-engineer',
  approved: 'preferred:component-engineer restricted:component-engineer withdrawn:component-engineer',
  preferred: 'approved:component-engineer restricted:component-engineer withdrawn:component-engineer',
  restricted: 'approved:component-engineer restricted:component-engineer withdrawn:component-engineer',
  withdrawn: 'in-review:librarian',
};
const DOES: Record<string, { role: Role; also?: Role; rule: string }> = {
  draft: { role: 'component-engineer', also: 'librarian', rule: 'return Part' },
  'in-review': { role: 'librarian', rule: 'submit Part' },
  approved: { role: 'component-engineer', rule: 'approve Part' },
  preferred: { role: 'component-engineer', rule: 'promote Part' },
  restricted: { role: 'component-engineer', rule: 'restrict Part' },
  withdrawn: { role: 'component-engineer', rule: 'withdraw Part' },
};
const ANY_OF_THEM = 'return or submit or approve or promote or restrict or withdraw Part';

const mayMake = (role: Role, to: string): boolean => DOES[to]!.role === role || DOES[to]!.also === role;

/** Purchasing may write down whatever a vendor says; only the same again says nothing, but for another last order date. */
const SUPPLIED = (from: SupplyStatus, to: SupplyStatus): boolean => from !== to || to === 'last-time-buy';

describe('every change of a part’s standing', () => {
  let application: StartedApplication;
  let catalogue: CatalogueBuilder;
  let people: Map<Role, SignedInPerson>;
  let partId: number;
  beforeAll(async () => {
    application = await startApplication();
    const librarian = await application.people.add('librarian');
    people = new Map();
    for (const role of ROLES) people.set(role, await application.people.signIn(role));
    catalogue = new CatalogueBuilder(application.nest, librarian.id);
    const family = await catalogue.family({
      code: 'SKUA',
      manufacturerId: await catalogue.manufacturer('NORVIK'),
    });
    partId = await catalogue.part({ family, number: 'SKUA0603F4701' });
    await catalogue.offer(partId);
    await catalogue.rebuild();
  });
  afterAll(() => application.stop());

  const versionNow = async (): Promise<number> =>
    ((await people.get('designer')!.get(`/api/parts/${partId}`).expect(200)).body as { version: number })
      .version;

  /** Everything that a transition could demand is given, so that only rules and states refuse. */
  const approvalForm = (to: string, version: number): object => ({
    to,
    version,
    reason: 'Checked against its datasheet',
    ...(to === 'restricted' && { words: 'Not in pulses.', scope: 'Buoy loggers' }),
    ...(to === 'preferred' && { exception: 'Nobody else makes it' }),
  });

  describe.each(ROLES)('by the role %s', (role) => {
    it.each(approvals)('of approval, from %s', async (from) => {
      for (const to of Object.keys(DOES)) {
        await catalogue.stand(partId, from, 'active');
        const version = await versionNow();
        const before = await catalogueState(application.nest);
        const answer = await people
          .get(role)!
          .post(`/api/parts/${partId}/approval`, approvalForm(to, version));
        const follows = DECIDED[from].split(' ').some((entry) => entry.startsWith(`${to}:`));
        const expected = !mayMake(role, to) ? 403 : follows ? 200 : 422;
        expect([from, to, answer.status]).toEqual([from, to, expected]);
        if (expected === 200) {
          expect(answer.body).toMatchObject({ approval: to, version: version + 1 });
          continue;
        }
        expect(await catalogueState(application.nest)).toEqual(before);
        const problem = answer.body as ProblemBody;
        if (expected === 422) expect(problem.errors).toEqual([expect.objectContaining({ pointer: '/to' })]);
        else {
          const decides = role === 'librarian' || role === 'component-engineer';
          expect(problem.rule).toBe(decides ? DOES[to]!.rule : ANY_OF_THEM);
        }
      }
    });

    it.each(supplyStatuses)('of supply, from %s', async (from) => {
      for (const to of supplyStatuses) {
        await catalogue.stand(partId, 'approved', from);
        const version = await versionNow();
        const before = await catalogueState(application.nest);
        const form = {
          to,
          version,
          reason: 'Vendor notice 12',
          ...(to === 'last-time-buy' && { lastOrderDate: '2099-06-30' }),
        };
        const answer = await people.get(role)!.post(`/api/parts/${partId}/supply`, form);
        const expected = role !== 'purchasing' ? 403 : SUPPLIED(from, to) ? 200 : 422;
        expect([from, to, answer.status]).toEqual([from, to, expected]);
        if (expected === 200) {
          expect(answer.body).toMatchObject({ supply: to, version: version + 1 });
          continue;
        }
        expect(await catalogueState(application.nest)).toEqual(before);
        if (expected === 403) expect((answer.body as ProblemBody).rule).toBe('set-supply-status Part');
      }
    });
  });

  it('is refused to whoever is not signed in', async () => {
    const before = await catalogueState(application.nest);
    for (const path of ['approval', 'supply']) {
      await request(application.server)
        .post(`/api/parts/${partId}/${path}`)
        .send(approvalForm('approved', 1))
        .expect(401);
    }
    expect(await catalogueState(application.nest)).toEqual(before);
  });

  it('is told beforehand: transitions say what the doors do', async () => {
    for (const role of ROLES) {
      for (const from of approvals) {
        await catalogue.stand(partId, from, 'active');
        const answer = await people.get(role)!.get(`/api/parts/${partId}/transitions`).expect(200);
        const body = answer.body as {
          approvalTransitions: { to: string; allowed: boolean; forbiddenBy?: { rule: string } }[];
          supplyTransitions: { to: string; allowed: boolean }[];
        };
        const told = body.approvalTransitions.map(({ to, allowed, forbiddenBy }) => [
          to,
          allowed,
          forbiddenBy?.rule,
        ]);
        const expected = DECIDED[from].split(' ').map((entry) => {
          const [to = ''] = entry.split(':');
          return [to, mayMake(role, to), mayMake(role, to) ? undefined : DOES[to]!.rule];
        });
        expect([role, from, told]).toEqual([role, from, expected]);
        expect(body.supplyTransitions.map(({ to, allowed }) => [to, allowed])).toEqual(
          ['not-recommended', 'last-time-buy', 'discontinued'].map((to) => [to, role === 'purchasing']),
        );
      }
    }
  });
});
