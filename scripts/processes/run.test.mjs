import assert from 'node:assert/strict';
import { test } from 'node:test';
import { run, runNode } from './run.mjs';

const PIPED = { stdio: ['ignore', 'pipe', 'ignore'] };

test('a command gives its code and what it wrote', async () => {
  const ending = await runNode(['-e', 'console.log("ohm"); process.exitCode = 3'], PIPED);
  assert.deepEqual(ending, { code: 3, timedOut: false, output: 'ohm\n' });
});

test('a command that does not exist fails and does not throw', async () => {
  const ending = await run('/nowhere/at-all', [], PIPED);
  assert.equal(ending.code, 127);
});

test('one that hangs is ended with what it started, and says so', async () => {
  // The grandchild keeps the pipe open: were it left running, this would wait for its whole minute.
  const grandchild = 'setTimeout(() => undefined, 60000)';
  const child = `require('node:child_process').spawn(process.execPath, ['-e', ${JSON.stringify(grandchild)}], { stdio: 'inherit' })`;
  const ending = await runNode(['-e', child], { ...PIPED, limitMinutes: 0.01 });
  assert.equal(ending.timedOut, true);
  assert.equal(ending.code, 143);
});
