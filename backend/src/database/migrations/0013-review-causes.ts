import type { Migration } from '../migration';

/** A preferred part that loses its second source is reviewed too. SQLite changes a CHECK only by a new table. */
export const reviewCauses: Migration = {
  name: '0013-review-causes',
  statements: [
    `CREATE TABLE reviews_next (
      id INTEGER PRIMARY KEY AUTOINCREMENT,
      part_id INTEGER NOT NULL REFERENCES parts (id),
      cause TEXT NOT NULL CHECK (cause IN ('left-active-supply', 'lost-second-source', 'submitted')),
      words TEXT NOT NULL,
      state TEXT NOT NULL DEFAULT 'open' CHECK (state IN ('open', 'closed')),
      opened_by INTEGER NOT NULL REFERENCES users (id),
      opened_at TEXT NOT NULL,
      closed_by INTEGER REFERENCES users (id),
      closed_at TEXT,
      outcome TEXT,
      CHECK ((state = 'closed') = (closed_at IS NOT NULL))
    ) STRICT`,
    `INSERT INTO reviews_next
      (id, part_id, cause, words, state, opened_by, opened_at, closed_by, closed_at, outcome)
      SELECT id, part_id, cause, words, state, opened_by, opened_at, closed_by, closed_at, outcome FROM reviews`,
    'DROP TABLE reviews',
    'ALTER TABLE reviews_next RENAME TO reviews',
    "CREATE UNIQUE INDEX reviews_open_once ON reviews (part_id, cause) WHERE state = 'open'",
  ],
};
