import { Agent, get } from 'node:http';
import { once } from 'node:events';
import { existsSync } from 'node:fs';
import { join } from 'node:path';
import request from 'supertest';
import { Writer } from '../src/database/writer';
import { startApplication } from './support/application';

describe('stopping', () => {
  it('lets the requests under way finish, and does not wait for idle connections', async () => {
    const application = await startApplication();
    const designer = await application.people.signIn('designer');
    const agent = new Agent({ keepAlive: true });
    const [idle] = (await once(get(`${application.url}/api/health`, { agent }), 'response')) as [
      NodeJS.ReadableStream,
    ];
    await once(idle.resume(), 'end');

    let release = (): void => undefined;
    const held = new Promise<void>((resolve) => {
      release = resolve;
    });
    const holding = application.nest.get(Writer).transaction(() => held);
    // It waits for the writer, which the transaction above holds.
    const answer = designer.put('/api/account/name', { name: 'Kim Shoal' }).then(({ status }) => status);
    await once(application.server, 'request');
    const stopped = application.close();
    release();
    await holding;
    expect(await answer).toBe(204);
    await stopped;
    agent.destroy();
    expect(existsSync(join(application.dataDirectory, 'resistry.sqlite-wal'))).toBe(false);
    await application.stop();
  });

  it('leaves the data directory to the next start', async () => {
    const first = await startApplication();
    await expect(startApplication({ dataDirectory: first.dataDirectory })).rejects.toThrow(
      'in use by a running server',
    );
    await request(first.server).get('/api/health').expect(200);
    await first.close();
    const second = await startApplication({ dataDirectory: first.dataDirectory });
    await request(second.server).get('/api/health').expect(200);
    await second.stop();
    await first.stop();
  });
});
