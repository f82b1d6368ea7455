import type { Migration } from '../migration';

/** Offers are changed on the version that a person saw, and ended rather than deleted. */
export const offerChanges: Migration = {
  name: '0014-offer-changes',
  statements: [
    'ALTER TABLE offers ADD COLUMN version INTEGER NOT NULL DEFAULT 1',
    'ALTER TABLE offers ADD COLUMN ended_at TEXT',
  ],
};
