import { existsSync } from 'node:fs';
import { installDebianPackages } from './debian-packages.mjs';

/** Debian's own browser: the tests download none. */
export const CHROMIUM = '/usr/bin/chromium';

/** @returns {Promise<boolean>} whether the browser tests can run here */
export async function provideBrowser() {
  if (existsSync(CHROMIUM)) return true;
  return (await installDebianPackages(['chromium'], 'testing in a browser')) && existsSync(CHROMIUM);
}
