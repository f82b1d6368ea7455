import { spawnSync } from 'node:child_process';
import { installDebianPackages } from './debian-packages.mjs';

/** What compiling the SQLite binding calls, and the Debian packages that bring it. */
const TOOLS = [
  { command: 'make', packageName: 'make' },
  { command: 'g++', packageName: 'g++' },
  { command: 'python3', packageName: 'python3' },
];

/** Runs, and not only exists: a version manager may leave a `python3` that has no Python behind it. */
const works = ({ command }) => spawnSync(command, ['--version'], { stdio: 'ignore' }).status === 0;

/** @returns {Promise<boolean>} whether a native package can be compiled here */
export async function provideCompiler() {
  const missing = TOOLS.filter((tool) => !works(tool));
  if (missing.length === 0) return true;
  const names = missing.map((tool) => tool.packageName);
  return (await installDebianPackages(names, 'compiling the SQLite binding')) && TOOLS.every(works);
}
