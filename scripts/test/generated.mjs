import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { runNode } from '../processes/run.mjs';
import { inRepository, TOOLS } from '../repository.mjs';
import { say } from '../say.mjs';
import { sum } from './counts.mjs';
import { inTemporaryFolder } from './temporary-folder.mjs';

const DOCUMENT = 'backend/openapi.json';
const CLIENT = 'frontend/src/api/generated/schema.ts';

/**
 * What is generated is in the repository, so that a change of the API shows in a review; here it is generated again,
 * elsewhere, and must come out the same. The client comes from the document as it is kept: one test each.
 */
export function compareGenerated(limitMinutes) {
  return inTemporaryFolder(async (folder) => {
    const document = join(folder, 'openapi.json');
    const client = join(folder, 'schema.ts');
    return sum([
      await compare(
        DOCUMENT,
        document,
        [inRepository('backend/dist/openapi/write.js'), document],
        limitMinutes,
      ),
      await compare(
        CLIENT,
        client,
        [TOOLS.openapiTypescript, inRepository(DOCUMENT), '-o', client],
        limitMinutes,
      ),
    ]);
  });
}

async function compare(kept, generated, words, limitMinutes) {
  const { code } = await runNode(words, { limitMinutes });
  const same = code === 0 && readFileSync(generated, 'utf8') === readFileSync(inRepository(kept), 'utf8');
  if (!same) say(`${kept} is not what the sources generate: run npm run build && npm run generate`);
  return { passed: Number(same), failed: Number(!same) };
}
