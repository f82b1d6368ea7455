import type { Migration } from '../migration';

/** Tables that hold the ratings of one revision; rows of a published revision never change. */
const revisionTables = ['size_ratings', 'ranges', 'packagings', 'citations'] as const;

const publishedStaysPut = revisionTables.flatMap((table) =>
  (['UPDATE', 'DELETE'] as const).map(
    (deed) => `CREATE TRIGGER ${table}_published_no_${deed.toLowerCase()} BEFORE ${deed} ON ${table}
      WHEN (SELECT state FROM family_revisions WHERE id = OLD.revision_id) = 'published'
      BEGIN SELECT RAISE(ABORT, 'a published revision never changes'); END`,
  ),
);

const nothingIsAdded = revisionTables.map(
  (table) => `CREATE TRIGGER ${table}_published_no_insert BEFORE INSERT ON ${table}
    WHEN (SELECT state FROM family_revisions WHERE id = NEW.revision_id) = 'published'
    BEGIN SELECT RAISE(ABORT, 'a published revision never changes'); END`,
);

const modesStayPut = (['INSERT', 'UPDATE', 'DELETE'] as const).map((deed) => {
  const row = deed === 'INSERT' ? 'NEW' : 'OLD';
  return `CREATE TRIGGER operating_modes_published_no_${deed.toLowerCase()} BEFORE ${deed} ON operating_modes
    WHEN (SELECT r.state FROM size_ratings s JOIN family_revisions r ON r.id = s.revision_id
          WHERE s.id = ${row}.size_ratings_id) = 'published'
    BEGIN SELECT RAISE(ABORT, 'a published revision never changes'); END`;
});

/**
 * Manufacturers, families and their sizes keep their ids for ever; ratings live in rows of a revision, which never changes
 * once it is published. Temperatures in °C, everything else SI; ratios as fractions.
 */
