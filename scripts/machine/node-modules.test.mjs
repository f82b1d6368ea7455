import assert from 'node:assert/strict';
import { spawnSync } from 'node:child_process';
import { test } from 'node:test';
import { inRepository } from '../repository.mjs';

test('the SQLite binding is compiled, not fetched from a host that is no package registry', () => {
  const words = ['../prebuild-install/bin.js', '-r', 'napi', '--verbose'];
  const { status, stderr, stdout } = spawnSync(process.execPath, words, {
    cwd: inRepository('node_modules/sqlite3'),
    encoding: 'utf8',
  });
  assert.equal(status, 1);
  assert.match(stdout + stderr, /--build-from-source specified, not attempting download/);
});
