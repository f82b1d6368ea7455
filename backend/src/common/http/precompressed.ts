import { stat } from 'node:fs/promises';
import { join } from 'node:path';
import type { RequestHandler } from 'express';

const ENCODINGS = [
  { name: 'br', suffix: '.br' },
  { name: 'gzip', suffix: '.gz' },
] as const;

/**
 * Sends `file.br` or `file.gz` in place of `file` where the build has left one and the browser takes it, by rewriting the
 * address before the static handler sees it. One that is older than its file was left by an earlier build and is not sent:
 * that is looked at each time, because pages may be built again while the server runs.
 */
export function precompressed(directory: string): RequestHandler {
  return async (request, response, next) => {
    const { path } = request;
    if (request.method !== 'GET' && request.method !== 'HEAD') {
      next();
      return;
    }
    const variants = await freshVariants(directory, path);
    if (variants.length > 0) response.vary('Accept-Encoding');
    // Asked one by one: browsers list gzip first, but what is smaller comes first here.
    const chosen = variants.find(({ name }) => request.acceptsEncodings(name) === name);
    if (chosen) {
      response.type(path.slice(path.lastIndexOf('.')));
      response.setHeader('Content-Encoding', chosen.name);
      request.url = path + chosen.suffix;
    }
    next();
  };
}

async function freshVariants(directory: string, path: string): Promise<(typeof ENCODINGS)[number][]> {
  // The build gives files plain names; anything else is left to the static handler, which knows what to refuse.
  if (!/^(?:\/[\w-][\w.-]*)+$/.test(path)) return [];
  const [made, ...times] = await Promise.all(
    ['', ...ENCODINGS.map(({ suffix }) => suffix)].map((suffix) => timeOf(join(directory, path + suffix))),
  );
  if (made === undefined) return [];
  return ENCODINGS.filter((_encoding, at) => (times[at] ?? -Infinity) >= made);
}

/** When the file was last written, ms; undefined where there is none, or none that can be read. */
async function timeOf(file: string): Promise<number | undefined> {
  return stat(file).then(
    (found) => (found.isFile() ? found.mtimeMs : undefined),
    () => undefined,
  );
}
