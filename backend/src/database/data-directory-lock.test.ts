import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { temporaryFolder } from '../../test/support/temporary-folder';
import { DataDirectoryLock } from './data-directory-lock';

const HOLDER = `
  const sqlite3 = require('sqlite3');
  const database = new sqlite3.Database(process.argv[1]);
  database.exec('PRAGMA journal_mode = MEMORY; BEGIN EXCLUSIVE', (error) => process.stdout.write(error ? 'failed' : 'held'));
  setInterval(() => undefined, 1000);
`;

describe('the lock of the data directory', () => {
  const folder = temporaryFolder();

  it('is held once, and can be taken again when it is released', async () => {
    const lock = await DataDirectoryLock.take(folder.path('data'));
    await expect(DataDirectoryLock.take(folder.path('data'))).rejects.toThrow('in use by a running server');
    await lock.release();
    await (await DataDirectoryLock.take(folder.path('data'))).release();
  });

  it('goes with the process that holds it, even one that is killed', async () => {
    await (await DataDirectoryLock.take(folder.path('data'))).release();
    const holder = spawn(process.execPath, ['-e', HOLDER, folder.path('data/running.lock')], {
      cwd: __dirname,
    });
    const [said] = (await once(holder.stdout, 'data')) as [Buffer];
    expect(said.toString()).toBe('held');
    await expect(DataDirectoryLock.take(folder.path('data'))).rejects.toThrow('in use by a running server');
    holder.kill('SIGKILL');
    await once(holder, 'exit');
    await (await DataDirectoryLock.take(folder.path('data'))).release();
  });
});
