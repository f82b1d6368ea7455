import { build } from '../build/build.mjs';
import { TOOLS } from '../repository.mjs';
import { compareGenerated } from './generated.mjs';
import { gate } from './gate.mjs';
import { runJest } from './jest.mjs';
import { runNodeTests } from './node-tests.mjs';
import { runPlaywright } from './playwright.mjs';

const WORKSPACES = ['backend/engineering', 'backend', 'frontend', 'e2e'];

const types = (workspace) => [TOOLS.typescript, '--noEmit', '-p', workspace];

/**
 * Everything that `npm test` runs, cheapest first. Each has a limit of its own after which it is ended and counts as
 * failed; they go on after one that failed, so that one run shows all there is to mend.
 *
 * `run(limitMinutes)` gives `{ passed, failed }`; `needsBuild` says that it works on what `build` makes.
 */
export const RUNNERS = [
  {
    name: 'build',
    limitMinutes: 10,
    run: async () => ((await build()) ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 }),
  },
  { name: 'scripts', limitMinutes: 2, run: runNodeTests },
  { name: 'format', limitMinutes: 4, run: gate([TOOLS.prettier, '--check', '--log-level', 'warn', '.']) },
  { name: 'lint', limitMinutes: 8, run: gate([TOOLS.eslint, '.', '--max-warnings', '0']) },
  { name: 'types', limitMinutes: 6, run: gate(...WORKSPACES.map(types)) },
  { name: 'generated', limitMinutes: 3, needsBuild: true, run: compareGenerated },
  { name: 'engineering', limitMinutes: 8, run: runJest('backend/engineering') },
  { name: 'backend', limitMinutes: 15, run: runJest('backend') },
  { name: 'frontend', limitMinutes: 8, run: runJest('frontend') },
  { name: 'e2e', limitMinutes: 15, needsBuild: true, run: runPlaywright },
];
