import { readdirSync, readFileSync } from 'node:fs';
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

it('no two classes of the wire share a name, of which the description would keep only one', () => {
  const source = join(__dirname, '..', 'src');
  const names = readdirSync(source, { recursive: true, encoding: 'utf8' })
    .filter((file) => file.endsWith('.dto.ts'))
    .flatMap((file) => [...readFileSync(join(source, file), 'utf8').matchAll(/^(?:export )?class (\w+)/gm)])
    .map(([, name]) => name ?? '');
  expect(names.length).toBeGreaterThan(50);
  expect(names.filter((name, place) => names.indexOf(name) !== place)).toEqual([]);
});
