import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import { SqliteFile } from '../src/backups/sqlite-file';
import { startApplication } from './support/application';
import { CatalogueBuilder } from './support/catalogue-builder';
import { ServerProcess } from './support/server-process';
import { temporaryFolder } from './support/temporary-folder';

const KILLS = 50;
/** Installations that are killed side by side: most of the time goes into starting servers. */
const INSTALLATIONS = 2;
const PARTS = 6;
const LONGEST_MILLISECONDS = 60;

interface Installation {
  data: string;
  token: string;
  partIds: number[];
  librarian: string;
  acknowledged: Acknowledged[];
}

interface Acknowledged {
  partId: number;
  /** Version of the part after the change. */
  version: number;
  approval: string;
}

interface Step {
  part_id: number;
  from_approval: string;
  to_approval: string;
}

describe('a promotion', () => {
  const folder = temporaryFolder();

  it(`is whole or has not happened, killed ${KILLS} times in the middle`, async () => {
    const installations: Installation[] = [];
    for (let number = 0; number < INSTALLATIONS; number += 1) {
      installations.push(await prepare(folder.path(`data-${number}`)));
    }
    await Promise.all(installations.map(killAgainAndAgain));
    const acknowledged = installations.flatMap((installation) => installation.acknowledged);
    expect(acknowledged.length).toBeGreaterThanOrEqual(KILLS);
    for (const installation of installations) {
      await deliverTheRest(installation);
      await audit(installation);
    }
  }, 600_000);
});

/** An installation with parts that can be promoted, and somebody signed in who may do so. */
async function prepare(data: string): Promise<Installation> {
  const application = await startApplication({ dataDirectory: data });
  const engineer = await application.people.signIn('component-engineer');
  const librarian = await application.people.add('librarian');
  const catalogue = new CatalogueBuilder(application.nest, librarian.id);
  const family = await catalogue.family({
    code: 'SKUA',
    manufacturerId: await catalogue.manufacturer('NORVIK'),
  });
  const partIds: number[] = [];
  for (let number = 1; number <= PARTS; number += 1) {
    const id = await catalogue.part({ family, number: `SKUA0603F${number}`, approval: 'approved' });
    await catalogue.offer(id);
    partIds.push(id);
  }
  await catalogue.rebuild();
  await application.close();
  return { data, token: engineer.accessToken, partIds, librarian: librarian.email, acknowledged: [] };
}

async function killAgainAndAgain(installation: Installation): Promise<void> {
  const { data, partIds, acknowledged } = installation;
  const faults: unknown[] = [];
  for (let kill = 0; kill < KILLS / INSTALLATIONS; kill += 1) {
    const server = await ServerProcess.start({ DATA_DIR: data });
    const before = acknowledged.length;
    const stream = partIds.map((partId) =>
      promoteAndBack(server.url, installation, partId).catch((fault: unknown) => faults.push(fault)),
    );
    while (acknowledged.length === before && faults.length === 0) await wait(1);
    await wait(Math.random() * LONGEST_MILLISECONDS);
    await server.end('SIGKILL');
    await Promise.all(stream);
    expect(faults).toEqual([]);
  }
}

/** Promotes a part and takes it back, again and again, until the server is gone; notes what was acknowledged. */
async function promoteAndBack(url: string, installation: Installation, partId: number): Promise<void> {
  const headers = { 'Content-Type': 'application/json', Authorization: `Bearer ${installation.token}` };
  try {
    const now = await fetch(`${url}/api/parts/${partId}`, { headers });
    expect(now.status).toBe(200);
    let part = (await now.json()) as { version: number; approval: string };
    for (;;) {
      const promotes = part.approval === 'approved';
      const answer = await fetch(`${url}/api/parts/${partId}/approval`, {
        method: 'POST',
        headers,
        body: JSON.stringify({
          to: promotes ? 'preferred' : 'approved',
          reason: 'Under fire',
          version: part.version,
          ...(promotes && { exception: 'Only one makes it' }),
        }),
      });
      expect(answer.status).toBe(200);
      part = (await answer.json()) as { version: number; approval: string };
      installation.acknowledged.push({ partId, version: part.version, approval: part.approval });
    }
  } catch (error) {
    // fetch's word for a connection that breaks, as it does when the server is killed; anything else is a fault.
    if ((error as Error).name !== 'TypeError') throw error;
  }
}

/** What the last kill left in the outbox goes out after a start. */
async function deliverTheRest({ data }: Installation): Promise<void> {
  const application = await startApplication({ dataDirectory: data });
  application.clock.forward(3600);
  await application.delivered();
  await application.close();
}

async function audit({ data, partIds, librarian, acknowledged }: Installation): Promise<void> {
  const database = await SqliteFile.open(join(data, 'resistry.sqlite'));
  const history = await database.select<Step>(
    'SELECT part_id, from_approval, to_approval FROM approval_history ORDER BY id',
  );
  const parts = await database.select<{ id: number; approval: string; version: number }>(
    'SELECT id, approval, version FROM parts ORDER BY id',
  );
  expect(parts.map(({ id }) => id)).toEqual(partIds);
  for (const { id, approval, version } of parts) {
    const steps = history.filter((step) => step.part_id === id);
    // One version a step, each step from where the one before ended, from the beginning to how the part stands.
    expect([id, version]).toEqual([id, steps.length + 1]);
    expect(steps.map((step) => step.from_approval)).toEqual(
      ['approved', ...steps.map((step) => step.to_approval)].slice(0, steps.length),
    );
    expect(steps.at(-1)?.to_approval ?? 'approved').toBe(approval);
    for (const known of acknowledged.filter(({ partId }) => partId === id)) {
      expect([known, steps[known.version - 2]?.to_approval]).toEqual([known, known.approval]);
    }
  }
  const entries = await database.select(
    `SELECT CAST(subject_id AS INTEGER) AS part_id, before ->> 'approval' AS from_approval,
        after ->> 'approval' AS to_approval FROM audit_entries WHERE subject_type = 'Part' ORDER BY id`,
  );
  expect(entries).toEqual(history);
  const messages = await database.select<{ id: string; state: string; to: string; subject: string }>(
    `SELECT id, state, payload ->> 'to' AS "to", payload ->> 'subject' AS subject FROM outbox_messages ORDER BY sequence`,
  );
  expect(messages.map(({ to, subject }) => [to, subject])).toEqual(
    history.map((step) => [
      librarian,
      `SKUA0603F${partIds.indexOf(step.part_id) + 1} is now ${step.to_approval}; it was ${step.from_approval}`,
    ]),
  );
  expect(new Set(messages.map(({ state }) => state))).toEqual(new Set(['delivered']));
  const letters = readdirSync(join(data, 'mail')).filter((name) => name.endsWith('.eml'));
  expect(letters.sort()).toEqual(messages.map(({ id }) => `${id}.eml`).sort());
  expect(await database.select('PRAGMA integrity_check')).toEqual([{ integrity_check: 'ok' }]);
  expect(await database.select('PRAGMA foreign_key_check')).toEqual([]);
  await database.close();
}
