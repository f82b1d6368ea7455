import { type ChildProcess, spawn } from 'node:child_process';
import { once } from 'node:events';
import { join } from 'node:path';

const BACKEND = join(__dirname, '..', '..');
const COMPILING = ['--conditions=source', '--require', join(__dirname, 'compile-on-require.cjs')];

/** A program of the backend, and the words with which it says where it can be reached. */
export interface Program {
  file: string;
  /** Its first group is the address. */
  ready: RegExp;
}

const APPLICATION: Program = { file: 'src/main.ts', ready: /Resistry answers at (\S+)/ };
export const MAIL_CATCHER: Program = {
  file: 'src/mail/mail-catcher-command.ts',
  ready: /Keeping mail that arrives at (\S+)/,
};

/** A server in a process of its own, as `node backend/dist/main.js` runs it, to be signalled or killed. */
export class ServerProcess {
  private constructor(
    private readonly child: ChildProcess,
    readonly url: string,
    private readonly words: () => string,
  ) {}

  /** Resolves when it answers. @throws Error with its words when it ends before that */
  static async start(
    variables: Record<string, string>,
    { file, ready }: Program = APPLICATION,
  ): Promise<ServerProcess> {
    const child = spawn(process.execPath, [...COMPILING, file], {
      cwd: BACKEND,
      env: { PATH: process.env['PATH'], PORT: '0', HOST: '127.0.0.1', ...variables },
      stdio: ['ignore', 'pipe', 'pipe'],
    });
    let words = '';
    const url = new Promise<string>((resolve, reject) => {
      child.stderr.on('data', (piece: Buffer) => (words += piece.toString()));
      child.stdout.on('data', (piece: Buffer) => {
        words += piece.toString();
        const [, address] = ready.exec(words) ?? [];
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

  /** Ends it by a signal, unless it has ended. @returns its exit code, or null when the signal ended it at once */
  async end(signal: 'SIGTERM' | 'SIGKILL'): Promise<number | null> {
    if (this.child.exitCode !== null || this.child.signalCode !== null) return this.child.exitCode;
    const exited = once(this.child, 'exit') as Promise<[number | null]>;
    this.child.kill(signal);
    const [code] = await exited;
    return code;
  }
}
