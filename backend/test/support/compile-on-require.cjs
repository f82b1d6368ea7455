/**
 * Lets Node run the TypeScript sources as they are, for tests that need a process of their own to signal or to kill:
 * `node --conditions=source --require <this> src/main.ts`. Jest's transform does the same for everything else.
 */
const { readFileSync } = require('node:fs');
const Module = require('node:module');
const { transformSync } = require('@swc/core');
const jest = require('../../jest.config.cjs');

const [, options] = jest.transform['^.+\\.ts$'];

Module._extensions['.ts'] = (module, file) => {
  const { code } = transformSync(readFileSync(file, 'utf8'), { ...options, filename: file, swcrc: false });
  module._compile(code, file);
};
