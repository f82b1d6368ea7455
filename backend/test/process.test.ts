import { existsSync, readdirSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { PasswordHasher } from '../src/auth/password-hasher';
import { SqliteFile } from '../src/backups/sqlite-file';
import { Writer } from '../src/database/writer';
import { UserAccounts } from '../src/users/user-accounts';
import { startApplication } from './support/application';
import { PASSWORD } from './support/people-builder';
import { ServerProcess } from './support/server-process';
import { temporaryFolder } from './support/temporary-folder';

const KILLS = 6;

describe('the server as a process', () => {
  const folder = temporaryFolder();
  const data = (): string => folder.path('data');

  it('answers, keeps what it writes to itself, logs no secret, and ends well on SIGTERM', async () => {
    const server = await ServerProcess.start({ DATA_DIR: data() });
    await fetch(`${server.url}/api/auth/me`, {
      headers: { Authorization: 'Bearer secret-token', Cookie: 'resistry_refresh=secret-cookie' },
    });
    const sent = {
      method: 'POST',
      headers: { 'Content-Type': 'application/json' },
      body: JSON.stringify({ email: 'a@example.com', password: 'secret-word' }),
    };
    expect((await fetch(`${server.url}/api/auth/sign-in`, sent)).status).toBe(401);
    expect(statSync(join(data(), 'resistry.sqlite')).mode & 0o077).toBe(0);
    expect(await server.end('SIGTERM')).toBe(0);
    expect(server.output).toContain('/api/auth/sign-in');
    expect(server.output).not.toMatch(/secret-/);
    // The write-ahead log has been taken into the database.
    expect(existsSync(join(data(), 'resistry.sqlite-wal'))).toBe(false);
  });

  it.each([
    [{ PORT: 'x' }, 'PORT must be a whole number'],
    [{ SEED: 'x' }, 'SEED must be one of'],
  ])('does not start with %j, and says why', async (variables, words) => {
    await expect(ServerProcess.start({ DATA_DIR: data(), ...variables })).rejects.toThrow(words);
    expect(existsSync(data())).toBe(false);
  });

  it(`keeps, killed ${KILLS} times in the middle of its work, what it acknowledged, whole`, async () => {
    const application = await startApplication({ dataDirectory: data() });
    const passwordHash = await application.nest.get(PasswordHasher, { strict: false }).hash(PASSWORD);
    const accounts = application.nest.get(UserAccounts, { strict: false });
    const email = 'admin@brackwater.example.com';
    await application.nest
      .get(Writer)
      .transaction((transaction) =>
        accounts.create(transaction, { email, name: 'Admin', roles: ['administrator'], passwordHash }),
      );
    await application.close();

    const acknowledged: string[] = [];
    for (let kill = 0; kill < KILLS; kill += 1) {
      const server = await ServerProcess.start({ DATA_DIR: data() });
      const post = (path: string, body: object, token = ''): Promise<Response> =>
        fetch(`${server.url}${path}`, {
          method: 'POST',
          headers: { 'Content-Type': 'application/json', Authorization: `Bearer ${token}` },
          body: JSON.stringify(body),
        });
      const signedIn = (await (await post('/api/auth/sign-in', { email, password: PASSWORD })).json()) as {
        accessToken: string;
      };
      const inviting = Array.from({ length: 12 }, async (_, index) => {
        const invited = { email: `guest-${kill}-${index}@brackwater.example.com`, roles: ['designer'] };
        const answer = await post('/api/invitations', invited, signedIn.accessToken);
        if (answer.status === 201) acknowledged.push(((await answer.json()) as { id: string }).id);
      });
      // Killed when a few more each time are acknowledged, while the rest is being written or waits.
      await Promise.allSettled(inviting.slice(0, kill + 1));
      await server.end('SIGKILL');
      await Promise.allSettled(inviting);
    }
    expect(acknowledged.length).toBeGreaterThanOrEqual(KILLS);

    const last = await startApplication({ dataDirectory: data() });
    last.clock.forward(3600);
    await last.delivered();
    await last.close();
    const database = await SqliteFile.open(join(data(), 'resistry.sqlite'));
    const column = async (sql: string): Promise<string[]> =>
      (await database.select<{ id: string }>(sql)).map(({ id }) => id).sort();
    const invitations = await column('SELECT id FROM invitations');
    expect(invitations).toEqual(expect.arrayContaining(acknowledged));
    expect(await column(`SELECT subject_id AS id FROM audit_entries WHERE action = 'invite'`)).toEqual(
      invitations,
    );
    const messages = await database.select<{ id: string; invitation: string; state: string }>(
      `SELECT id, payload ->> 'invitationId' AS invitation, state FROM outbox_messages`,
    );
    expect(messages.map(({ invitation }) => invitation).sort()).toEqual(invitations);
    expect(new Set(messages.map(({ state }) => state))).toEqual(new Set(['delivered']));
    expect(
      readdirSync(join(data(), 'mail'))
        .filter((name) => name.endsWith('.eml'))
        .sort(),
    ).toEqual(messages.map(({ id }) => `${id}.eml`).sort());
    expect(await database.select('PRAGMA integrity_check')).toEqual([{ integrity_check: 'ok' }]);
    await database.close();
  });
});
