import { join } from 'node:path';
import request from 'supertest';
import { REPOSITORY_ROOT } from '../src/config/environment';
import type { BindValues } from '../src/database/bind-values';
import { Readers } from '../src/database/readers';
import { Writer } from '../src/database/writer';
import { rebuildDerivedColumns } from '../src/parts/derived-columns';
import { expandParts } from '../src/seed/expand-parts';
import { readSeedData } from '../src/seed/seed-data';
import { startApplication, type StartedApplication } from './support/application';

const ACCOUNTS = ['librarian', 'engineer', 'designer', 'purchasing', 'admin'];

describe('the demonstration', () => {
  let application: StartedApplication;
  let today: string;
  beforeAll(async () => {
    application = await startApplication({ seed: 'demo' });
    today = application.clock.timestamp().slice(0, 10);
  });
  afterAll(() => application.stop());

  const select = <Row extends object>(sql: string, bind: BindValues = {}): Promise<Row[]> =>
    application.nest.get(Readers).select<Row>(sql, bind);
  const count = async (from: string, bind: BindValues = {}): Promise<number> =>
    (await select<{ n: number }>(`SELECT count(*) AS n FROM ${from}`, bind))[0]?.n ?? NaN;
  const counts = async (column: 'approval' | 'supply'): Promise<Record<string, number>> =>
    Object.fromEntries(
      (
        await select<{ state: string; n: number }>(
          `SELECT ${column} AS state, count(*) AS n FROM parts GROUP BY 1`,
        )
      ).map(({ state, n }) => [state, n]),
    );

  it('has the size it promises', async () => {
    expect(await count('families')).toBeGreaterThanOrEqual(24);
    expect(await count('parts')).toBeGreaterThanOrEqual(40_000);
    const numbers = await count('company_part_numbers');
    expect(Math.abs(numbers - 1500)).toBeLessThan(150);
    const several = await count(
      '(SELECT 1 FROM approved_sources GROUP BY company_part_number_id HAVING count(*) BETWEEN 2 AND 3)',
    );
    expect(Math.abs(several / numbers - 0.5)).toBeLessThan(0.05);
    expect(await count('company_part_numbers')).toBe(
      await count('(SELECT 1 FROM approved_sources GROUP BY company_part_number_id)'),
    );
  });

  it('has a believable spread of approval and supply', async () => {
    const approvals = await counts('approval');
    expect(approvals['preferred']).toBeGreaterThanOrEqual(250);
    expect(approvals['preferred']).toBeLessThanOrEqual(350);
    expect(approvals['approved']).toBeGreaterThanOrEqual(6000);
    expect(approvals['approved']).toBeLessThanOrEqual(9000);
    for (const state of ['in-review', 'restricted', 'withdrawn'])
      expect(approvals[state]).toBeGreaterThanOrEqual(24);
    const supplies = await counts('supply');
    for (const state of ['not-recommended', 'last-time-buy', 'discontinued']) {
      expect(supplies[state]).toBeGreaterThanOrEqual(24);
    }
    expect(supplies['active']).toBeGreaterThan(0.9 * (await count('parts')));
  });

  it('lets the known people in, each with the known password', async () => {
    for (const account of ACCOUNTS) {
      await request(application.server)
        .post('/api/auth/sign-in')
        .send({ email: `${account}@brackwater.example.com`, password: 'brackwater-demo' })
        .expect(200);
    }
    await request(application.server)
      .post('/api/auth/sign-in')
      .send({ email: 'oskar.lindeqvam@brackwater.example.com', password: 'brackwater-demo' })
      .expect(401);
    expect(await count(`users WHERE email NOT LIKE '%@brackwater.example.com'`)).toBe(0);
    expect(await count('(SELECT 1 FROM user_roles GROUP BY user_id HAVING count(*) > 1)')).toBeGreaterThan(1);
  });

  it('keeps every resistance exactly as the preferred value it is', async () => {
    const { families } = readSeedData(join(REPOSITORY_ROOT, 'seed-data'));
    const kept = new Map(
      (
        await select<{ number: string; resistance: number }>(
          'SELECT manufacturer_part_number AS number, resistance_ohm AS resistance FROM parts',
        )
      ).map(({ number, resistance }) => [number, resistance]),
    );
    const parts = families.flatMap((family) => expandParts(family));
    expect(kept.size).toBe(parts.length);
    expect(parts.filter((part) => kept.get(part.manufacturerPartNumber) !== part.resistance)).toEqual([]);
  });

  it('gives a preferred part all that a promotion demands', async () => {
    const preferred = `parts AS p WHERE p.approval = 'preferred'`;
    expect(await count(`${preferred} AND p.supply <> 'active'`)).toBe(0);
    expect(
      await count(`${preferred} AND NOT EXISTS (SELECT 1 FROM families AS f
        JOIN family_revisions AS r ON r.id = f.current_revision_id WHERE f.id = p.family_id AND r.datasheet_id IS NOT NULL)`),
    ).toBe(0);
    expect(
      await count(`${preferred} AND p.derived_second_source = 0 AND NOT EXISTS (SELECT 1 FROM approval_history AS h
        WHERE h.part_id = p.id AND h.to_approval = 'preferred' AND h.exception IS NOT NULL)`),
    ).toBe(0);
    expect(
      await count(
        `${preferred} AND NOT EXISTS (SELECT 1 FROM offers AS o WHERE o.part_id = p.id
          AND $today BETWEEN o.valid_from AND o.valid_until)`,
        { today },
      ),
    ).toBe(0);
    expect(await count(`${preferred} AND p.derived_unit_price_micro IS NULL`)).toBe(0);
  });

  it('has nobody approve or publish what he or she entered, and only people with the role', async () => {
    expect(
      await count(`approval_history AS h JOIN parts AS p ON p.id = h.part_id
        WHERE h.to_approval <> 'in-review' AND h.changed_by = p.entered_by`),
    ).toBe(0);
    expect(
      await count(`approval_history AS h WHERE h.to_approval <> 'in-review' AND NOT EXISTS
        (SELECT 1 FROM user_roles WHERE user_id = h.changed_by AND role = 'component-engineer')`),
    ).toBe(0);
    expect(
      await count(`supply_history AS h WHERE NOT EXISTS
        (SELECT 1 FROM user_roles WHERE user_id = h.changed_by AND role = 'purchasing')`),
    ).toBe(0);
    expect(await count('family_revisions WHERE published_by = entered_by')).toBe(0);
    expect(await count('derating_policy_versions WHERE published_by = entered_by')).toBe(0);
  });

  it('shows four eyes: the engineer’s account has entered parts that are not preferred yet', async () => {
    expect(
      await count(`parts AS p JOIN users AS u ON u.id = p.entered_by
        WHERE u.email = 'engineer@brackwater.example.com' AND p.approval = 'approved' AND p.supply = 'active'`),
    ).toBeGreaterThan(10);
  });

  it('stands where its histories end, step by step', async () => {
    for (const [column, table] of [
      ['approval', 'approval_history'],
      ['supply', 'supply_history'],
    ] as const) {
      const first = column === 'approval' ? 'draft' : 'active';
      expect(
        await count(`parts AS p WHERE p.${column} <> coalesce(
          (SELECT to_${column} FROM ${table} WHERE part_id = p.id ORDER BY id DESC LIMIT 1), '${first}')`),
      ).toBe(0);
      expect(
        await count(`(SELECT from_${column} AS given, lag(to_${column}, 1, '${first}')
            OVER (PARTITION BY part_id ORDER BY id) AS expected FROM ${table}) WHERE given <> expected`),
      ).toBe(0);
      expect(
        await count(`(SELECT changed_at, lag(changed_at) OVER (ORDER BY id) AS before FROM ${table})
          WHERE changed_at < before`),
      ).toBe(0);
    }
    expect(await count(`parts WHERE supply = 'last-time-buy' AND last_order_on IS NULL`)).toBe(0);
    expect(await count(`parts WHERE approval = 'in-review'`)).toBe(
      await count(`reviews WHERE state = 'open' AND cause = 'submitted'`),
    );
  });

  it('has an audit entry for every step, by the same person at the same moment', async () => {
    expect(
      await count(`approval_history AS h WHERE NOT EXISTS (SELECT 1 FROM audit_entries AS a
        WHERE a.subject_type = 'Part' AND a.subject_id = CAST(h.part_id AS TEXT) AND a.recorded_at = h.changed_at
          AND a.actor_id = h.changed_by AND a.after ->> 'approval' = h.to_approval)`),
    ).toBe(0);
    expect(await count(`audit_entries WHERE action = 'create' AND subject_type = 'Offer'`)).toBe(
      await count('offers'),
    );
    expect(await count(`audit_entries WHERE action = 'set-supply-status'`)).toBe(
      await count('supply_history'),
    );
  });

  it('has sources that can stand in for each other: equal value, size and tolerance, different manufacturers', async () => {
    expect(
      await count(`(SELECT 1 FROM approved_sources AS s JOIN parts AS p ON p.id = s.part_id
          JOIN sizes AS z ON z.id = p.size_id JOIN families AS f ON f.id = p.family_id
        GROUP BY s.company_part_number_id
        HAVING count(DISTINCT p.resistance_ohm) > 1 OR count(DISTINCT z.code) > 1
          OR count(DISTINCT ifnull(p.tolerance_fraction, 0)) > 1 OR count(DISTINCT f.manufacturer_id) < count(*))`),
    ).toBe(0);
  });

  it('has offers in force, expired and to come, and certificates in date and out of it', async () => {
    for (const state of [
      '$today BETWEEN valid_from AND valid_until',
      'valid_until < $today',
      'valid_from > $today',
    ]) {
      expect(await count(`offers WHERE ${state}`, { today })).toBeGreaterThan(100);
    }
    expect(
      await count(`offers AS o WHERE NOT EXISTS (SELECT 1 FROM offer_price_breaks WHERE offer_id = o.id)`),
    ).toBe(0);
    expect(await count('certificates WHERE expires_on < $today', { today })).toBeGreaterThan(0);
    expect(await count('certificates WHERE expires_on > $today', { today })).toBeGreaterThan(0);
  });

  it('has a policy in force that both readings and altitude stand in', async () => {
    const [policy] = await select<{ number: number; entries: string; entered: number; published: number }>(
      `SELECT v.number, v.entries, v.entered_by AS entered, v.published_by AS published
       FROM company_policy AS c JOIN derating_policy_versions AS v ON v.id = c.version_id`,
    );
    expect(policy?.number).toBe(3);
    const entries = JSON.parse(policy?.entries ?? '[]') as { reading: string; altitude?: unknown }[];
    expect(new Set(entries.map(({ reading }) => reading))).toEqual(new Set(['parallel', 'multiplied']));
    expect(entries.every(({ altitude }) => altitude !== undefined)).toBe(true);
  });

  it('has derived columns as a rebuild would make them, and every resistor in a row of its range table', async () => {
    expect(await count('parts WHERE derived_range_id IS NULL AND resistance_ohm > 0')).toBe(0);
    const derived = (): Promise<object[]> =>
      select(`SELECT p.id, derived_range_id, derived_unit_price_micro, derived_second_source, t.manufacturer_part_number,
          t.company_part_number, t.family, t.manufacturer FROM parts AS p LEFT JOIN part_text AS t ON t.rowid = p.id`);
    const before = await derived();
    const writer = application.nest.get(Writer);
    await writer.transaction((transaction) => rebuildDerivedColumns(writer, transaction, 'all', today));
    const after = await derived();
    expect(after.length).toBe(before.length);
    expect(after.filter((row, place) => JSON.stringify(row) !== JSON.stringify(before[place]))).toEqual([]);
  });

  it('refers to nothing that is missing, and publishes every revision', async () => {
    const writer = application.nest.get(Writer);
    const orphans = await writer.transaction((transaction) =>
      writer.select<object>(transaction, 'SELECT * FROM pragma_foreign_key_check'),
    );
    expect(orphans).toEqual([]);
    expect(await count(`family_revisions WHERE state <> 'published'`)).toBe(0);
    expect(await count('families WHERE current_revision_id IS NULL')).toBe(0);
  });
});
