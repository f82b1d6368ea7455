import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { REPOSITORY_ROOT } from '../config/environment';
import { buildDocument, documentText } from './build-document';

/**
 * `npm run generate -w backend`: writes the description of the API that the browser's client is generated from. Given
 * a path it writes there, which is how the kept one is compared without being touched.
 */
async function main(): Promise<void> {
  const file = process.argv[2] ?? join(REPOSITORY_ROOT, 'backend', 'openapi.json');
  writeFileSync(file, documentText(await buildDocument()));
  process.stdout.write(`Wrote ${file}\n`);
}

main().catch((error: unknown) => {
  process.stderr.write(`${error instanceof Error ? (error.stack ?? error.message) : String(error)}\n`);
  process.exitCode = 1;
});
