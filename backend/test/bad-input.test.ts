import request, { type Response } from 'supertest';
import { Secrets } from '../src/config/secrets';
import { Readers } from '../src/database/readers';
import { abilityOf } from '../src/permissions/ability';
import { ROLES, type Role } from '../src/permissions/roles';
import { startApplication, type StartedApplication } from './support/application';
import { CatalogueBuilder } from './support/catalogue-builder';
import { claimsOf, forge } from './support/forge-token';
import type { SignedInPerson, TestPerson } from './support/people-builder';
import type { ProblemBody } from './support/problem-body';
import { type Route, routesOf } from './support/routes';
import { spoil } from './support/spoil';
import { type Places, type WritingRoute, writingRoutes } from './support/writing-routes';

/** What counts attempts and visits changes by being asked; everything else must stay. */
const COUNTERS = ['failed_sign_ins', 'sessions', 'refresh_tokens', 'password_reset_requests'];

/** Fields that take any words: wildcards, quotes and markup in them are words. */
const TAKES_ANY_WORDS = /\/(reason|words|scope|name|text|newPassword)$/;

/** What no answer may let out: statements, files, stacks, hashes. */
const INSIDE = /SQLITE|SELECT |INSERT |node_modules|\/src\/|\.ts:|\.js:|\n\s+at |\$2b\$|\/tmp\//;

