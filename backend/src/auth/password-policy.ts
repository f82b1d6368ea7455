/** Shorter ones are guessed; bcrypt reads no more than 72 bytes, so a longer one would be cut silently. */
export const SHORTEST_PASSWORD = 10;
export const LONGEST_PASSWORD_BYTES = 72;

/**
 * What is wrong with a password, in words for the person who chose it; empty when it will do.
 *
 * @param personal the person's address and name, which a password must not be made of
 */
export function passwordFaults(password: string, personal: readonly string[]): string[] {
  const faults: string[] = [];
  if (Array.from(password).length < SHORTEST_PASSWORD)
    faults.push(`must have at least ${SHORTEST_PASSWORD} characters`);
  if (Buffer.byteLength(password) > LONGEST_PASSWORD_BYTES) {
    faults.push(
      `must have at most ${LONGEST_PASSWORD_BYTES} bytes (letters beyond ASCII count for more than one)`,
    );
  }
  if (new Set(password).size < 4) faults.push('must not be made of the same few characters');
  const plain = password.toLowerCase();
  const words = personal
    .flatMap((text) => [text, text.split('@')[0] ?? ''])
    .filter((text) => text.length > 0);
  if (words.some((word) => plain === word.toLowerCase()))
    faults.push('must not be your address or your name');
  return faults;
}
