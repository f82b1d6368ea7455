import assert from 'node:assert/strict';
import { test } from 'node:test';
import { countEnding, countJest, countPlaywright, countTap, sum, totalLine } from './counts.mjs';

const ENDED_WELL = { code: 0, timedOut: false };
const ENDED_BADLY = { code: 1, timedOut: false };

test('a jest file that could not be read counts as failed beside the failed tests', () => {
  const report = { numPassedTests: 7, numFailedTests: 2, numRuntimeErrorTestSuites: 1 };
  assert.deepEqual(countJest(report), { passed: 7, failed: 3 });
});

test('a browser test that passed when repeated is passed, an error outside of any test is a failure', () => {
  const report = { stats: { expected: 4, flaky: 1, unexpected: 2, skipped: 3 }, errors: [{}] };
  assert.deepEqual(countPlaywright(report), { passed: 5, failed: 3 });
});

test('a summary in TAP gives its counts, and a text without one gives none', () => {
  assert.deepEqual(countTap('ok 1\n# pass 5\n# fail 1\n# cancelled 1\n'), { passed: 5, failed: 2 });
  assert.throws(() => countTap('Segmentation fault'));
});

test('a runner that ended badly is failed even when its report names no failed test', () => {
  const read = () => ({ passed: 9, failed: 0 });
  assert.deepEqual(countEnding(ENDED_WELL, read), { passed: 9, failed: 0 });
  assert.deepEqual(countEnding(ENDED_BADLY, read), { passed: 9, failed: 1 });
  assert.deepEqual(
    countEnding({ code: 143, timedOut: true }, () => ({ passed: 9, failed: 2 })),
    {
      passed: 9,
      failed: 3,
    },
  );
});

test('a runner without a report is one failure, whatever its code', () => {
  const read = () => {
    throw new Error('no such file');
  };
  assert.deepEqual(countEnding(ENDED_WELL, read), { passed: 0, failed: 1 });
});

test('the last line adds everything up', () => {
  const total = sum([
    { passed: 3, failed: 0 },
    { passed: 4, failed: 2 },
  ]);
  assert.equal(totalLine(total), '7 passed, 2 failed');
});
