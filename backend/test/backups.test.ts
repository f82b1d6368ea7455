import {
  appendFileSync,
  existsSync,
  mkdirSync,
  readdirSync,
  readFileSync,
  rmSync,
  writeFileSync,
} from 'node:fs';
import { join } from 'node:path';
import { tmpdir } from 'node:os';
import { mkdtempSync } from 'node:fs';
import request from 'supertest';
import { NightlyBackup } from '../src/backups/nightly-backup';
import { restoreBackup } from '../src/backups/restore-backup';
import { SqliteFile } from '../src/backups/sqlite-file';
import { type Environment, readEnvironment } from '../src/config/environment';
import { Readers } from '../src/database/readers';
import { Writer } from '../src/database/writer';
import { startApplication, type StartedApplication } from './support/application';
import { PASSWORD, type SignedInPerson } from './support/people-builder';

interface Backup {
  name: string;
  createdAt: string;
  reason: string;
  schema: string;
  files: number;
  bytes: number;
}

const INSERT = `INSERT INTO failed_sign_ins (account, address, failed_at) VALUES ($account, 'load', '2026-12-01')`;

describe('backups', () => {
  let folder: string;
  let environment: Environment;
  let application: StartedApplication;
  let administrator: SignedInPerson;
  beforeEach(async () => {
    folder = mkdtempSync(join(tmpdir(), 'resistry-test-'));
    environment = readEnvironment({ DATA_DIR: folder });
    application = await startApplication({ dataDirectory: folder });
    administrator = await application.people.signIn('administrator');
  });
  afterEach(async () => {
    await application.stop();
    rmSync(folder, { recursive: true });
  });

  const take = async (): Promise<Backup> =>
    (await administrator.post('/api/backups').expect(201)).body as Backup;
  const check = async (name: string): Promise<{ sound: boolean; faults: string[] }> =>
    (await administrator.post(`/api/backups/${name}/check`).expect(200)).body as {
      sound: boolean;
      faults: string[];
    };
  const upload = (name: string, text: string): void => {
    mkdirSync(environment.folder('uploads'), { recursive: true });
    writeFileSync(join(environment.folder('uploads'), name), text);
  };

  it('are taken on demand, listed, checked, and written into the audit trail', async () => {
    upload('datasheet.pdf', 'pages');
    const backup = await take();
    expect(backup).toMatchObject({
      reason: 'on-demand',
      files: 2,
      schema: expect.stringMatching(/^\d{4}-/) as string,
    });
    expect(readFileSync(join(folder, 'backups', backup.name, 'uploads', 'datasheet.pdf'), 'utf8')).toBe(
      'pages',
    );
    const list = await administrator.get('/api/backups').expect(200);
    expect(list.body).toEqual({ items: [{ name: backup.name, details: backup }] });
    expect(await check(backup.name)).toEqual({ sound: true, faults: [] });
    const audit = await administrator.get('/api/audit?subjectType=Backup').expect(200);
    expect((audit.body as { items: { action: string }[] }).items.map(({ action }) => action)).toEqual([
      'check',
      'create',
    ]);
  });

  it('hold no secret but what the database itself holds', async () => {
    const { name } = await take();
    expect(readdirSync(join(folder, 'backups', name)).sort()).toEqual(['database.sqlite', 'manifest.json']);
  });

  it('show damage: a changed, a missing and a surplus file', async () => {
    upload('one.pdf', '1');
    upload('two.pdf', '2');
    const { name } = await take();
    const inside = (path: string): string => join(folder, 'backups', name, path);
    appendFileSync(inside('uploads/one.pdf'), 'x');
    rmSync(inside('uploads/two.pdf'));
    writeFileSync(inside('uploads/three.pdf'), '3');
    expect((await check(name)).faults.sort()).toEqual([
      'uploads/one.pdf is not what was backed up',
      'uploads/three.pdf does not belong to it',
      'uploads/two.pdf is missing',
    ]);
    rmSync(inside('manifest.json'));
    expect((await check(name)).sound).toBe(false);
    expect((await administrator.get('/api/backups').expect(200)).body).toEqual({ items: [{ name }] });
    rmSync(inside('database.sqlite'));
    expect((await check(name)).faults).toEqual(['the database is missing']);
  });

  it.each(['none', '2026-12-01T02-30-00Z-0000', '..%2F..', '%2e%2e'])('have none called %s', async (name) => {
    await administrator.post(`/api/backups/${name}/check`).expect(404);
  });

  it('taken while much is written restore whole, as of one moment', async () => {
    const writer = application.nest.get(Writer);
    let written = 0;
    let stopped = false;
    // Two rows a transaction: a copy of one moment never holds an odd number.
    const load = async (): Promise<void> => {
      while (!stopped) {
        await writer.transaction(async (transaction) => {
          await writer.run(transaction, INSERT, { account: `a${written}` });
          await writer.run(transaction, INSERT, { account: `b${written}` });
        });
        written += 1;
      }
    };
    const loading = load();
    const before = written;
    const backup = await take();
    const after = written;
    stopped = true;
    await loading;
    expect(await check(backup.name)).toEqual({ sound: true, faults: [] });
    await application.stop();
    await restoreBackup(environment, backup.name, new Date());
    const database = await SqliteFile.open(environment.databaseFile);
    const [count] = await database.select<{ n: number }>(
      "SELECT count(*) AS n FROM failed_sign_ins WHERE address = 'load'",
    );
    expect(await database.select('PRAGMA integrity_check')).toEqual([{ integrity_check: 'ok' }]);
    expect(await database.select('PRAGMA foreign_key_check')).toEqual([]);
    await database.close();
    const pairs = (count?.n ?? -1) / 2;
    expect(Number.isInteger(pairs)).toBe(true);
    expect(pairs).toBeGreaterThanOrEqual(before);
    expect(pairs).toBeLessThanOrEqual(after + 1);
    expect(after).toBeGreaterThan(before);
    application = await startApplication({ dataDirectory: folder });
  });

  it('bring back what was, set aside what is, and sign everybody out', async () => {
    const person = await application.people.add('designer');
    upload('old.pdf', 'old');
    const backup = await take();
    await administrator
      .post(`/api/users/${person.id}/deactivate`, { reason: 'by mistake', version: 1 })
      .expect(200);
    upload('new.pdf', 'new');
    await application.stop();
    const aside = await restoreBackup(environment, backup.name, new Date());
    application = await startApplication({ dataDirectory: folder });
    await request(application.server)
      .get('/api/auth/me')
      .set('Authorization', `Bearer ${administrator.accessToken}`)
      .expect(401);
    const { email } = person;
    await request(application.server)
      .post('/api/auth/sign-in')
      .send({ email, password: PASSWORD })
      .expect(200);
    expect(readdirSync(environment.folder('uploads'))).toEqual(['old.pdf']);
    expect(readdirSync(join(aside ?? '', 'uploads')).sort()).toEqual(['new.pdf', 'old.pdf']);
    expect(existsSync(join(aside ?? '', 'resistry.sqlite'))).toBe(true);
    const entry = await application.nest
      .get(Readers)
      .lookUp(`SELECT actor_name, subject_id FROM audit_entries WHERE action = 'restore'`);
    expect(entry).toEqual({ actor_name: 'Resistry', subject_id: backup.name });
  });

  it('are not restored under a running server', async () => {
    const { name } = await take();
    await expect(restoreBackup(environment, name, new Date())).rejects.toThrow('in use by a running server');
  });

  it('are not restored when damaged or unknown, and the present data stays', async () => {
    const { name } = await take();
    appendFileSync(join(folder, 'backups', name, 'database.sqlite'), 'x');
    await application.stop();
    await expect(restoreBackup(environment, name, new Date())).rejects.toThrow(
      'database.sqlite is not what was backed up',
    );
    await expect(restoreBackup(environment, '../x', new Date())).rejects.toThrow('There is no backup');
    application = await startApplication({ dataDirectory: folder });
    await application.people.signInAs(administrator.person);
  });

  it('cut off in the middle of a restore keep the server from starting with nothing', async () => {
    await application.stop();
    const aside = join(folder, 'aside');
    mkdirSync(join(folder, '.restoring'));
    writeFileSync(aside, readFileSync(environment.databaseFile));
    rmSync(environment.databaseFile);
    await expect(startApplication({ dataDirectory: folder })).rejects.toThrow('A restore was cut off');
    rmSync(join(folder, '.restoring'), { recursive: true });
    writeFileSync(environment.databaseFile, readFileSync(aside));
    application = await startApplication({ dataDirectory: folder });
  });

  it('of the night go when there are more than fourteen, those on demand stay', async () => {
    const kept = await take();
    const nightly = application.nest.get(NightlyBackup, { strict: false });
    for (let night = 0; night < 16; night += 1) {
      application.clock.forward(24 * 3600);
      await nightly.run();
    }
    const { items } = (await administrator.get('/api/backups').expect(200)).body as {
      items: { name: string; details: Backup }[];
    };
    expect(items.filter(({ details }) => details.reason === 'nightly')).toHaveLength(14);
    expect(items.at(-1)?.name).toBe(kept.name);
  });

  it('leave nothing half done behind', async () => {
    mkdirSync(join(folder, 'backups', '2026-11-30T02-30-00Z-4f1c.partial'), { recursive: true });
    const { name } = await take();
    expect(readdirSync(join(folder, 'backups'))).toEqual([name]);
  });

  it('are for administrators', async () => {
    const other = await application.people.signIn(
      'librarian',
      'component-engineer',
      'designer',
      'purchasing',
    );
    await other.get('/api/backups').expect(403);
    await other.post('/api/backups').expect(403);
    expect(existsSync(join(folder, 'backups'))).toBe(false);
  });
});
