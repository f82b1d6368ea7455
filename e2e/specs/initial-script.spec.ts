import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';
import { expect, test } from '@playwright/test';

const PAGES = join(__dirname, '../../frontend/dist');
const LARGEST_KILOBYTES = 260;

/** What a browser fetches before it shows anything: the scripts of index.html and those it announces. */
function initialScripts(): string[] {
  const html = readFileSync(join(PAGES, 'index.html'), 'utf8');
  const scripts = html.matchAll(/<script[^>]* src="([^"]+)"/g);
  const preloads = html.matchAll(/<link rel="modulepreload"[^>]* href="([^"]+)"/g);
  return [...scripts, ...preloads].map(([, address = '']) => address);
}

test('the initial script is small enough for a slow line', () => {
  const addresses = initialScripts();
  expect(addresses.length).toBeGreaterThan(0);
  const sizes = addresses.map((address) => gzipSync(readFileSync(join(PAGES, address)), { level: 9 }).length);
  const kilobytes = sizes.reduce((sum, size) => sum + size, 0) / 1000;
  expect(kilobytes).toBeLessThanOrEqual(LARGEST_KILOBYTES);
});
