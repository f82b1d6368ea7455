import { createHash } from 'node:crypto';
import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

const INLINE_SCRIPT = /<script(?![^>]*\ssrc=)[^>]*>([\s\S]*?)<\/script>/gi;

/**
 * What the pages may load: only what comes from here. The inline scripts that the built index.html carries (one that
 * sets the colour mode before the first paint) are allowed by their hash.
 */
export function contentSecurityPolicy(
  pagesDirectory: string,
  overTls: boolean,
): Record<string, string[] | null> {
  return {
    'default-src': ["'none'"],
    'script-src': ["'self'", ...inlineScriptHashes(join(pagesDirectory, 'index.html'))],
    // The component library writes its style sheet at run time.
    'style-src': ["'self'", "'unsafe-inline'"],
    'img-src': ["'self'", 'data:', 'blob:'],
    'font-src': ["'self'"],
    'connect-src': ["'self'"],
    'worker-src': ["'self'"],
    'manifest-src': ["'self'"],
    'object-src': ["'none'"],
    'base-uri': ["'none'"],
    'form-action': ["'self'"],
    'frame-ancestors': ["'none'"],
    'upgrade-insecure-requests': overTls ? [] : null,
  };
}

function inlineScriptHashes(indexFile: string): string[] {
  if (!existsSync(indexFile)) return [];
  return [...readFileSync(indexFile, 'utf8').matchAll(INLINE_SCRIPT)].map(
    ([, script = '']) => `'sha256-${createHash('sha256').update(script).digest('base64')}'`,
  );
}
