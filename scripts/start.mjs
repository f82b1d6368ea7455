/*
 * `npm start`: builds what is not built, then runs the server with the demonstration unless SEED says otherwise. The
 * server is a process group of its own, so that a terminal's Ctrl-C reaches it once, through here, and it can finish
 * what it is answering.
 */
import { spawn } from 'node:child_process';
import { build } from './build/build.mjs';
import { accountLines } from './demonstration.mjs';
import { onSignals } from './processes/pass-signals-on.mjs';
import { endAll } from './processes/run.mjs';
import { inRepository, ROOT } from './repository.mjs';
import { say } from './say.mjs';

const SEED = process.env.SEED || 'demo';

let stop = () => {
  endAll();
  process.exit(130);
};
let stopAtOnce = () => process.exit(130);
onSignals(
  () => stop(),
  () => stopAtOnce(),
);

if (await build()) serve();
else process.exitCode = 1;

function serve() {
  say(
    SEED === 'demo'
      ? 'Starting the server; the first start fills the database with the demonstration, which takes some seconds'
      : 'Starting the server',
  );
  const server = spawn(process.execPath, [inRepository('backend/dist/main.js')], {
    cwd: ROOT,
    // Without it the C library keeps a heap for every thread, and none is ever given back.
    env: { MALLOC_ARENA_MAX: '2', ...process.env, SEED },
    stdio: ['ignore', 'pipe', 'inherit'],
    detached: true,
  });
  stop = () => server.kill('SIGTERM');
  stopAtOnce = () => server.kill('SIGKILL');
  let words = '';
  server.stdout.on('data', (piece) => {
    process.stdout.write(piece);
    if (words === undefined) return;
    words += piece;
    const [, address] = /Resistry answers at (\S+)\n/.exec(words) ?? [];
    if (address === undefined) return;
    words = undefined;
    announce(address);
  });
  server.once('error', (error) => {
    say(`The server could not be started: ${error.message}`);
    process.exitCode = 1;
  });
  server.once('close', (code) => (process.exitCode = code ?? 1));
}

function announce(address) {
  if (SEED === 'demo') console.log(`\n${accountLines().join('\n')}`);
  console.log(`\nOpen ${address} – Ctrl-C stops it.\n`);
}
