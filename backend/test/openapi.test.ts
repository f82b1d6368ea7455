import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { buildDocument, documentText } from '../src/openapi/build-document';

describe('the description of the API', () => {
  it('is the one in openapi.json: run `npm run generate` after a change of a route or a DTO', async () => {
    const written = readFileSync(join(__dirname, '..', 'openapi.json'), 'utf8');
    expect(documentText(await buildDocument())).toBe(written);
  });

  it('gives every operation a name of its own, for the functions of the generated client', async () => {
    const { paths } = await buildDocument();
    const names = Object.values(paths).flatMap((path) =>
      [path.get, path.post, path.put, path.patch, path.delete].flatMap((operation) =>
        operation ? [operation.operationId] : [],
      ),
    );
    expect(names.length).toBeGreaterThan(20);
    expect(names.filter((name) => !/^[a-z][A-Za-z]+$/.test(name ?? ''))).toEqual([]);
    expect(new Set(names).size).toBe(names.length);
  });
});
