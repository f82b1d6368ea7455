import { existsSync } from 'node:fs';
import { join } from 'node:path';
import type { NestExpressApplication } from '@nestjs/platform-express';
import type { RequestHandler, Response } from 'express';
import { precompressed } from './precompressed';

/**
 * Serves the built pages beside the API. Files under /assets carry a hash in their name and are kept for ever;
 * index.html never. Any other address that a browser navigates to gets index.html, whose router knows the rest.
 */
export function servePages(application: NestExpressApplication, directory: string): void {
  if (!existsSync(join(directory, 'index.html'))) return;
  const assets = join(directory, 'assets');
  application.use(showIndexForPages, precompressed(directory));
  application.useStaticAssets(directory, {
    index: false,
    redirect: false,
    setHeaders: (response: Response, file: string) => {
      const cached = file.startsWith(assets) ? 'public, max-age=31536000, immutable' : 'no-cache';
      response.setHeader('Cache-Control', cached);
    },
  });
}

/** Pages have no dot in the last part of their address, files have one; the API is neither. */
const showIndexForPages: RequestHandler = (request, _response, next) => {
  const isRead = request.method === 'GET' || request.method === 'HEAD';
  if (isRead && !/^\/api(\/|$)/.test(request.path) && !/\.[^/]*$/.test(request.path))
    request.url = '/index.html';
  next();
};
