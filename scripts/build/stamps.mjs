import { mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { inRepository } from '../repository.mjs';

const FOLDER = inRepository('.stamps');

/** What a step was last finished with, or undefined. A stamp is written after the work, so a killed step has none. */
export function readStamp(name, folder = FOLDER) {
  try {
    return readFileSync(join(folder, name), 'utf8');
  } catch (error) {
    if (error.code === 'ENOENT') return undefined;
    throw error;
  }
}

export function writeStamp(name, value, folder = FOLDER) {
  mkdirSync(folder, { recursive: true });
  writeFileSync(join(folder, name), value);
}

/** To be called before the work begins: half a result must not look like a whole one. */
export function removeStamp(name, folder = FOLDER) {
  rmSync(join(folder, name), { force: true });
}
