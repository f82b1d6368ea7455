import request from 'supertest';
import { AuditTrail } from '../src/audit/audit-trail';
import { SYSTEM } from '../src/audit/actor';
import { Writer } from '../src/database/writer';
import { startApplication, type StartedApplication } from './support/application';
import type { SignedInPerson } from './support/people-builder';

interface Entry {
  id: number;
  action: string;
  subjectId: string;
  reason?: string;
}
interface Page {
  items: Entry[];
  next?: number;
}

describe('the audit trail', () => {
  let application: StartedApplication;
  let administrator: SignedInPerson;
  let writer: Writer;
  beforeAll(async () => {
    application = await startApplication();
    administrator = await application.people.signIn('administrator');
    writer = application.nest.get(Writer);
    const audit = application.nest.get(AuditTrail);
    const actor = administrator.person;
    for (let number = 1; number <= 7; number += 1) {
      await writer.transaction((transaction) =>
        audit.record(transaction, {
          actor: number % 2 === 0 ? SYSTEM : actor,
          action: number === 7 ? 'withdraw' : 'approve',
          subjectType: 'Part',
          subjectId: number,
          before: { approval: 'in-review' },
          after: { approval: 'approved' },
          reason: number === 3 ? 'holds 100 % of 50_ppm "as built"' : 'checked',
        }),
      );
      application.clock.forward(24 * 3600);
    }
  });
  afterAll(() => application.stop());

  const read = async (query: string): Promise<Page> =>
    (await administrator.get(`/api/audit?subjectType=Part&${query}`).expect(200)).body as Page;
  const subjects = async (query: string): Promise<string[]> =>
    (await read(query)).items.map(({ subjectId }) => subjectId);

  it('shows who changed what, newest first', async () => {
    const { items, next } = await read('');
    expect(items.map(({ subjectId }) => subjectId)).toEqual(['7', '6', '5', '4', '3', '2', '1']);
    expect(next).toBeUndefined();
    expect(items[0]).toEqual({
      id: expect.any(Number) as number,
      recordedAt: expect.stringMatching(/^\d{4}-\d\d-\d\dT\d\d:\d\d:\d\d\.\d{3}Z$/) as string,
      actorId: administrator.person.id,
      actorName: administrator.person.name,
      action: 'withdraw',
      subjectType: 'Part',
      subjectId: '7',
      before: { approval: 'in-review' },
      after: { approval: 'approved' },
      reason: 'checked',
    });
    expect(items[1]).toMatchObject({ actorName: 'Resistry' });
    expect(items[1]).not.toHaveProperty('actorId');
  });

  it('is narrowed by subject, actor, action and text, in which every character means itself', async () => {
    expect(await subjects('subjectId=4')).toEqual(['4']);
    expect(await subjects(`actor=${administrator.person.id}`)).toEqual(['7', '5', '3', '1']);
    expect(await subjects('action=withdraw')).toEqual(['7']);
    expect(await subjects(`text=${encodeURIComponent('100 %')}`)).toEqual(['3']);
    expect(await subjects('text=50_PPM')).toEqual(['3']);
    expect(await subjects(`text=${encodeURIComponent('"AS')}`)).toEqual(['3']);
    expect(await subjects('text=%25')).toEqual(['3']);
    expect(await subjects(`text=${encodeURIComponent("' OR 1=1 --")}`)).toEqual([]);
    expect(await subjects('text=resistry')).toEqual(['6', '4', '2']);
  });

  it('is narrowed by time, whatever zone it is given in', async () => {
    const { items } = await read('');
    const third = new Date((items[4] as Entry & { recordedAt: string }).recordedAt);
    const inAnotherZone = new Date(third.getTime() + 2 * 3600_000).toISOString().replace('Z', '+02:00');
    expect(await subjects(`from=${encodeURIComponent(inAnotherZone)}`)).toEqual(['7', '6', '5', '4', '3']);
    expect(await subjects(`to=${encodeURIComponent(inAnotherZone)}`)).toEqual(['2', '1']);
  });

  it('comes by pages that a new entry does not shift', async () => {
    const first = await read('limit=3');
    expect(first.items.map(({ subjectId }) => subjectId)).toEqual(['7', '6', '5']);
    const second = await read(`limit=3&before=${first.next}`);
    expect(second.items.map(({ subjectId }) => subjectId)).toEqual(['4', '3', '2']);
    const third = await read(`limit=3&before=${second.next}`);
    expect(third.items.map(({ subjectId }) => subjectId)).toEqual(['1']);
    expect(third.next).toBeUndefined();
  });

  it.each([
    'limit=0',
    'limit=201',
    'limit=1e9',
    'limit=',
    'from=yesterday',
    'from=2026-02-30',
    'before=-1',
    'actor=x',
    'sort=id',
  ])('refuses %s', async (query) => {
    await administrator.get(`/api/audit?${query}`).expect(400);
  });

  it.each([
    `UPDATE audit_entries SET reason = 'other'`,
    `DELETE FROM audit_entries`,
    `INSERT OR REPLACE INTO audit_entries SELECT * FROM audit_entries`,
    `REPLACE INTO audit_entries (id, recorded_at, actor_name, action, subject_type, subject_id)
      SELECT id, recorded_at, 'somebody', action, subject_type, subject_id FROM audit_entries`,
    `INSERT INTO audit_entries (id, recorded_at, actor_name, action, subject_type, subject_id) SELECT id, recorded_at,
      actor_name, action, subject_type, subject_id FROM audit_entries WHERE TRUE ON CONFLICT DO UPDATE SET reason = 'other'`,
  ])('cannot be edited: %s', async (sql) => {
    const before = await read('');
    const edit = writer.transaction((transaction) => writer.run(transaction, sql));
    await expect(edit).rejects.toMatchObject({
      parent: { message: expect.stringContaining('audit entries cannot be') as string },
    });
    expect(await read('')).toEqual(before);
  });

  it('says nothing of a change that was rolled back', async () => {
    const audit = application.nest.get(AuditTrail);
    await expect(
      writer.transaction(async (transaction) => {
        await audit.record(transaction, {
          actor: SYSTEM,
          action: 'approve',
          subjectType: 'Part',
          subjectId: 99,
        });
        throw new Error('no');
      }),
    ).rejects.toThrow('no');
    expect(await subjects('subjectId=99')).toEqual([]);
  });

  it('is for administrators', async () => {
    await (
      await application.people.signIn('designer', 'librarian', 'purchasing', 'component-engineer')
    )
      .get('/api/audit')
      .expect(403);
    await request(application.server).get('/api/audit').expect(401);
  });
});
