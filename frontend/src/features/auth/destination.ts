/**
 * Where to go after signing in: the page that was asked for, if it is one of ours. Anything else (another host, a
 * script address) is refused, because the address comes from a link that anybody could have written.
 */
export function destinationAfterSignIn(next: string | null): string {
  if (next === null || !/^\/(?![/\\])/.test(next) || next.startsWith('/sign-in')) return '/find';
  return next;
}
