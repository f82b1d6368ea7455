/*
 * `npm run dev`: compiles and restarts the server as its sources change and serves the pages from their sources, with
 * the API behind the same address. One Ctrl-C ends all of it; when one of them ends by itself, so do the others.
 */
import { build } from './build/build.mjs';
import { accountLines } from './demonstration.mjs';
import { onSignals } from './processes/pass-signals-on.mjs';
import { endAll, runNode } from './processes/run.mjs';
import { inRepository, TOOLS } from './repository.mjs';
import { say } from './say.mjs';

const PAGES_PORT = 5173;
const variables = {
  SEED: process.env.SEED || 'demo',
  PORT: process.env.PORT || '3000',
  // Links in mail lead to the pages as they are being worked on.
  APP_URL: process.env.APP_URL || `http://127.0.0.1:${PAGES_PORT}`,
};
const watch = [TOOLS.typescript, '-p', 'tsconfig.build.json', '--watch', '--preserveWatchOutput'];

onSignals(endAll);

if (await build(['engineering', 'backend'])) {
  if (variables.SEED === 'demo') console.log(accountLines().join('\n'));
  say(
    `The pages are at http://127.0.0.1:${PAGES_PORT}, the API at port ${variables.PORT}; Ctrl-C stops both`,
  );
  const parts = [
    runNode(watch, { cwd: inRepository('backend/engineering') }),
    runNode(watch, { cwd: inRepository('backend') }),
    runNode(['--watch', '--watch-preserve-output', inRepository('backend/dist/main.js')], { variables }),
    runNode([TOOLS.vite, '--strictPort', '--port', String(PAGES_PORT)], {
      cwd: inRepository('frontend'),
      variables,
    }),
  ];
  const { code } = await Promise.race(parts);
  endAll();
  await Promise.all(parts);
  process.exitCode = code;
} else {
  process.exitCode = 1;
}
