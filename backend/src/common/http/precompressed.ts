import { existsSync, readdirSync } from 'node:fs';
import { join, relative, sep } from 'node:path';
import type { RequestHandler } from 'express';

const ENCODINGS = [
  { name: 'br', suffix: '.br' },
  { name: 'gzip', suffix: '.gz' },
] as const;

/**
 * Sends `file.br` or `file.gz` in place of `file` where the build has left one and the browser takes it, by rewriting
 * the address before the static handler sees it. The list is read once: a build comes before a start.
 */
export function precompressed(directory: string): RequestHandler {
  const files = new Set(filesUnder(directory));
  return (request, response, next) => {
    const path = request.path;
    const variants = ENCODINGS.filter(({ suffix }) => files.has(path + suffix));
    if (variants.length === 0 || !['GET', 'HEAD'].includes(request.method)) {
      next();
      return;
    }
    response.vary('Accept-Encoding');
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

function filesUnder(directory: string): string[] {
  if (!existsSync(directory)) return [];
  return readdirSync(directory, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => `/${relative(directory, join(entry.parentPath, entry.name)).split(sep).join('/')}`);
}
