import type { Migration } from '../migration';

/**
 * The audit trail, which nobody can edit, and the outbox, which carries what must happen after a commit. The audit
 * keeps its actor's name as it was, so that an entry reads the same after a person has changed it.
 */
export const auditAndOutbox: Migration = {
  name: '0002-audit-and-outbox',
  statements: [
    `CREATE TABLE audit_entries (
      id INTEGER PRIMARY KEY AUTOINCREMENT,
      recorded_at TEXT NOT NULL,
      actor_id INTEGER REFERENCES users (id),
      actor_name TEXT NOT NULL,
      action TEXT NOT NULL,
      subject_type TEXT NOT NULL,
      subject_id TEXT NOT NULL,
      before TEXT CHECK (before IS NULL OR json_valid(before)),
      after TEXT CHECK (after IS NULL OR json_valid(after)),
      reason TEXT
    ) STRICT`,
    'CREATE INDEX audit_entries_by_subject ON audit_entries (subject_type, subject_id, id)',
    'CREATE INDEX audit_entries_by_actor ON audit_entries (actor_id, id)',
    'CREATE INDEX audit_entries_by_time ON audit_entries (recorded_at, id)',
    `CREATE TRIGGER audit_entries_are_not_changed BEFORE UPDATE ON audit_entries
      BEGIN SELECT RAISE(ABORT, 'audit entries cannot be changed'); END`,
    `CREATE TRIGGER audit_entries_are_not_deleted BEFORE DELETE ON audit_entries
      BEGIN SELECT RAISE(ABORT, 'audit entries cannot be deleted'); END`,
    `CREATE TRIGGER audit_entries_are_not_replaced BEFORE INSERT ON audit_entries
      WHEN EXISTS (SELECT 1 FROM audit_entries WHERE id = NEW.id)
      BEGIN SELECT RAISE(ABORT, 'audit entries cannot be replaced'); END`,
    `CREATE TABLE outbox_messages (
      id TEXT PRIMARY KEY,
      sequence INTEGER NOT NULL UNIQUE,
      kind TEXT NOT NULL,
      payload TEXT NOT NULL CHECK (json_valid(payload)),
      state TEXT NOT NULL DEFAULT 'pending' CHECK (state IN ('pending', 'delivered', 'dead')),
      attempts INTEGER NOT NULL DEFAULT 0,
      created_at TEXT NOT NULL,
      next_attempt_at TEXT NOT NULL,
      delivered_at TEXT,
      last_error TEXT
    ) STRICT, WITHOUT ROWID`,
    `CREATE INDEX outbox_messages_pending ON outbox_messages (next_attempt_at, sequence) WHERE state = 'pending'`,
    `CREATE INDEX outbox_messages_dead ON outbox_messages (sequence) WHERE state = 'dead'`,
  ],
};
