import { createHash } from 'node:crypto';
import { existsSync, readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { readStamp, removeStamp, writeStamp } from '../build/stamps.mjs';
import { run } from '../processes/run.mjs';
import { inRepository } from '../repository.mjs';
import { say, secondsSince } from '../say.mjs';

const STAMP = 'node_modules';

/** The lock file and the binary interface that native packages were compiled for decide what is installed. */
function wanted() {
  const lock = createHash('sha256')
    .update(readFileSync(inRepository('package-lock.json')))
    .digest('hex');
  return `${lock} node-abi-${process.versions.modules} ${process.platform}-${process.arch}`;
}

/** Without Node's own headers beside it, compiling fetches them from a host that is no package registry. */
function headersVariable() {
  const prefix = dirname(dirname(process.execPath));
  return existsSync(join(prefix, 'include/node/node.h')) ? { npm_config_nodedir: prefix } : {};
}

/** @returns {Promise<boolean>} whether the packages of the lock file are in place */
export async function installNodeModules() {
  const stamp = wanted();
  if (readStamp(STAMP) === stamp && existsSync(inRepository('node_modules'))) return true;
  say('Installing the packages of package-lock.json (about three minutes; SQLite is compiled on the way)');
  const start = performance.now();
  removeStamp(STAMP);
  const { code } = await run('npm', ['ci', '--include=dev', '--no-fund', '--no-audit'], {
    variables: {
      ...headersVariable(),
      SCARF_ANALYTICS: 'false',
    },
    limitMinutes: 20,
  });
  if (code !== 0) return false;
  writeStamp(STAMP, stamp);
  say(`Packages installed in ${secondsSince(start)}`);
  return true;
}
