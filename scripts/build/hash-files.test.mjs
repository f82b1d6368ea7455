import assert from 'node:assert/strict';
import { mkdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { test } from 'node:test';
import { inTemporaryFolder } from '../test/temporary-folder.mjs';
import { hashFiles } from './hash-files.mjs';
import { readStamp, removeStamp, writeStamp } from './stamps.mjs';

test('a hash changes with contents and names, and not with tests or the absence of a path', () =>
  inTemporaryFolder((folder) => {
    const write = (name, text) => writeFileSync(join(folder, name), text);
    const hash = () => hashFiles([join(folder, 'src'), join(folder, 'absent')], folder);
    mkdirSync(join(folder, 'src/inner'), { recursive: true });
    write('src/one.ts', 'ab');
    write('src/inner/two.ts', 'c');
    const first = hash();
    write('src/one.test.ts', 'it()');
    assert.equal(hash(), first);
    write('src/one.ts', 'a');
    write('src/inner/two.ts', 'bc');
    assert.notEqual(hash(), first);
    write('src/one.ts', 'ab');
    write('src/inner/two.ts', 'c');
    assert.equal(hash(), first);
    write('src/three.ts', '');
    assert.notEqual(hash(), first);
  }));

test('a stamp is there once it is written and gone once it is removed', () =>
  inTemporaryFolder((folder) => {
    assert.equal(readStamp('backend', join(folder, 'stamps')), undefined);
    writeStamp('backend', '1a2b', join(folder, 'stamps'));
    assert.equal(readStamp('backend', join(folder, 'stamps')), '1a2b');
    removeStamp('backend', join(folder, 'stamps'));
    assert.equal(readStamp('backend', join(folder, 'stamps')), undefined);
  }));
