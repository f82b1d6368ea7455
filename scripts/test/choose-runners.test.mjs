import assert from 'node:assert/strict';
import { test } from 'node:test';
import { chooseRunners } from './choose-runners.mjs';

const RUNNERS = [{ name: 'build' }, { name: 'lint' }, { name: 'backend' }, { name: 'e2e', needsBuild: true }];
const chosen = (...words) => chooseRunners(words, RUNNERS).map((runner) => runner.name);

test('no words mean every runner', () => {
  assert.deepEqual(chosen(), ['build', 'lint', 'backend', 'e2e']);
});

test('chosen runners keep their order, and bring the build where they work on it', () => {
  assert.deepEqual(chosen('--only', 'backend,lint'), ['lint', 'backend']);
  assert.deepEqual(chosen('--only', 'e2e'), ['build', 'e2e']);
});

test('an unknown name or option is refused, so that a slip never passes as a green run of nothing', () => {
  assert.throws(() => chosen('--only', 'backend,e3e'), /No runner e3e/);
  assert.throws(() => chosen('--only'), /--only name/);
  assert.throws(() => chosen('backend'), /--only name/);
});
