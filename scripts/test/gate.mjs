import { runNode } from '../processes/run.mjs';
import { sum } from './counts.mjs';

/**
 * A runner of commands that pass or fail as a whole; each counts as one test. They share the runner's minutes.
 *
 * @param {...string[]} commands the words that follow `node`
 */
export function gate(...commands) {
  return async (limitMinutes) => {
    const end = performance.now() + limitMinutes * 60_000;
    const counts = [];
    for (const words of commands) {
      const left = Math.max(end - performance.now(), 0) / 60_000;
      const { code } = await runNode(words, { limitMinutes: left });
      counts.push({ passed: Number(code === 0), failed: Number(code !== 0) });
    }
    return sum(counts);
  };
}
