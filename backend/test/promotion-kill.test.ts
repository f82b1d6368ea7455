import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import { SqliteFile } from '../src/backups/sqlite-file';
import { startApplication } from './support/application';
import { CatalogueBuilder } from './support/catalogue-builder';
import { ServerProcess } from './support/server-process';
import { temporaryFolder } from './support/temporary-folder';

const KILLS = 50;
const PARTS = 6;
const LONGEST_MILLISECONDS = 60;

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
  const data = (): string => folder.path('data');

  it(`is whole or has not happened, killed ${KILLS} times in the middle`, async () => {
    const { token, partIds, librarian } = await prepare();
    const acknowledged: Acknowledged[] = [];
    const faults: unknown[] = [];

    for (let kill = 0; kill < KILLS; kill += 1) {
      const server = await ServerProcess.start({ DATA_DIR: data() });
      const stream = partIds.map((partId) =>
        promoteAndBack(server.url, token, partId, acknowledged).catch((fault: unknown) => faults.push(fault)),
      );
      const before = acknowledged.length;
      while (acknowledged.length === before && faults.length === 0) await wait(1);
      await wait(Math.random() * LONGEST_MILLISECONDS);
      await server.end('SIGKILL');
      await Promise.all(stream);
      expect(faults).toEqual([]);
    }
    expect(acknowledged.length).toBeGreaterThanOrEqual(KILLS);

    // What the last kill left undelivered goes out after a start.
    const last = await startApplication({ dataDirectory: data() });
    last.clock.forward(3600);
    await last.delivered();
    await last.close();
    await audit(acknowledged, partIds, librarian);
  }, 300_000);

  async function prepare(): Promise<{ token: string; partIds: number[]; librarian: string }> {
    const application = await startApplication({ dataDirectory: data() });
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
    return { token: engineer.accessToken, partIds, librarian: librarian.email };
  }

  /** Promotes a part and takes it back, again and again, until the server is gone; notes what was acknowledged. */
  async function promoteAndBack(
    url: string,
    token: string,
    partId: number,
    acknowledged: Acknowledged[],
  ): Promise<void> {
    const headers = { 'Content-Type': 'application/json', Authorization: `Bearer ${token}` };
    try {
      const now = await fetch(`${url}/api/parts/${partId}`, { headers });
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
        acknowledged.push({ partId, version: part.version, approval: part.approval });
      }
    } catch (error) {
      // fetch's word for a connection that breaks, as it does when the server is killed; anything else is a fault.
      if ((error as Error).name !== 'TypeError') throw error;
    }
  }

  async function audit(
    acknowledged: readonly Acknowledged[],
    partIds: number[],
    librarian: string,
  ): Promise<void> {
    const database = await SqliteFile.open(join(data(), 'resistry.sqlite'));
    const history = await database.select<Step>(
      'SELECT part_id, from_approval, to_approval FROM approval_history ORDER BY id',
    );
    const entries = await database.select<{ subject_id: string; before: string; after: string }>(
      `SELECT subject_id, before ->> 'approval' AS before, after ->> 'approval' AS after FROM audit_entries
        WHERE subject_type = 'Part' ORDER BY id`,
    );
    const parts = await database.select<{ id: number; approval: string; version: number }>(
      'SELECT id, approval, version FROM parts ORDER BY id',
    );
    expect(parts.map(({ id }) => id)).toEqual(partIds);
    for (const { id, approval, version } of parts) {
      const steps = history.filter((step) => step.part_id === id);
      // One version a step, each step from where the one before ended, from the beginning to how the part stands.
      expect([id, version]).toEqual([id, steps.length + 1]);
      expect(steps.map((step) => step.from_approval)).toEqual([
        'approved',
        ...steps.slice(0, -1).map((step) => step.to_approval),
      ]);
      expect(steps.at(-1)?.to_approval ?? 'approved').toBe(approval);
      for (const known of acknowledged.filter(({ partId }) => partId === id)) {
        expect([known, steps[known.version - 2]?.to_approval]).toEqual([known, known.approval]);
      }
    }
    expect(entries).toEqual(
      history.map((step) => ({
        subject_id: String(step.part_id),
        before: step.from_approval,
        after: step.to_approval,
      })),
    );
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
    const letters = readdirSync(join(data(), 'mail')).filter((name) => name.endsWith('.eml'));
    expect(letters.sort()).toEqual(messages.map(({ id }) => `${id}.eml`).sort());
    expect(await database.select('PRAGMA integrity_check')).toEqual([{ integrity_check: 'ok' }]);
    expect(await database.select('PRAGMA foreign_key_check')).toEqual([]);
    await database.close();
  }
});
