const FIRST_WAIT_SECONDS = 5;
const LONGEST_WAIT_SECONDS = 3600;
const ATTEMPTS = 12;

/**
 * Seconds to wait after the given number of failed attempts: four times longer each time, an hour at most; undefined
 * when it is time to give up (after about eight hours, a mail server's night).
 */
export function waitAfter(failedAttempts: number): number | undefined {
  if (failedAttempts >= ATTEMPTS) return undefined;
  return Math.min(FIRST_WAIT_SECONDS * 4 ** (failedAttempts - 1), LONGEST_WAIT_SECONDS);
}
