import type { LevelWithSilent } from 'pino';
import { join } from 'node:path';
import { Clock } from '../common/clock';
import { REPOSITORY_ROOT } from './environment';

/** What code may vary when it builds the application; nothing of it can be reached from the environment. */
export class ApplicationOptions {
  /** Work factor of bcrypt (base-2 logarithm of the rounds). */
  readonly passwordHashCost: number = 10;
  readonly logLevel: LevelWithSilent = 'info';
  /** Folder of the built pages; where it is missing, only the API is served. */
  readonly pagesDirectory: string = join(REPOSITORY_ROOT, 'frontend', 'dist');
  readonly clock: Clock = new Clock();

  constructor(chosen: Partial<ApplicationOptions> = {}) {
    Object.assign(this, chosen);
  }
}
