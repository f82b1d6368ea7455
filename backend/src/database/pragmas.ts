/**
 * Pragmas hold for one connection only and Sequelize opens connections at will, so each connection runs its own
 * list when it opens.
 */
export const WRITER_PRAGMAS = [
  // Waits instead of failing where a backup or a migration holds the file.
  'PRAGMA busy_timeout = 10000',
  'PRAGMA journal_mode = WAL',
  // An acknowledged write survives a power cut.
  'PRAGMA synchronous = FULL',
  'PRAGMA foreign_keys = ON',
  // Makes INSERT OR REPLACE fire delete triggers, without which it would slip past the audit trail's.
  'PRAGMA recursive_triggers = ON',
  'PRAGMA cache_size = -16000',
];

export const READER_PRAGMAS = [
  'PRAGMA busy_timeout = 10000',
  'PRAGMA query_only = ON',
  'PRAGMA cache_size = -16000',
  'PRAGMA temp_store = MEMORY',
];

/** Rebuilding a table needs foreign keys off; each migration checks them before it commits. */
export const MIGRATION_PRAGMAS = [
  'PRAGMA busy_timeout = 10000',
  'PRAGMA journal_mode = WAL',
  'PRAGMA synchronous = FULL',
  'PRAGMA foreign_keys = OFF',
];