export const catalogue: Migration = {
  name: '0010-catalogue',
  statements: [
    `CREATE TABLE manufacturers (
      id INTEGER PRIMARY KEY AUTOINCREMENT,
      code TEXT NOT NULL UNIQUE,
      name TEXT NOT NULL UNIQUE,
      country TEXT,
      note TEXT,
      entered_by INTEGER NOT NULL REFERENCES users (id),
      entered_at TEXT NOT NULL
    ) STRICT`,
    `CREATE TABLE families (
      id INTEGER PRIMARY KEY AUTOINCREMENT,
      manufacturer_id INTEGER NOT NULL REFERENCES manufacturers (id),
      code TEXT NOT NULL CHECK (length(code) >= 3),
      name TEXT NOT NULL,
      technology TEXT NOT NULL CHECK (technology IN ('thick-film', 'thin-film', 'metal-film', 'carbon-film', 'metal-oxide',
        'wirewound', 'metal-strip', 'metal-foil', 'carbon-composition', 'ceramic-composition')),
      current_revision_id INTEGER REFERENCES family_revisions (id),
      entered_by INTEGER NOT NULL REFERENCES users (id),
      entered_at TEXT NOT NULL,
      UNIQUE (manufacturer_id, code)
    ) STRICT`,
    `CREATE TABLE datasheets (
      id INTEGER PRIMARY KEY AUTOINCREMENT,
      family_id INTEGER NOT NULL REFERENCES families (id),
      title TEXT NOT NULL,
      document_number TEXT NOT NULL,
      revision TEXT NOT NULL,
      issued_on TEXT NOT NULL,
      page_count INTEGER NOT NULL CHECK (page_count > 0),
      UNIQUE (document_number, revision)
    ) STRICT`,
    `CREATE TABLE family_revisions (
      id INTEGER PRIMARY KEY AUTOINCREMENT,
      family_id INTEGER NOT NULL REFERENCES families (id),
      number INTEGER NOT NULL CHECK (number > 0),
      state TEXT NOT NULL DEFAULT 'draft' CHECK (state IN ('draft', 'published')),
      description TEXT NOT NULL,
      datasheet_id INTEGER REFERENCES datasheets (id),
      reference_temperature_celsius REAL,
      failure_rate_style TEXT,
      features TEXT NOT NULL DEFAULT '[]' CHECK (json_type(features) = 'array'),
      ordering_code_template TEXT NOT NULL,
      entered_by INTEGER NOT NULL REFERENCES users (id),
      entered_at TEXT NOT NULL,
      published_by INTEGER REFERENCES users (id),
      published_at TEXT,
      UNIQUE (family_id, number),
      CHECK ((state = 'published') = (published_at IS NOT NULL))
    ) STRICT`,
    `CREATE TRIGGER family_revisions_published_no_update BEFORE UPDATE ON family_revisions WHEN OLD.state = 'published'
      BEGIN SELECT RAISE(ABORT, 'a published revision never changes'); END`,
    `CREATE TRIGGER family_revisions_published_no_delete BEFORE DELETE ON family_revisions WHEN OLD.state = 'published'
      BEGIN SELECT RAISE(ABORT, 'a published revision never changes'); END`,
    `CREATE TABLE sizes (
      id INTEGER PRIMARY KEY AUTOINCREMENT,
      family_id INTEGER NOT NULL REFERENCES families (id),
      code TEXT NOT NULL,
      metric_code TEXT,
      position INTEGER NOT NULL,
      UNIQUE (family_id, code)
    ) STRICT`,
    `CREATE TABLE size_ratings (
      id INTEGER PRIMARY KEY AUTOINCREMENT,
      revision_id INTEGER NOT NULL REFERENCES family_revisions (id),
      size_id INTEGER NOT NULL REFERENCES sizes (id),
      mounting TEXT CHECK (mounting IN ('surface', 'through-hole', 'chassis')),
      body_style TEXT NOT NULL CHECK (body_style IN ('chip', 'melf', 'axial', 'cemented', 'housed', 'strip', 'radial')),
      body_length_metre REAL CHECK (body_length_metre > 0),
      body_width_metre REAL CHECK (body_width_metre > 0),
      body_height_metre REAL CHECK (body_height_metre > 0),
      land_pattern TEXT,
      termination TEXT,
      soldering TEXT,
      limiting_element_voltage_volt REAL CHECK (limiting_element_voltage_volt > 0),
      overload_voltage_volt REAL CHECK (overload_voltage_volt > 0),
      insulation_voltage_volt REAL CHECK (insulation_voltage_volt > 0),
      category_min_celsius REAL,
      category_max_celsius REAL,
      voltage_coefficient_per_volt REAL CHECK (voltage_coefficient_per_volt >= 0),
      noise_index_decibel REAL,
      inductance_henry REAL CHECK (inductance_henry >= 0),
      capacitance_farad REAL CHECK (capacitance_farad >= 0),
      solder_shift_fraction REAL CHECK (solder_shift_fraction >= 0),
      humidity_shift_fraction REAL CHECK (humidity_shift_fraction >= 0),
      pulses TEXT CHECK (pulses IS NULL OR json_type(pulses) = 'object'),
      link_rated_current_ampere REAL CHECK (link_rated_current_ampere > 0),
      link_residual_resistance_ohm REAL CHECK (link_residual_resistance_ohm > 0),
      UNIQUE (revision_id, size_id),
      CHECK ((category_min_celsius IS NULL) = (category_max_celsius IS NULL)),
      CHECK (category_min_celsius IS NULL OR category_min_celsius < category_max_celsius),
      CHECK ((body_length_metre IS NULL) = (body_width_metre IS NULL)),
      CHECK ((body_length_metre IS NULL) = (body_height_metre IS NULL))
    ) STRICT`,
    `CREATE TABLE operating_modes (
      id INTEGER PRIMARY KEY AUTOINCREMENT,
      size_ratings_id INTEGER NOT NULL REFERENCES size_ratings (id),
      position INTEGER NOT NULL,
      name TEXT NOT NULL,
      rated_dissipation_watt REAL CHECK (rated_dissipation_watt > 0),
      derating_axis TEXT CHECK (derating_axis IN ('ambient', 'terminal', 'case')),
      derating_points TEXT CHECK (derating_points IS NULL OR json_type(derating_points) = 'array'),
      max_element_temperature_celsius REAL,
      thermal_resistance_kelvin_per_watt REAL CHECK (thermal_resistance_kelvin_per_watt >= 0),
      drift_fraction REAL CHECK (drift_fraction >= 0),
      drift_hours REAL CHECK (drift_hours > 0),
      drift_temperature_celsius REAL,
      drift_law_exponent REAL,
      drift_law_doubling_kelvin REAL CHECK (drift_law_doubling_kelvin > 0),
      UNIQUE (size_ratings_id, position),
      CHECK ((derating_axis IS NULL) = (derating_points IS NULL)),
      CHECK ((drift_fraction IS NULL) = (drift_hours IS NULL)),
      CHECK ((drift_fraction IS NULL) = (drift_temperature_celsius IS NULL)),
      CHECK ((drift_law_exponent IS NULL) = (drift_law_doubling_kelvin IS NULL))
    ) STRICT`,
    `CREATE TABLE ranges (
      id INTEGER PRIMARY KEY AUTOINCREMENT,
      revision_id INTEGER NOT NULL REFERENCES family_revisions (id),
      size_id INTEGER NOT NULL REFERENCES sizes (id),
      tolerance_fraction REAL NOT NULL CHECK (tolerance_fraction >= 0),
      tcr_per_kelvin REAL CHECK (tcr_per_kelvin >= 0),
      resistance_min_ohm REAL NOT NULL CHECK (resistance_min_ohm > 0),
      resistance_max_ohm REAL NOT NULL,
      series TEXT NOT NULL CHECK (json_type(series) = 'array'),
      CHECK (resistance_min_ohm <= resistance_max_ohm)
    ) STRICT`,
    'CREATE INDEX ranges_by_size ON ranges (revision_id, size_id)',
    `CREATE TABLE packagings (
      id INTEGER PRIMARY KEY AUTOINCREMENT,
      revision_id INTEGER NOT NULL REFERENCES family_revisions (id),
      size_id INTEGER NOT NULL REFERENCES sizes (id),
      code TEXT NOT NULL,
      description TEXT NOT NULL,
      quantity INTEGER NOT NULL CHECK (quantity > 0),
      UNIQUE (revision_id, size_id, code)
    ) STRICT`,
    `CREATE TABLE citations (
      id INTEGER PRIMARY KEY AUTOINCREMENT,
      revision_id INTEGER NOT NULL REFERENCES family_revisions (id),
      size_id INTEGER REFERENCES sizes (id),
      field TEXT NOT NULL,
      datasheet_id INTEGER NOT NULL REFERENCES datasheets (id),
      page INTEGER NOT NULL CHECK (page > 0),
      note TEXT
    ) STRICT`,
    'CREATE INDEX citations_by_revision ON citations (revision_id, size_id)',
    ...publishedStaysPut,
    ...nothingIsAdded,
    ...modesStayPut,
    `CREATE TABLE declarations (
      id INTEGER PRIMARY KEY AUTOINCREMENT,
      family_id INTEGER NOT NULL REFERENCES families (id),
      kind TEXT NOT NULL CHECK (kind IN ('RoHS', 'REACH')),
      dated_on TEXT NOT NULL,
      exemption TEXT,
      statement TEXT NOT NULL
    ) STRICT`,
    `CREATE TABLE certificates (
      id INTEGER PRIMARY KEY AUTOINCREMENT,
      family_id INTEGER NOT NULL REFERENCES families (id),
      size_id INTEGER REFERENCES sizes (id),
      kind TEXT NOT NULL CHECK (kind IN ('safety', 'automotive')),
      standard TEXT NOT NULL,
      number TEXT NOT NULL,
      issued_on TEXT NOT NULL,
      expires_on TEXT
    ) STRICT`,
  ],
};
