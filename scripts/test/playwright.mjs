import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { provideBrowser } from '../machine/browser.mjs';
import { runNode } from '../processes/run.mjs';
import { inRepository, TOOLS } from '../repository.mjs';
import { countEnding, countPlaywright } from './counts.mjs';
import { inTemporaryFolder } from './temporary-folder.mjs';

/** Runs the browser tests over the built application. */
export async function runPlaywright(limitMinutes) {
  if (!(await provideBrowser())) return { passed: 0, failed: 1 };
  return inTemporaryFolder(async (folder) => {
    const report = join(folder, 'report.json');
    const ending = await runNode([TOOLS.playwright, 'test', '--reporter=list,json'], {
      cwd: inRepository('e2e'),
      variables: { PLAYWRIGHT_JSON_OUTPUT_FILE: report },
      limitMinutes,
    });
    return countEnding(ending, () => countPlaywright(JSON.parse(readFileSync(report, 'utf8'))));
  });
}
