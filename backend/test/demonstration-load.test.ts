import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { join } from 'node:path';
import { Readers } from '../src/database/readers';
import { startApplication } from './support/application';
import { temporaryFolder } from './support/temporary-folder';

const TABLES = [
  'users',
  'manufacturers',
  'families',
  'parts',
  'offers',
  'audit_entries',
  "derating_policies WHERE origin = 'company'",
];

describe('loading the demonstration', () => {
  const folder = temporaryFolder();

  /** Starts the server as a process and kills it at once when its log says these words. */
  const killWhenSaying = async (words: string): Promise<void> => {
    const child = spawn(
      process.execPath,
      [
        '--conditions=source',
        '--require',
        join(__dirname, 'support', 'compile-on-require.cjs'),
        'src/main.ts',
      ],
      {
        cwd: join(__dirname, '..'),
        env: { PATH: process.env['PATH'], PORT: '0', DATA_DIR: folder.path('data'), SEED: 'demo' },
        stdio: ['ignore', 'pipe', 'inherit'],
      },
    );
    let said = '';
    child.stdout.on('data', (piece: Buffer) => {
      said += piece.toString();
      if (said.includes(words)) child.kill('SIGKILL');
    });
    await once(child, 'exit');
    expect(said).toContain(words);
  };

  const counts = async (seed: 'none' | 'demo'): Promise<number[]> => {
    const application = await startApplication({ seed, dataDirectory: folder.path('data') });
    const readers = application.nest.get(Readers);
    const rows = await Promise.all(
      TABLES.map((table) => readers.lookUp<{ n: number }>(`SELECT count(*) AS n FROM ${table}`)),
    );
    await application.close();
    return rows.map((row) => row?.n ?? NaN);
  };

  it('leaves nothing when it is killed half-way, loads at the next start, and never loads twice', async () => {
    await killWhenSaying('seeding: offers');
    expect(await counts('none')).toEqual(TABLES.map(() => 0));
    const loaded = await counts('demo');
    expect(Math.min(...loaded)).toBeGreaterThan(0);
    expect(await counts('demo')).toEqual(loaded);
  });
});
