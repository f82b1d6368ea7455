import { type ChildProcess, spawn } from 'node:child_process';
import { once } from 'node:events';
import { join } from 'node:path';

const BACKEND = join(__dirname, '..', '..');
const ARGUMENTS = [
  '--conditions=source',
  '--require',
  join(__dirname, 'compile-on-require.cjs'),
  'src/main.ts',
];

/** The server in a process of its own, as `node backend/dist/main.js` runs it, to be signalled or killed. */
export class ServerProcess {
  private constructor(
    private readonly child: ChildProcess,
    readonly url: string,
    private readonly words: () => string,
  ) {}

  /** Resolves when it answers. @throws Error with its words when it ends before that */
  static async start(variables: Record<string, string>): Promise<ServerProcess> {
    const child = spawn(process.execPath, ARGUMENTS, {
      cwd: BACKEND,
      env: { PATH: process.env['PATH'], PORT: '0', HOST: '127.0.0.1', ...variables },
      stdio: ['ignore', 'pipe', 'pipe'],
    });
    let words = '';
    const url = new Promise<string>((resolve, reject) => {
      child.stderr.on('data', (piece: Buffer) => (words += piece.toString()));
      child.stdout.on('data', (piece: Buffer) => {
        words += piece.toString();
        const [, address] = /Resistry answers at (\S+)/.exec(words) ?? [];
        if (address !== undefined) resolve(address);
      });
      child.once('exit', () => reject(new Error(words)));
    });
    return new ServerProcess(child, await url, () => words);
  }

  /** Everything that it has written so far. */
  get output(): string {
    return this.words();
  }

  /** Ends it by a signal. @returns its exit code, or null when the signal ended it at once */
  async end(signal: 'SIGTERM' | 'SIGKILL'): Promise<number | null> {
    const exited = once(this.child, 'exit') as Promise<[number | null]>;
    this.child.kill(signal);
    const [code] = await exited;
    return code;
  }
}
