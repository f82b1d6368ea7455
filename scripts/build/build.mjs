import { existsSync } from 'node:fs';
import { runNode } from '../processes/run.mjs';
import { say, secondsSince } from '../say.mjs';
import { hashFiles } from './hash-files.mjs';
import { readStamp, removeStamp, writeStamp } from './stamps.mjs';
import { STEPS } from './steps.mjs';

/**
 * Builds what has changed since it was last built.
 *
 * @param {string[]} [names] the steps to take; all of them unless given
 * @returns {Promise<boolean>} whether everything is built now
 */
export async function build(names = STEPS.map((step) => step.name)) {
  for (const step of STEPS.filter(({ name }) => names.includes(name))) {
    if (!(await take(step))) return false;
  }
  return true;
}

async function take({ name, words, cwd, inputs, result, finish }) {
  const stampName = `build-${name}`;
  const stamp = hashFiles(inputs);
  if (readStamp(stampName) === stamp && existsSync(result)) return true;
  const start = performance.now();
  say(`Building ${name}`);
  removeStamp(stampName);
  const { code } = await runNode(words, { cwd, limitMinutes: 10 });
  if (code !== 0) {
    say(`Building ${name} failed`);
    return false;
  }
  finish?.();
  writeStamp(stampName, stamp);
  say(`Built ${name} in ${secondsSince(start)}`);
  return true;
}
