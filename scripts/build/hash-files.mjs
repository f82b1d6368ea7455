import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import { join, relative } from 'node:path';
import { ROOT } from '../repository.mjs';

/** Tests are no input of a build, so changing one does not build again. */
const isTest = (path) => /\.test\.[a-z]+$/.test(path);

/** Every file at or below a path, sorted, so that the order of the disk does not matter. A missing path has none. */
export function filesUnder(path) {
  if (!existsSync(path)) return [];
  if (!statSync(path).isDirectory()) return [path];
  return readdirSync(path)
    .sort()
    .flatMap((name) => filesUnder(join(path, name)));
}

/** SHA-256 over names and contents of everything under the given paths, in hexadecimal. */
export function hashFiles(paths, root = ROOT) {
  const hash = createHash('sha256');
  for (const file of paths.flatMap(filesUnder)) {
    if (isTest(file)) continue;
    // The lengths keep a name from running into its contents.
    const contents = readFileSync(file);
    hash.update(`${relative(root, file)}\0${contents.length}\0`).update(contents);
  }
  return hash.digest('hex');
}
