import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Readers } from '../src/database/readers';
import { Writer } from '../src/database/writer';
import { Outbox } from '../src/outbox/outbox';
import { OutboxHandlers } from '../src/outbox/outbox-handlers';
import { OutboxTopic } from '../src/outbox/outbox-topic';
import { startApplication, type StartedApplication } from './support/application';
import type { SignedInPerson } from './support/people-builder';

const GAUGED = new OutboxTopic<{ level: number }>('gauged');
const HOUR = 3600;

describe('the outbox', () => {
  let folder: string;
  let application: StartedApplication;
  let administrator: SignedInPerson;
  let received: number[];
  let failure: Error | undefined;

  const start = async (): Promise<void> => {
    application = await startApplication({ dataDirectory: folder });
    application.nest.get(OutboxHandlers).register(GAUGED, ({ level }) => {
      if (failure) return Promise.reject(failure);
      received.push(level);
      return Promise.resolve();
    });
  };
  const add = (level: number): Promise<string> =>
    application.nest
      .get(Writer)
      .transaction((transaction) => application.nest.get(Outbox).add(transaction, GAUGED, { level }));
  const undelivered = async (): Promise<
    { id: string; state: string; attempts: number; lastError?: string }[]
  > => ((await administrator.get('/api/outbox').expect(200)).body as { items: never[] }).items;

  beforeEach(async () => {
    folder = mkdtempSync(join(tmpdir(), 'resistry-test-'));
    received = [];
    failure = undefined;
    await start();
    administrator = await application.people.signIn('administrator');
  });
  afterEach(async () => {
    await application.stop();
    rmSync(folder, { recursive: true });
  });

  it('delivers in order what was committed, and nothing that was not', async () => {
    await add(1);
    await expect(
      application.nest.get(Writer).transaction(async (transaction) => {
        await application.nest.get(Outbox).add(transaction, GAUGED, { level: 2 });
        throw new Error('no');
      }),
    ).rejects.toThrow('no');
    await add(3);
    await application.delivered();
    expect(received).toEqual([1, 3]);
    await application.delivered();
    expect(received).toEqual([1, 3]);
  });

  it('tries again later, later still each time, and goes on with the rest', async () => {
    failure = new Error('the server is asleep');
    await add(1);
    await application.delivered();
    expect(await undelivered()).toEqual([
      expect.objectContaining({ state: 'pending', attempts: 1, lastError: 'the server is asleep' }),
    ]);
    failure = undefined;
    await add(2);
    await application.delivered();
    expect(received).toEqual([2]);
    application.clock.forward(5);
    await application.delivered();
    expect(received).toEqual([2, 1]);
    expect(await undelivered()).toEqual([]);
  });

  it('gives up after twelve attempts, shows it, and tries anew when asked', async () => {
    failure = new Error('no such address');
    const id = await add(1);
    for (let attempt = 0; attempt < 12; attempt += 1) {
      await application.delivered();
      application.clock.forward(HOUR);
    }
    expect(await undelivered()).toEqual([expect.objectContaining({ id, state: 'dead', attempts: 12 })]);
    failure = undefined;
    await application.delivered();
    expect(received).toEqual([]);
    await administrator.post(`/api/outbox/${id}/retry`).expect(202);
    await application.delivered();
    expect(received).toEqual([1]);
    await administrator.post(`/api/outbox/${id}/retry`).expect(404);
    await administrator.post('/api/outbox/7/retry').expect(400);
  });

  it('finds after a restart what was left, also what was handled but not marked', async () => {
    failure = new Error('stopped in the middle');
    await add(1);
    await application.delivered();
    await application.stop();
    failure = undefined;
    await start();
    application.clock.forward(5);
    await application.delivered();
    expect(received).toEqual([1]);
  });

  it('shows a topic that nothing handles as failed, not as done', async () => {
    const unknown = new OutboxTopic<object>('unheard-of');
    await application.nest
      .get(Writer)
      .transaction((transaction) => application.nest.get(Outbox).add(transaction, unknown, {}));
    await application.delivered();
    expect(await undelivered()).toEqual([
      expect.objectContaining({ kind: 'unheard-of', lastError: 'Nothing handles the topic unheard-of.' }),
    ]);
  });

  it('may write to the database from a handler', async () => {
    const topic = new OutboxTopic<{ name: string }>('written');
    const writer = application.nest.get(Writer);
    application.nest.get(OutboxHandlers).register(topic, async ({ name }) => {
      await writer.transaction((transaction) =>
        writer.run(transaction, 'UPDATE users SET name = $name WHERE id = $id', {
          name,
          id: administrator.person.id,
        }),
      );
    });
    await writer.transaction((transaction) =>
      application.nest.get(Outbox).add(transaction, topic, { name: 'Sam' }),
    );
    await application.delivered();
    const row = await application.nest
      .get(Readers)
      .lookUp('SELECT name FROM users WHERE id = $id', { id: administrator.person.id });
    expect(row).toEqual({ name: 'Sam' });
    expect(await undelivered()).toEqual([]);
  });
});
