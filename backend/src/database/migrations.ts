import type { Migration } from './migration';
import { people } from './migrations/0001-people';
import { auditAndOutbox } from './migrations/0002-audit-and-outbox';

/** Every migration, in order; a new one goes at the end. */
export const migrations: readonly Migration[] = [people, auditAndOutbox];