describe('bad input, on every route that writes or computes', () => {
  let application: StartedApplication;
  let people: Map<Role, SignedInPerson>;
  let accounts: Map<Role, TestPerson>;
  let places: Places;
  let routes: Route[];
  beforeAll(async () => {
    application = await startApplication();
    routes = routesOf(application.nest);
    people = new Map();
    accounts = new Map();
    for (const role of ROLES) {
      const person = await application.people.add(role);
      accounts.set(role, person);
      people.set(role, await application.people.signInAs(person));
    }
    places = await fill(application, people, accounts);
  });
  afterAll(() => application.stop());

  const pathOf = (route: WritingRoute): string =>
    route.path.replace(/:\w+/, () => String(route.parameter?.(places)));
  const send = (
    route: WritingRoute,
    token: string | undefined,
    body: string | object | undefined,
  ): request.Test => {
    const asked = request(application.server)[route.method](pathOf(route));
    if (token !== undefined) void asked.set('Authorization', `Bearer ${token}`);
    return typeof body === 'string'
      ? asked.set('Content-Type', 'application/json').send(body)
      : asked.send(body);
  };
  const tokenFor = ({ role }: WritingRoute): string | undefined => role && people.get(role)!.accessToken;
  const state = async (): Promise<Record<string, unknown[]>> => {
    // Letters that earlier requests have left are on their way; where they have got to is no change of this one.
    await application.delivered();
    const readers = application.nest.get(Readers);
    const tables = await readers.select<{ name: string }>(
      `SELECT name FROM sqlite_schema WHERE type = 'table' AND name NOT LIKE 'sqlite_%' AND name NOT LIKE 'part_text_%'`,
    );
    const kept = tables.map(({ name }) => name).filter((name) => !COUNTERS.includes(name));
    const rows = await Promise.all(kept.map((name) => readers.select(`SELECT * FROM ${name}`)));
    return Object.fromEntries(kept.map((name, at) => [name, rows[at] ?? []]));
  };
  const refusalOf = (answer: Response): ProblemBody => {
    expect(answer.get('Content-Type')).toContain('application/problem+json');
    expect(answer.text).not.toMatch(INSIDE);
    return answer.body as ProblemBody;
  };

  it('is tried on every route that there is', () => {
    const known = writingRoutes.map(({ method, path }) => `${method} ${path}`);
    const there = routes
      .filter(({ method }) => method !== 'get')
      .map(({ method, path }) => `${method} ${path}`);
    expect([...known].sort()).toEqual(there.sort());
  });

  describe.each(writingRoutes)('$method $path', (route) => {
    it('is refused without a token, and with one that is forged or has expired', async () => {
      if (route.role === undefined) return;
      const before = await state();
      const claims = claimsOf(people.get(route.role)!.accessToken);
      const key = application.nest.get(Secrets).accessTokenKey;
      const past = Math.floor(Date.UTC(2020, 0, 1) / 1000);
      const tokens = [
        undefined,
        forge({ ...claims, iat: past, exp: past + 600 }, key),
        forge(claims, 'x'.repeat(64)),
        'not.a.token',
      ];
      for (const token of tokens) {
        const answer = await send(route, token, route.body);
        expect([token, answer.status]).toEqual([token, 401]);
        refusalOf(answer);
      }
      expect(await state()).toEqual(before);
    });

    it('is refused to whoever has no role for it, with the rule named', async () => {
      const access = routes.find(
        ({ method, path }) => method === route.method && path === route.path,
      )?.access;
      if (access?.kind !== 'ruled') return;
      const before = await state();
      for (const [role, person] of people) {
        const ability = abilityOf({ id: person.person.id, roles: [role] });
        if (access.actions.some((action) => ability.can(action, access.subject))) continue;
        const answer = await send(route, person.accessToken, route.body);
        expect([role, answer.status]).toEqual([role, 403]);
        expect(refusalOf(answer).rule).toBe(`${access.actions.join(' or ')} ${access.subject}`);
      }
      expect(await state()).toEqual(before);
    });

    it('refuses whatever is wrong with a field, naming it, and nothing changes', async () => {
      if (route.body === undefined) return;
      const before = await state();
      for (const spoilt of spoil(route.body)) {
        if (!spoilt.certain && TAKES_ANY_WORDS.test(spoilt.pointer)) continue;
        const answer = await send(route, tokenFor(route), spoilt.body);
        if (!spoilt.certain) {
          // Whether it is impossible, unknown or only unusual is for the catalogue and the physics to say; never a failure.
          expect([spoilt.what, [200, 400, 401, 404, 409, 422].includes(answer.status)]).toEqual([
            spoilt.what,
            true,
          ]);
          if (answer.status >= 400) refusalOf(answer);
          continue;
        }
        expect([spoilt.what, answer.status]).toEqual([spoilt.what, 400]);
        // A body that is no object at all has no field to be named.
        const pointers = refusalOf(answer).errors?.map(({ pointer }) => pointer) ?? [];
        const named =
          spoilt.pointer === '' ||
          pointers.some(
            (pointer) => spoilt.pointer.startsWith(pointer) || pointer.startsWith(spoilt.pointer),
          );
        expect([spoilt.what, pointers, named]).toEqual([spoilt.what, pointers, true]);
      }
      expect(await state()).toEqual(before);
    });

    it('is refused on a version that is not the present one', async () => {
      if (route.body === undefined || !('version' in route.body)) return;
      const before = await state();
      const answer = await send(route, tokenFor(route), { ...route.body, version: 4711 });
      expect(answer.status).toBe(409);
      expect(refusalOf(answer).type).toBe('urn:resistry:problem:stale');
      expect(await state()).toEqual(before);
    });

    it('takes what is right, so that the refusals mean something', async () => {
      const answer = await send(route, tokenFor(route), route.body);
      expect([answer.status, answer.status === route.ok ? '' : answer.text]).toEqual([route.ok, '']);
    });
  });
});

/** A part with an offer, somebody to be changed, an invitation and a second sign-in. */
async function fill(
  application: StartedApplication,
  people: Map<Role, SignedInPerson>,
  accounts: Map<Role, TestPerson>,
): Promise<Places> {
  const librarian = people.get('librarian')!;
  const catalogue = new CatalogueBuilder(application.nest, librarian.person.id);
  const family = await catalogue.family({
    code: 'SKUA',
    manufacturerId: await catalogue.manufacturer('NORVIK'),
  });
  const part = await catalogue.part({ family, number: 'SKUA-1', approval: 'approved' });
  const offer = await catalogue.offer(part);
  await catalogue.rebuild();
  const user = (await application.people.add('designer')).id;
  const invited = await people
    .get('administrator')!
    .post('/api/invitations', { email: 'guest@brackwater.example.com', roles: ['designer'] })
    .expect(201);
  await application.people.signInAs(accounts.get('librarian')!);
  const sessions = await librarian.get('/api/account/sessions').expect(200);
  const other = (sessions.body as { items: { id: string; current: boolean }[] }).items.find(
    ({ current }) => !current,
  );
  return { part, offer, user, invitation: (invited.body as { id: string }).id, session: other?.id ?? '' };
}
