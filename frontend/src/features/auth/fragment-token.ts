/**
 * The token of a link in a letter. It stands behind the hash, which browsers send to no server, so that it never lands in
 * a log or a referrer.
 */
export function tokenOfFragment(hash: string): string {
  return new URLSearchParams(hash.replace(/^#/, '')).get('token') ?? '';
}
