import { runNode } from '../processes/run.mjs';
import { filesUnder } from '../build/hash-files.mjs';
import { inRepository } from '../repository.mjs';
import { countEnding, countTap } from './counts.mjs';

/** Runs the tests of these scripts and of the documents, which need no package. */
export async function runNodeTests(limitMinutes) {
  const files = filesUnder(inRepository('scripts')).filter((file) => file.endsWith('.test.mjs'));
  const ending = await runNode(['--test', '--test-reporter=tap', ...files], {
    limitMinutes,
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  const counts = countEnding(ending, () => countTap(ending.output));
  if (counts.failed > 0) console.log(ending.output);
  return counts;
}
