import { type ChildProcess, spawn } from 'node:child_process';
import { once } from 'node:events';
import { existsSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { freePort } from './free-port';

const MAIN = join(__dirname, '../../backend/dist/main.js');
const PAGES = join(__dirname, '../../frontend/dist/index.html');
const START_MILLISECONDS = 90_000;

/** The built application with the demonstration, on a free port of the loopback and with data of its own. */
export class BuiltServer {
  private constructor(
    private readonly child: ChildProcess,
    private readonly dataDirectory: string,
    readonly url: string,
  ) {}

  /** @throws Error with what the server wrote, when it does not come up */
  static async start(): Promise<BuiltServer> {
    for (const file of [MAIN, PAGES]) {
      if (!existsSync(file)) throw new Error(`${file} is not built: run npm run build first`);
    }
    const dataDirectory = mkdtempSync(join(tmpdir(), 'resistry-e2e-'));
    // Named beforehand, so that links in mail lead to it as well.
    const port = await freePort();
    const child = spawn(process.execPath, [MAIN], {
      // Nothing of the surroundings decides what is tested.
      env: {
        PATH: process.env['PATH'],
        DATA_DIR: dataDirectory,
        SEED: 'demo',
        HOST: '127.0.0.1',
        PORT: String(port),
      },
      stdio: ['ignore', 'pipe', 'pipe'],
    });
    try {
      return new BuiltServer(child, dataDirectory, await addressOf(child));
    } catch (error) {
      child.kill('SIGKILL');
      rmSync(dataDirectory, { recursive: true, force: true });
      throw error;
    }
  }

  async stop(): Promise<void> {
    if (this.child.exitCode === null && this.child.signalCode === null) {
      const exited = once(this.child, 'exit');
      this.child.kill('SIGTERM');
      await exited;
    }
    rmSync(this.dataDirectory, { recursive: true, force: true });
  }
}

function addressOf(child: ChildProcess): Promise<string> {
  return new Promise((resolve, reject) => {
    let words = '';
    const fail = () => reject(new Error(`The server did not start:\n${words}`));
    const limit = setTimeout(fail, START_MILLISECONDS);
    const read = (piece: Buffer): void => {
      words += piece.toString();
      const [, address] = /Resistry answers at (\S+)\n/.exec(words) ?? [];
      if (address === undefined) return;
      clearTimeout(limit);
      // From here on nobody keeps the log; the pipes still have to be emptied.
      for (const stream of [child.stdout, child.stderr]) stream?.off('data', read).resume();
      resolve(address);
    };
    child.stdout?.on('data', read);
    child.stderr?.on('data', read);
    child.once('exit', () => {
      clearTimeout(limit);
      fail();
    });
  });
}
