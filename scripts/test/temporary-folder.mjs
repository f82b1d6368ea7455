import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

/** Calls `use` with the path of an empty folder that is gone afterwards: a test run rewrites nothing in the tree. */
export async function inTemporaryFolder(use) {
  const folder = mkdtempSync(join(tmpdir(), 'resistry-test-'));
  try {
    return await use(folder);
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}
