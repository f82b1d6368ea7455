import { existsSync } from 'node:fs';
import { run } from '../processes/run.mjs';
import { say } from '../say.mjs';

const QUIET = { DEBIAN_FRONTEND: 'noninteractive' };

const mayInstall = () => process.getuid?.() === 0 && existsSync('/etc/debian_version');

/** The line that a person types to get the packages. */
export const installLine = (packages) =>
  `sudo apt-get update && sudo apt-get install -y --no-install-recommends ${packages.join(' ')}`;

/**
 * Installs Debian packages where this is Debian and we are root, and otherwise says how to.
 *
 * @param {string[]} packages
 * @param {string} purpose what they are for, in words
 * @returns {Promise<boolean>} whether they are there now
 */
export async function installDebianPackages(packages, purpose) {
  if (!mayInstall()) {
    say(`${purpose} needs ${packages.join(', ')}. On Debian, install with:`);
    console.log(installLine(packages));
    return false;
  }
  say(`Installing ${packages.join(', ')} (${purpose})`);
  const update = await run('apt-get', ['update', '-q'], { variables: QUIET, limitMinutes: 5 });
  if (update.code !== 0) return false;
  const words = ['install', '-y', '-q', '--no-install-recommends', ...packages];
  const install = await run('apt-get', words, { variables: QUIET, limitMinutes: 10 });
  return install.code === 0;
}
