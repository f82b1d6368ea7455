import type { Migration } from '../migration';

/** People, their roles, sessions, and what is needed to let the right ones in. Tokens are kept as SHA-256 only. */
export const people: Migration = {
  name: '0001-people',
  statements: [
    `CREATE TABLE users (
      id INTEGER PRIMARY KEY AUTOINCREMENT,
      email TEXT NOT NULL UNIQUE CHECK (email = lower(trim(email))),
      name TEXT NOT NULL CHECK (length(trim(name)) > 0),
      password_hash TEXT NOT NULL,
      state TEXT NOT NULL DEFAULT 'active' CHECK (state IN ('active', 'deactivated')),
      version INTEGER NOT NULL DEFAULT 1,
      created_at TEXT NOT NULL,
      updated_at TEXT NOT NULL
    ) STRICT`,
    `CREATE TABLE user_roles (
      user_id INTEGER NOT NULL REFERENCES users (id),
      role TEXT NOT NULL CHECK (role IN
        ('administrator', 'librarian', 'component-engineer', 'designer', 'purchasing')),
      PRIMARY KEY (user_id, role)
    ) STRICT, WITHOUT ROWID`,
    `CREATE TABLE sessions (
      id TEXT PRIMARY KEY,
      user_id INTEGER NOT NULL REFERENCES users (id),
      user_agent TEXT NOT NULL,
      address TEXT NOT NULL,
      created_at TEXT NOT NULL,
      last_used_at TEXT NOT NULL,
      expires_at TEXT NOT NULL,
      ended_at TEXT,
      ended_reason TEXT,
      CHECK ((ended_at IS NULL) = (ended_reason IS NULL))
    ) STRICT, WITHOUT ROWID`,
    'CREATE INDEX sessions_by_user ON sessions (user_id, ended_at)',
    `CREATE TABLE refresh_tokens (
      token_hash TEXT PRIMARY KEY,
      session_id TEXT NOT NULL REFERENCES sessions (id) ON DELETE CASCADE,
      issued_at TEXT NOT NULL,
      expires_at TEXT NOT NULL,
      replaced_at TEXT
    ) STRICT, WITHOUT ROWID`,
    'CREATE INDEX refresh_tokens_by_session ON refresh_tokens (session_id)',
    `CREATE TABLE failed_sign_ins (
      id INTEGER PRIMARY KEY,
      account TEXT NOT NULL,
      address TEXT NOT NULL,
      failed_at TEXT NOT NULL,
      forgiven INTEGER NOT NULL DEFAULT 0 CHECK (forgiven IN (0, 1))
    ) STRICT`,
    'CREATE INDEX failed_sign_ins_by_account ON failed_sign_ins (account, failed_at)',
    'CREATE INDEX failed_sign_ins_by_address ON failed_sign_ins (address, failed_at)',
    `CREATE TABLE password_reset_requests (
      id TEXT PRIMARY KEY,
      email TEXT NOT NULL,
      address TEXT NOT NULL,
      requested_at TEXT NOT NULL
    ) STRICT, WITHOUT ROWID`,
    'CREATE INDEX password_reset_requests_by_email ON password_reset_requests (email, requested_at)',
    'CREATE INDEX password_reset_requests_by_address ON password_reset_requests (address, requested_at)',
    `CREATE TABLE password_resets (
      id TEXT PRIMARY KEY,
      user_id INTEGER NOT NULL REFERENCES users (id),
      token_hash TEXT NOT NULL UNIQUE,
      created_at TEXT NOT NULL,
      expires_at TEXT NOT NULL,
      used_at TEXT
    ) STRICT, WITHOUT ROWID`,
    `CREATE TABLE invitations (
      id TEXT PRIMARY KEY,
      email TEXT NOT NULL CHECK (email = lower(trim(email))),
      roles TEXT NOT NULL CHECK (json_valid(roles)),
      token_hash TEXT NOT NULL UNIQUE,
      invited_by INTEGER NOT NULL REFERENCES users (id),
      created_at TEXT NOT NULL,
      expires_at TEXT NOT NULL,
      accepted_at TEXT,
      withdrawn_at TEXT,
      user_id INTEGER REFERENCES users (id)
    ) STRICT, WITHOUT ROWID`,
    `CREATE UNIQUE INDEX invitations_open ON invitations (email)
      WHERE accepted_at IS NULL AND withdrawn_at IS NULL`,
  ],
};
