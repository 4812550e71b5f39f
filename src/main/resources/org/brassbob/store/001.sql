-- The ship's data that rounds were worked out with.
CREATE TABLE vessel_copy (
  sha256 TEXT PRIMARY KEY NOT NULL CHECK (length(sha256) > 0),
  vessel_id TEXT NOT NULL,
  name TEXT NOT NULL,
  added_at TEXT NOT NULL
);
CREATE TABLE vessel_file (
  copy_sha256 TEXT NOT NULL REFERENCES vessel_copy (sha256),
  path TEXT NOT NULL,
  sha256 TEXT NOT NULL,
  content BLOB NOT NULL,
  UNIQUE (copy_sha256, path)
);
CREATE TABLE accepted_finding (
  id INTEGER PRIMARY KEY AUTOINCREMENT,
  copy_sha256 TEXT NOT NULL REFERENCES vessel_copy (sha256),
  text TEXT NOT NULL,
  at TEXT NOT NULL,
  who TEXT NOT NULL
);

CREATE TABLE round (
  id INTEGER PRIMARY KEY AUTOINCREMENT,
  vessel_id TEXT NOT NULL,
  data_sha256 TEXT NOT NULL,
  name TEXT NOT NULL,
  officer TEXT NOT NULL,
  started_at TEXT NOT NULL,
  started_ms INTEGER NOT NULL CHECK (typeof(started_ms) = 'integer'),
  finished_at TEXT,
  conditions TEXT NOT NULL CHECK (conditions IN ('alongside', 'at-sea', 'rough')),
  curve TEXT,
  trim_m REAL,
  list_deg REAL,
  sea_density_t_m3 REAL,
  draught_aft_m REAL,
  draught_forward_m REAL
);
CREATE INDEX round_by_start ON round (vessel_id, started_ms, id);

CREATE TABLE reading (
  id INTEGER PRIMARY KEY AUTOINCREMENT,
  round_id INTEGER NOT NULL REFERENCES round (id),
  vessel_id TEXT NOT NULL,
  tank TEXT NOT NULL CHECK (length(tank) > 0),
  at TEXT NOT NULL CHECK (length(at) >= 17),
  at_ms INTEGER NOT NULL CHECK (typeof(at_ms) = 'integer'),
  kind TEXT NOT NULL
    CHECK (kind IN ('sounding', 'ullage', 'volume', 'percent', 'mass', 'empty', 'full', 'not-taken')),
  value REAL CHECK ((value IS NULL) = (kind IN ('empty', 'full', 'not-taken'))),
  temperature_c REAL,
  density_t_m3 REAL,
  water_m REAL,
  note TEXT NOT NULL,
  question TEXT,
  who TEXT NOT NULL,
  corrects INTEGER REFERENCES reading (id)
);
CREATE INDEX reading_by_round ON reading (round_id);
CREATE INDEX reading_by_tank ON reading (vessel_id, tank, at_ms, kind, value);
CREATE UNIQUE INDEX reading_by_corrected ON reading (corrects) WHERE corrects IS NOT NULL;

-- The single gaugings of a tank that was gauged again and again; the reading's value is their mean.
CREATE TABLE gauging (
  reading_id INTEGER NOT NULL REFERENCES reading (id),
  place INTEGER NOT NULL,
  value REAL NOT NULL,
  UNIQUE (reading_id, place)
);

CREATE TABLE take_over (
  id INTEGER PRIMARY KEY AUTOINCREMENT,
  vessel_id TEXT NOT NULL,
  officer TEXT NOT NULL,
  at TEXT NOT NULL,
  at_ms INTEGER NOT NULL
);
CREATE INDEX take_over_by_time ON take_over (vessel_id, at_ms);

-- A weight as it stood from a time on; a mass of NULL: it went ashore.
CREATE TABLE weight (
  id INTEGER PRIMARY KEY AUTOINCREMENT,
  vessel_id TEXT NOT NULL,
  name TEXT NOT NULL,
  mass_t REAL,
  lcg_m REAL,
  tcg_m REAL,
  vcg_m REAL,
  mass_u_pct REAL,
  vcg_u_m REAL,
  at TEXT NOT NULL,
  at_ms INTEGER NOT NULL,
  who TEXT NOT NULL
);
CREATE INDEX weight_by_name ON weight (vessel_id, name, at_ms, id);

CREATE TABLE setting (
  key TEXT PRIMARY KEY NOT NULL,
  value TEXT NOT NULL
);
