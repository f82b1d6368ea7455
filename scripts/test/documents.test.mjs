import assert from 'node:assert/strict';
import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { test } from 'node:test';
import { inRepository } from '../repository.mjs';
import { RUNNERS } from './runners.mjs';

const DOCUMENTS = ['README.md', 'DEVELOPERS.md', 'seed-data/README.md'];

const read = (path) => readFileSync(inRepository(path), 'utf8');
const scriptsOf = (workspace) => JSON.parse(read(join(workspace, 'package.json'))).scripts;
const matches = (text, pattern) => [...text.matchAll(pattern)].map(([, found]) => found);

const foldersIn = (path) =>
  readdirSync(inRepository(path), { withFileTypes: true })
    .filter((entry) => entry.isDirectory())
    .map((entry) => `${path}/${entry.name}`);

/** The fenced blocks of a kind, and what remains without any. */
const block = (text, kind) => new RegExp('^```' + kind + '\\n([^]*?)^```', 'm').exec(text)?.[1] ?? '';
const withoutBlocks = (text) => text.replace(/^```[^]*?^```/gm, '');

/** What stands in code within a sentence. */
const codes = (text) => matches(withoutBlocks(text), /`([^`\n]+)`/g);

/** A path from the root, or beside the document: it has a slash or a known ending, and no place left to fill in. */
const isPath = (code) =>
  /^[\w.-]+(?:\/[\w.-]*)*$/.test(code) && (code.includes('/') || /\.(?:ts|tsx|mjs|md|yml|json)$/.test(code));

for (const document of DOCUMENTS) {
  const text = read(document);

  test(`${document} names only files and folders that exist`, () => {
    const named = codes(text).filter(isPath);
    assert.ok(named.length > 0);
    // A file is named alone where its folder has just been named.
    const folders = [
      '.',
      dirname(document),
      ...named.filter((path) => path.includes('/')).map((path) => dirname(path)),
    ];
    const exists = (path) =>
      existsSync(inRepository(path)) ||
      (!path.includes('/') && folders.some((folder) => existsSync(inRepository(folder, path)))) ||
      existsSync(inRepository(dirname(document), path));
    assert.deepEqual(
      named.filter((path) => !exists(path)),
      [],
    );
  });

  test(`${document} links only to what exists`, () => {
    const targets = matches(text, /\]\(([^)]+)\)/g).filter((target) => !/^https?:/.test(target));
    assert.deepEqual(
      targets.filter((target) => !existsSync(inRepository(dirname(document), target))),
      [],
    );
  });

  test(`${document} names only commands that exist`, () => {
    const commands = [...codes(text), ...block(text, '').split('\n')].filter((code) =>
      /^npm (?:run|start|test)\b/.test(code),
    );
    for (const command of commands) {
      const [, run, direct] = /^npm (?:run ([\w:-]+)|(start|test))/.exec(command);
      const [, workspace] = / -w (\S+)/.exec(command) ?? [];
      assert.ok((run ?? direct) in scriptsOf(workspace ?? '.'), command);
    }
  });

  test(`${document} speaks of no machine`, () => {
    assert.doesNotMatch(text, /(?:\/home\/|\/root|\/tmp\/|\/usr\/|registry\.|localhost:(?!3000\b))/);
  });
}

test('the map names what exists, and every folder of the sources', () => {
  const places = block(read('DEVELOPERS.md'), 'map')
    .split('\n')
    .filter(Boolean)
    .map((line) => line.split(/\s/)[0]);
  assert.ok(places.length > 40);
  assert.deepEqual(
    places.filter((place) => !existsSync(inRepository(place))),
    [],
  );
  const unnamed = ['backend/engineering/src', 'backend/src', 'frontend/src'].flatMap((folder) =>
    foldersIn(folder).filter((path) => !places.includes(path) && !path.endsWith('/test-support')),
  );
  assert.deepEqual(unnamed, []);
});

test('the table of variables is what the code reads', () => {
  const code = matches(read('backend/src/config/environment.ts'), /given\('(\w+)'\)/g);
  const table = matches(read('DEVELOPERS.md'), /^\| `([A-Z_]+)`/gm);
  assert.deepEqual([...table].sort(), [...new Set(code)].sort());
});

test('the runners that can be chosen are those there are', () => {
  const [, named] = /some of them: ([a-z0-9, ]+)/.exec(read('DEVELOPERS.md'));
  assert.deepEqual(
    named.trim().split(', '),
    RUNNERS.map((runner) => runner.name),
  );
});

test('the accounts of the README are those of the demonstration', () => {
  const { domain, knownPassword, people } = JSON.parse(read('seed-data/people.json'));
  const known = people.filter((person) => person.signsIn).map(({ address }) => `${address}@${domain}`);
  const readme = read('README.md');
  assert.deepEqual(matches(readme, /^\| `([^`]+@[^`]+)`/gm).sort(), known.sort());
  assert.ok(readme.includes(`\`${knownPassword}\``));
});

test('no picture weighs more than 200 kB', () => {
  const pictures = matches(read('README.md'), /!\[[^\]]*\]\(([^)]+)\)/g);
  assert.ok(pictures.length >= 4);
  for (const picture of pictures) assert.ok(readFileSync(inRepository(picture)).length < 200_000, picture);
});
