import { spawn, type ChildProcess } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { createServer } from 'node:net';
import { join } from 'node:path';

/** A server process of the benchmark's own, on a free port of the loopback interface. */
export interface Server {
  url: string;
  /** Resident memory, MB: now and at its highest. */
  memory(): { now: number; peak: number };
  stop(): Promise<void>;
}

/** Starts the built server on a data directory and waits until it answers. */
export async function startServer(dataDirectory: string): Promise<Server> {
  const port = await freePort();
  const child = spawn(process.execPath, [join(__dirname, '..', '..', 'main.js')], {
    // As `npm start` sets it.
    env: {
      MALLOC_ARENA_MAX: '2',
      ...process.env,
      DATA_DIR: dataDirectory,
      SEED: 'demo',
      PORT: String(port),
      HOST: '127.0.0.1',
    },
    stdio: ['ignore', 'ignore', 'inherit'],
  });
  const url = `http://127.0.0.1:${String(port)}`;
  await answered(child, url);
  return {
    url,
    memory: () => memoryOf(child.pid ?? 0),
    stop: () =>
      new Promise((resolve) => {
        child.once('exit', () => resolve());
        child.kill('SIGTERM');
      }),
  };
}

async function answered(child: ChildProcess, url: string): Promise<void> {
  for (let tries = 0; tries < 1200; tries += 1) {
    if (child.exitCode !== null) throw new Error(`The server ended with ${String(child.exitCode)}.`);
    const answers = await fetch(`${url}/api/health`).then(
      (response) => response.ok,
      () => false,
    );
    if (answers) return;
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  child.kill('SIGTERM');
  throw new Error('The server did not answer within two minutes.');
}

function memoryOf(pid: number): { now: number; peak: number } {
  const status = readFileSync(`/proc/${String(pid)}/status`, 'utf8');
  const kilobytes = (name: string): number =>
    Number(new RegExp(`${name}:\\s+(\\d+)`).exec(status)?.[1] ?? NaN);
  return { now: kilobytes('VmRSS') / 1024, peak: kilobytes('VmHWM') / 1024 };
}

function freePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once('error', reject);
    server.listen(0, '127.0.0.1', () => {
      const address = server.address();
      server.close(() =>
        typeof address === 'object' && address !== null
          ? resolve(address.port)
          : reject(new Error('no port')),
      );
    });
  });
}
