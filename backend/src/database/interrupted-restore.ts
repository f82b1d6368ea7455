import { existsSync } from 'node:fs';
import { join } from 'node:path';
import type { Environment } from '../config/environment';

/** Where a restore prepares what it then puts in place. */
export function restoreFolder(environment: Environment): string {
  return join(environment.dataDirectory, '.restoring');
}

/**
 * A restore that was cut off between taking the old data away and putting the new in place leaves no database; a
 * start would make an empty one and look as if all were lost.
 *
 * @throws Error saying what to do
 */
export function refuseInterruptedRestore(environment: Environment): void {
  if (existsSync(restoreFolder(environment)) && !existsSync(environment.databaseFile)) {
    throw new Error(
      `A restore was cut off in ${environment.dataDirectory}: run it again before you start the server.`,
    );
  }
}
