import type { Migration } from '../migration';

const historyOnlyGrows = (['approval_history', 'supply_history'] as const).flatMap((table) =>
  (['UPDATE', 'DELETE'] as const).map(
    (deed) => `CREATE TRIGGER ${table}_no_${deed.toLowerCase()} BEFORE ${deed} ON ${table}
      BEGIN SELECT RAISE(ABORT, 'a history only grows'); END`,
  ),
);

/**
 * Parts with their standing, company part numbers over approved manufacturer lists, offers. `derived_` columns are rebuilt
 * from the rest whenever it changes; a test rebuilds and compares them. Money in millionths of the currency.
 */
export const parts: Migration = {
  name: '0011-parts',
  statements: [
    `CREATE TABLE parts (
      id INTEGER PRIMARY KEY AUTOINCREMENT,
      family_id INTEGER NOT NULL REFERENCES families (id),
      size_id INTEGER NOT NULL REFERENCES sizes (id),
      manufacturer_part_number TEXT NOT NULL UNIQUE,
      resistance_ohm REAL NOT NULL CHECK (resistance_ohm >= 0),
      tolerance_fraction REAL CHECK (tolerance_fraction >= 0),
      tcr_per_kelvin REAL CHECK (tcr_per_kelvin >= 0),
      approval TEXT NOT NULL DEFAULT 'draft' CHECK (approval IN
        ('draft', 'in-review', 'approved', 'preferred', 'restricted', 'withdrawn')),
      restriction_words TEXT,
      restriction_scope TEXT,
      supply TEXT NOT NULL DEFAULT 'active' CHECK (supply IN
        ('active', 'not-recommended', 'last-time-buy', 'discontinued')),
      last_order_on TEXT,
      entered_by INTEGER NOT NULL REFERENCES users (id),
      entered_at TEXT NOT NULL,
      version INTEGER NOT NULL DEFAULT 1,
      derived_range_id INTEGER REFERENCES ranges (id),
      derived_unit_price_micro INTEGER,
      derived_second_source INTEGER NOT NULL DEFAULT 0 CHECK (derived_second_source IN (0, 1)),
      CHECK ((approval = 'restricted') = (restriction_words IS NOT NULL)),
      CHECK (restriction_scope IS NULL OR restriction_words IS NOT NULL),
      CHECK (resistance_ohm > 0 OR tolerance_fraction IS NULL)
    ) STRICT`,
    'CREATE INDEX parts_by_size ON parts (size_id, resistance_ohm)',
    'CREATE INDEX parts_by_family ON parts (family_id)',
    `CREATE TABLE company_part_numbers (
      id INTEGER PRIMARY KEY AUTOINCREMENT,
      number TEXT NOT NULL UNIQUE,
      description TEXT NOT NULL,
      entered_by INTEGER NOT NULL REFERENCES users (id),
      entered_at TEXT NOT NULL
    ) STRICT`,
    `CREATE TABLE approved_sources (
      company_part_number_id INTEGER NOT NULL REFERENCES company_part_numbers (id),
      part_id INTEGER NOT NULL UNIQUE REFERENCES parts (id),
      position INTEGER NOT NULL,
      added_by INTEGER NOT NULL REFERENCES users (id),
      added_at TEXT NOT NULL,
      PRIMARY KEY (company_part_number_id, part_id)
    ) STRICT, WITHOUT ROWID`,
    `CREATE TABLE approval_history (
      id INTEGER PRIMARY KEY AUTOINCREMENT,
      part_id INTEGER NOT NULL REFERENCES parts (id),
      from_approval TEXT,
      to_approval TEXT NOT NULL,
      words TEXT,
      scope TEXT,
      exception TEXT,
      reason TEXT NOT NULL CHECK (length(trim(reason)) > 0),
      changed_by INTEGER NOT NULL REFERENCES users (id),
      changed_at TEXT NOT NULL
    ) STRICT`,
    'CREATE INDEX approval_history_by_part ON approval_history (part_id)',
    `CREATE TABLE supply_history (
      id INTEGER PRIMARY KEY AUTOINCREMENT,
      part_id INTEGER NOT NULL REFERENCES parts (id),
      from_supply TEXT,
      to_supply TEXT NOT NULL,
      last_order_on TEXT,
      reason TEXT NOT NULL CHECK (length(trim(reason)) > 0),
      changed_by INTEGER NOT NULL REFERENCES users (id),
      changed_at TEXT NOT NULL
    ) STRICT`,
    'CREATE INDEX supply_history_by_part ON supply_history (part_id)',
    ...historyOnlyGrows,
    `CREATE TABLE reviews (
      id INTEGER PRIMARY KEY AUTOINCREMENT,
      part_id INTEGER NOT NULL REFERENCES parts (id),
      cause TEXT NOT NULL CHECK (cause IN ('left-active-supply', 'submitted')),
      words TEXT NOT NULL,
      state TEXT NOT NULL DEFAULT 'open' CHECK (state IN ('open', 'closed')),
      opened_by INTEGER NOT NULL REFERENCES users (id),
      opened_at TEXT NOT NULL,
      closed_by INTEGER REFERENCES users (id),
      closed_at TEXT,
      outcome TEXT,
      CHECK ((state = 'closed') = (closed_at IS NOT NULL))
    ) STRICT`,
    "CREATE UNIQUE INDEX reviews_open_once ON reviews (part_id, cause) WHERE state = 'open'",
    `CREATE TABLE suppliers (
      id INTEGER PRIMARY KEY AUTOINCREMENT,
      code TEXT NOT NULL UNIQUE,
      name TEXT NOT NULL UNIQUE
    ) STRICT`,
    `CREATE TABLE offers (
      id INTEGER PRIMARY KEY AUTOINCREMENT,
      part_id INTEGER NOT NULL REFERENCES parts (id),
      supplier_id INTEGER NOT NULL REFERENCES suppliers (id),
      packaging_code TEXT NOT NULL,
      currency TEXT NOT NULL DEFAULT 'EUR' CHECK (currency = 'EUR'),
      minimum_order INTEGER NOT NULL CHECK (minimum_order > 0),
      order_multiple INTEGER NOT NULL CHECK (order_multiple > 0),
      lead_time_days INTEGER NOT NULL CHECK (lead_time_days >= 0),
      valid_from TEXT NOT NULL,
      valid_until TEXT NOT NULL,
      entered_by INTEGER NOT NULL REFERENCES users (id),
      entered_at TEXT NOT NULL,
      CHECK (valid_from <= valid_until)
    ) STRICT`,
    'CREATE INDEX offers_by_part ON offers (part_id)',
    `CREATE TABLE offer_price_breaks (
      offer_id INTEGER NOT NULL REFERENCES offers (id),
      quantity INTEGER NOT NULL CHECK (quantity > 0),
      unit_price_micro INTEGER NOT NULL CHECK (unit_price_micro > 0),
      PRIMARY KEY (offer_id, quantity)
    ) STRICT, WITHOUT ROWID`,
    `CREATE VIRTUAL TABLE part_text USING fts5 (
      manufacturer_part_number, company_part_number, family, manufacturer, tokenize = 'trigram'
    )`,
  ],
};
