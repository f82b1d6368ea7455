import request from 'supertest';
import { abilityOf } from '../src/permissions/ability';
import { ROLES, type Role } from '../src/permissions/roles';
import { startApplication, type StartedApplication } from './support/application';
import type { TestPerson } from './support/people-builder';
import type { ProblemBody } from './support/problem-body';
import { type Route, routesOf } from './support/routes';

/** These end the session that walks; it signs in anew for each. */
const ENDS_SESSIONS = /sign-out/;

/** Where the request log hangs: it answers nothing. */
const LOGGING = ['/api', '/api/{*path}'];

describe('every route', () => {
  let application: StartedApplication;
  let routes: Route[];
  let people: Map<Role, TestPerson>;
  beforeAll(async () => {
    application = await startApplication();
    routes = routesOf(application.nest);
    people = new Map();
    for (const role of ROLES) people.set(role, await application.people.add(role));
  });
  afterAll(() => application.stop());

  /** Ids that nothing has: where a person is let in, nothing is found or the empty body refused. */
  const call = (route: Route, token?: string): request.Test => {
    const test = request(application.server)[route.method](route.path.replace(/:\w+/g, '999999999'));
    return token === undefined ? test : test.set('Authorization', `Bearer ${token}`);
  };

  it('is known to this walk', () => {
    const layers = (application.nest.getHttpAdapter().getInstance() as { router: { stack: Layer[] } }).router
      .stack;
    const registered = layers.flatMap(({ route }) =>
      route && !LOGGING.includes(route.path)
        ? route.stack.map(({ method }) => `${method} ${route.path}`)
        : [],
    );
    const known = routes.map(({ method, path }) => `${method} ${path}`);
    expect(known.length).toBeGreaterThan(30);
    expect(new Set(known)).toEqual(new Set(registered));
    expect(known).toHaveLength(registered.length);
  });

  it('has exactly one access decorator', () => {
    expect(routes.filter(({ access }) => access.kind === 'closed')).toEqual([]);
  });

  it('is public only where it must be', () => {
    const open = routes
      .filter(({ access }) => access.kind === 'public')
      .map(({ method, path }) => `${method} ${path}`);
    expect(open.sort()).toEqual([
      'get /api/health',
      'post /api/auth/password-resets',
      'post /api/auth/password-resets/redeem',
      'post /api/auth/refresh',
      'post /api/auth/sign-in',
      'post /api/auth/sign-out',
      'post /api/invitations/accept',
      'post /api/invitations/preview',
    ]);
  });

  it('refuses nobody in particular with 401, unless it is public', async () => {
    for (const route of routes) {
      const { status } = await call(route);
      if (route.access.kind === 'public') expect([route.path, status]).not.toEqual([route.path, 403]);
      else expect([route.method, route.path, status]).toEqual([route.method, route.path, 401]);
    }
  });

  it.each(ROLES)('lets the role %s in as the rules say', async (role) => {
    const person = people.get(role)!;
    const ability = abilityOf({ id: person.id, roles: [role] });
    let token = (await application.people.signInAs(person)).accessToken;
    for (const route of routes) {
      const { access } = route;
      if (access.kind !== 'ruled') continue;
      const answer = await call(route, token);
      const name = `${role}: ${route.method} ${route.path}`;
      if (access.actions.some((action) => ability.can(action, access.subject))) {
        expect([name, [401, 403, 500].includes(answer.status) ? answer.status : 'let in']).toEqual([
          name,
          'let in',
        ]);
      } else {
        expect([name, answer.status]).toEqual([name, 403]);
        expect((answer.body as ProblemBody).rule).toBe(`${access.actions.join(' or ')} ${access.subject}`);
        expect((answer.body as ProblemBody).detail.length).toBeGreaterThan(20);
      }
      if (ENDS_SESSIONS.test(route.path)) token = (await application.people.signInAs(person)).accessToken;
    }
  });
});

interface Layer {
  route?: { path: string; stack: { method: string }[] };
}
