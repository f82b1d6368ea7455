/*
 * Runs before `npm start`, `npm test` and `npm run dev`, so that these two or three commands are all that anybody needs
 * to know on a fresh machine. It uses Node's core only, because nothing is installed yet when it runs, and takes a
 * moment when everything is in place.
 */
import { provideCompiler } from './machine/compiler.mjs';
import { installNodeModules } from './machine/node-modules.mjs';
import { isNewEnough, NEEDED_VERSION } from './machine/node-version.mjs';
import { onSignals } from './processes/pass-signals-on.mjs';
import { endAll } from './processes/run.mjs';
import { say } from './say.mjs';

onSignals(endAll);

async function prepare() {
  if (!isNewEnough(process.versions.node)) {
    say(`Resistry needs Node ${NEEDED_VERSION} or newer, but this is ${process.versions.node}`);
    return false;
  }
  return (await provideCompiler()) && (await installNodeModules());
}

if (!(await prepare())) process.exitCode = 1;
