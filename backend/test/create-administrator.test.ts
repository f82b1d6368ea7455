import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { join } from 'node:path';
import request from 'supertest';
import { startApplication } from './support/application';
import { PASSWORD } from './support/people-builder';
import { temporaryFolder } from './support/temporary-folder';

const BACKEND = join(__dirname, '..');

describe('the command that makes the first administrator', () => {
  const folder = temporaryFolder();
  const data = (): string => folder.path('data');

  const command = async (...words: string[]): Promise<{ code: number; output: string; faults: string }> => {
    const child = spawn(
      process.execPath,
      [
        '--conditions=source',
        '--require',
        join(__dirname, 'support', 'compile-on-require.cjs'),
        'src/auth/create-administrator-command.ts',
        ...words,
      ],
      {
        cwd: BACKEND,
        env: {
          PATH: process.env['PATH'],
          DATA_DIR: data(),
          APP_URL: 'https://resistry.example.com',
        },
        stdio: ['ignore', 'pipe', 'pipe'],
      },
    );
    let output = '';
    let faults = '';
    child.stdout.on('data', (piece: Buffer) => (output += piece.toString()));
    child.stderr.on('data', (piece: Buffer) => (faults += piece.toString()));
    const [code] = (await once(child, 'close')) as [number];
    return { code, output, faults };
  };
  const kim = ['--email', 'Kim@Example.com', '--name', 'Kim Example'];

  it('prints a link that is good once, and makes no second administrator', async () => {
    const first = await command(...kim);
    expect(first).toMatchObject({ code: 0, faults: '' });
    const [, token = ''] =
      /^https:\/\/resistry\.example\.com\/reset-password#token=(\S{30,})$/m.exec(first.output) ?? [];

    const second = await command('--email', 'lee@example.com', '--name', 'Lee');
    expect(second).toMatchObject({ code: 1, output: '' });
    expect(second.faults).toBe('There is an administrator already, who can invite others.\n');

    const application = await startApplication({ dataDirectory: data() });
    const redeem = { token, password: PASSWORD };
    await request(application.server).post('/api/auth/password-resets/redeem').send(redeem).expect(204);
    await request(application.server).post('/api/auth/password-resets/redeem').send(redeem).expect(422);
    const person = { id: 1, email: 'kim@example.com', name: 'Kim Example' };
    const administrator = await application.people.signInAs(person);
    const users = await administrator.get('/api/users').expect(200);
    expect((users.body as { items: object[] }).items).toEqual([
      expect.objectContaining({ ...person, roles: ['administrator'], state: 'active' }),
    ]);
    const audit = await administrator.get('/api/audit?subjectType=User&action=create').expect(200);
    expect(audit.body).toMatchObject({
      items: [{ actorName: 'Resistry', after: { email: 'Kim@Example.com' } }],
    });

    const whileItRuns = await command('--email', 'lee@example.com', '--name', 'Lee');
    expect(whileItRuns.code).toBe(1);
    expect(whileItRuns.faults).toMatch(/in use by a running server: stop it first\.\n$/);
    await application.stop();
  });

  it.each([[['--email', 'kim@example.com', '--name', ' ']], [[...kim, '--roles', 'x']]])(
    'refuses %j and says how it is given',
    async (words) => {
      const refused = await command(...words);
      expect(refused).toMatchObject({ code: 1, output: '' });
      expect(refused.faults).toMatch(/^Say whom: npm run create-administrator/);
    },
  );
});
