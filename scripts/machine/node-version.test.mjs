import assert from 'node:assert/strict';
import { readFileSync } from 'node:fs';
import { test } from 'node:test';
import { inRepository } from '../repository.mjs';
import { isNewEnough, NEEDED_VERSION } from './node-version.mjs';

test('versions are compared as numbers', () => {
  assert.deepEqual(['18.99.0', '20.3.1', '20.19.9', '20.20.0', '20.100.0', '22.0.0'].map(isNewEnough), [
    false,
    false,
    false,
    true,
    true,
    true,
  ]);
});

test('package.json asks for the same', () => {
  const { engines } = JSON.parse(readFileSync(inRepository('package.json'), 'utf8'));
  assert.equal(engines.node, `>=${NEEDED_VERSION}`);
});
