import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { runNode } from '../processes/run.mjs';
import { inRepository, TOOLS } from '../repository.mjs';
import { countEnding, countJest } from './counts.mjs';
import { inTemporaryFolder } from './temporary-folder.mjs';

/** jest alone would take one worker less than there are cores, which leaves one idle on the smallest machines. */
const WORKERS = '2';

/** A runner of the jest tests of one workspace. */
export function runJest(workspace) {
  return (limitMinutes) =>
    inTemporaryFolder(async (folder) => {
      const report = join(folder, 'report.json');
      const ending = await runNode(
        [TOOLS.jest, '--ci', '--json', `--outputFile=${report}`, `--maxWorkers=${WORKERS}`],
        // The report goes to the file; jest prints it as well, which nobody reads.
        { cwd: inRepository(workspace), limitMinutes, stdio: ['ignore', 'ignore', 'inherit'] },
      );
      return countEnding(ending, () => countJest(JSON.parse(readFileSync(report, 'utf8'))));
    });
}
