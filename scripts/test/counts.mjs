/**
 * What the runners' own reports say, as `{ passed, failed }`. Whatever did not run to its end counts as failed: a test
 * file that could not be read has no tests of its own to fail.
 */
export const NOTHING = { passed: 0, failed: 0 };

/** @param {{ passed: number, failed: number }[]} counts */
export function sum(counts) {
  return counts.reduce(
    (total, { passed, failed }) => ({ passed: total.passed + passed, failed: total.failed + failed }),
    NOTHING,
  );
}

/** The line that `npm test` ends with. */
export const totalLine = ({ passed, failed }) => `${passed} passed, ${failed} failed`;

/** @param {object} report what jest's `--json` writes */
export function countJest({ numPassedTests, numFailedTests, numRuntimeErrorTestSuites }) {
  return { passed: numPassedTests, failed: numFailedTests + numRuntimeErrorTestSuites };
}

/** @param {object} report what Playwright's `json` reporter writes; a test that passed when repeated is passed */
export function countPlaywright({ stats, errors }) {
  return { passed: stats.expected + stats.flaky, failed: stats.unexpected + errors.length };
}

/** @param {string} text what `node --test` writes in the TAP format */
export function countTap(text) {
  const number = (name) => Number(new RegExp(`^# ${name} (\\d+)$`, 'm').exec(text)?.[1]);
  const counts = { passed: number('pass'), failed: number('fail') + number('cancelled') };
  if (Number.isNaN(counts.passed + counts.failed)) throw new Error('The report has no summary.');
  return counts;
}

/**
 * Joins a report with how its process ended.
 *
 * @param {{ code: number, timedOut: boolean }} ending
 * @param {() => { passed: number, failed: number }} read throws when there is no whole report
 */
export function countEnding({ code, timedOut }, read) {
  let counts;
  try {
    counts = read();
  } catch {
    return { passed: 0, failed: 1 };
  }
  // A runner that ends badly without naming a failed test has failed all the same.
  const endedBadly = timedOut || (code !== 0 && counts.failed === 0);
  return endedBadly ? { ...counts, failed: counts.failed + 1 } : counts;
}
