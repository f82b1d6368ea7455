import { createHash } from 'node:crypto';

/** What is kept of a random token. Tokens carry 256 bits, so a plain SHA-256 cannot be guessed back. */
export function tokenHash(token: string): string {
  return createHash('sha256').update(token).digest('hex');
}
