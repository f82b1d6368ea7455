import request from 'supertest';
import { startApplication, type StartedApplication } from './support/application';

interface TableBody {
  roles: string[];
  rows: { role: string; action: string; subject: string; conditional: boolean; sentence: string }[];
}

describe('the table of who may do what', () => {
  let application: StartedApplication;
  beforeAll(async () => {
    application = await startApplication();
  });
  afterAll(() => application.stop());

  it('shows administrators every rule with its sentence', async () => {
    const administrator = await application.people.signIn('administrator');
    const { roles, rows } = (await administrator.get('/api/permissions').expect(200)).body as TableBody;
    expect(roles).toHaveLength(5);
    const promoting = rows.filter(({ action, subject }) => action === 'promote' && subject === 'Part');
    expect(promoting).toEqual([
      {
        role: 'component-engineer',
        action: 'promote',
        subject: 'Part',
        conditional: true,
        sentence: 'Only a component engineer promotes a part to preferred, and none that he or she entered.',
      },
    ]);
    const readers = rows
      .filter(({ action, subject }) => action === 'read' && subject === 'Part')
      .map(({ role }) => role);
    expect(readers).toEqual(roles);
  });

  it('is for administrators', async () => {
    await (await application.people.signIn('component-engineer')).get('/api/permissions').expect(403);
    await request(application.server).get('/api/permissions').expect(401);
  });
});
