import type { Migration } from '../migration';

/**
 * Derating policies by version; a published version never changes, an agency's table is a read-only starting point that
 * nobody entered: it comes with the program.
 */
export const deratingPolicies: Migration = {
  name: '0012-derating-policies',
  statements: [
    `CREATE TABLE derating_policies (
      id INTEGER PRIMARY KEY AUTOINCREMENT,
      name TEXT NOT NULL UNIQUE,
      origin TEXT NOT NULL CHECK (origin IN ('company', 'agency')),
      source TEXT NOT NULL
    ) STRICT`,
    `CREATE TABLE derating_policy_versions (
      id INTEGER PRIMARY KEY AUTOINCREMENT,
      policy_id INTEGER NOT NULL REFERENCES derating_policies (id),
      number INTEGER NOT NULL CHECK (number > 0),
      state TEXT NOT NULL DEFAULT 'draft' CHECK (state IN ('draft', 'published')),
      entries TEXT NOT NULL CHECK (json_type(entries) = 'array'),
      note TEXT NOT NULL,
      entered_by INTEGER REFERENCES users (id),
      entered_at TEXT NOT NULL,
      published_by INTEGER REFERENCES users (id),
      published_at TEXT,
      UNIQUE (policy_id, number),
      CHECK ((state = 'published') = (published_at IS NOT NULL))
    ) STRICT`,
    `CREATE TRIGGER derating_policy_versions_published_no_update BEFORE UPDATE ON derating_policy_versions
      WHEN OLD.state = 'published'
      BEGIN SELECT RAISE(ABORT, 'a published version of a policy never changes'); END`,
    `CREATE TRIGGER derating_policy_versions_published_no_delete BEFORE DELETE ON derating_policy_versions
      WHEN OLD.state = 'published'
      BEGIN SELECT RAISE(ABORT, 'a published version of a policy never changes'); END`,
    `CREATE TABLE company_policy (
      only INTEGER PRIMARY KEY CHECK (only = 1),
      version_id INTEGER NOT NULL REFERENCES derating_policy_versions (id)
    ) STRICT`,
  ],
};
