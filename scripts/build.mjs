/* `npm run build`: engineering, backend and frontend, each only when something it is made from has changed. */
import { build } from './build/build.mjs';
import { onSignals } from './processes/pass-signals-on.mjs';
import { endAll } from './processes/run.mjs';

onSignals(endAll);

if (!(await build())) process.exitCode = 1;
