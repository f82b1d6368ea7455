import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** Absolute path of the repository's root: every script may be called from anywhere. */
export const ROOT = fileURLToPath(new URL('..', import.meta.url));

/** @param {...string} parts path from the root */
export const inRepository = (...parts) => join(ROOT, ...parts);

/** A command-line tool of an installed package, to be run by this Node: no shell and no PATH in between. */
export const TOOLS = {
  typescript: inRepository('node_modules/typescript/bin/tsc'),
  vite: inRepository('node_modules/vite/bin/vite.js'),
  eslint: inRepository('node_modules/eslint/bin/eslint.js'),
  prettier: inRepository('node_modules/prettier/bin/prettier.cjs'),
  jest: inRepository('node_modules/jest/bin/jest.js'),
  playwright: inRepository('node_modules/@playwright/test/cli.js'),
  openapiTypescript: inRepository('node_modules/openapi-typescript/bin/cli.js'),
};
