import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

/** A folder that is there for one test and gone after it. */
export function temporaryFolder(): { path: (name: string) => string } {
  let folder = '';
  beforeEach(() => {
    folder = mkdtempSync(join(tmpdir(), 'resistry-test-'));
  });
  afterEach(() => {
    rmSync(folder, { recursive: true, force: true });
  });
  return { path: (name) => join(folder, name) };
}
