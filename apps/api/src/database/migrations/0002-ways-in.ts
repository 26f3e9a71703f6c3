/**
 * Every way in for readings: files that staff upload, sources over HTTP, forecasts, what is wrong with a tower's data,
 * what a change of settings changed in the findings, and mail to staff. Instants are UTC epoch seconds.
 */
export const name = '0002-ways-in';

/** Statements in order; each runs once, in one transaction. */
export const up: readonly string[] = [
  // --- imports: who, from what, whether taken back ------------------------------------------------------------
  `ALTER TABLE import ADD COLUMN sha256 TEXT`,
  `ALTER TABLE import ADD COLUMN by_user INTEGER REFERENCES user(id)`,
  `ALTER TABLE import ADD COLUMN source_id INTEGER`,
  `ALTER TABLE import ADD COLUMN withdrawn_by INTEGER REFERENCES user(id)`,
  `ALTER TABLE import ADD COLUMN state TEXT NOT NULL DEFAULT 'done' CHECK (state IN ('running','done','cancelled','failed','withdrawn'))`,
  `CREATE INDEX import_tower ON import(tower_id, id)`,
  `CREATE TABLE import_span (
     import_id INTEGER NOT NULL REFERENCES import(id), sensor_id INTEGER NOT NULL, t0 INTEGER NOT NULL, t1 INTEGER NOT NULL,
     PRIMARY KEY (import_id, sensor_id)) STRICT, WITHOUT ROWID`,

  // --- uploads: a file from the first byte to its import -------------------------------------------------------
  `CREATE TABLE upload (
     id INTEGER PRIMARY KEY, tower_id INTEGER NOT NULL REFERENCES tower(id), by_user INTEGER NOT NULL REFERENCES user(id),
     name TEXT NOT NULL, kind TEXT NOT NULL CHECK (kind IN ('text','workbook')), bytes INTEGER NOT NULL, sha256 TEXT NOT NULL,
     state TEXT NOT NULL CHECK (state IN ('waiting','running','done','cancelled','failed')), mapping TEXT,
     bytes_done INTEGER NOT NULL DEFAULT 0, import_id INTEGER REFERENCES import(id), fault TEXT,
     created_at INTEGER NOT NULL, ended_at INTEGER) STRICT`,
  `CREATE TABLE tower_mapping (
     tower_id INTEGER PRIMARY KEY REFERENCES tower(id), mapping TEXT NOT NULL, kept_at INTEGER NOT NULL,
     kept_by INTEGER NOT NULL REFERENCES user(id)) STRICT`,

  // --- sources: HTTP beside folders and pushes ------------------------------------------------------------------
  `ALTER TABLE source_file RENAME TO source_file_before`,
  `ALTER TABLE source RENAME TO source_before`,
  `CREATE TABLE source (
     id INTEGER PRIMARY KEY, tower_id INTEGER NOT NULL REFERENCES tower(id), kind TEXT NOT NULL CHECK (kind IN ('folder','http','push')),
     path TEXT, url TEXT, auth TEXT NOT NULL DEFAULT 'none' CHECK (auth IN ('none','basic','bearer')), secret TEXT,
     etag TEXT, last_modified TEXT, body_sha256 TEXT,
     mapping TEXT NOT NULL, interval_s INTEGER NOT NULL DEFAULT 60, last_at INTEGER, last_ok_at INTEGER, last_result TEXT,
     failures INTEGER NOT NULL DEFAULT 0, failing_since INTEGER, next_at INTEGER, version INTEGER NOT NULL DEFAULT 1,
     retired_at INTEGER) STRICT`,
  `INSERT INTO source (id, tower_id, kind, path, mapping, interval_s, last_at, last_result, failures, next_at, retired_at)
     SELECT id, tower_id, kind, path, mapping, interval_s, last_at, last_result, failures, next_at, retired_at FROM source_before`,
  `CREATE TABLE source_file (
     source_id INTEGER NOT NULL REFERENCES source(id), path TEXT NOT NULL, inode INTEGER NOT NULL, header TEXT NOT NULL DEFAULT '',
     position INTEGER NOT NULL DEFAULT 0, row_no INTEGER NOT NULL DEFAULT 0, seen_at INTEGER NOT NULL, head_sha256 TEXT NOT NULL DEFAULT '', PRIMARY KEY (source_id, path)) STRICT`,
  `INSERT INTO source_file SELECT source_id, path, inode, header, position, row_no, seen_at, head_sha256 FROM source_file_before`,
  `DROP TABLE source_file_before`,
  `DROP TABLE source_before`,

  // --- a district's history without its measures: what a chart of years reads --------------------------------------
  `CREATE INDEX district_block_strength ON district_block(
     district_id, t_end, rev, block_s, within_c, strength_lo, strength_hi, sure, speaker_id, spoke, reason)`,

  // --- forecasts, and what the day turned out to be -------------------------------------------------------------
  `CREATE TABLE forecast (
     id INTEGER PRIMARY KEY, district_id INTEGER NOT NULL REFERENCES district(id), for_day TEXT NOT NULL CHECK (for_day GLOB '????-??-??'),
     high_c REAL, low_c REAL, cloud_percent REAL, wind_m_per_s REAL, mixing_height_m REAL, note TEXT NOT NULL DEFAULT '',
     origin TEXT NOT NULL CHECK (origin IN ('entered','uploaded','demo')), entered_at INTEGER NOT NULL, by_user INTEGER REFERENCES user(id)) STRICT`,
  `CREATE INDEX forecast_day ON forecast(district_id, for_day, id)`,
  `CREATE TABLE forecast_outcome (
     district_id INTEGER NOT NULL REFERENCES district(id), for_day TEXT NOT NULL, tower_id INTEGER NOT NULL, high_c REAL, low_c REAL,
     wind_m_per_s REAL, mixing_height_lo REAL, mixing_height_hi REAL, hours INTEGER NOT NULL, kept_at INTEGER NOT NULL,
     PRIMARY KEY (district_id, for_day)) STRICT, WITHOUT ROWID`,

  // --- what is wrong with a tower's data ------------------------------------------------------------------------
  `CREATE TABLE tower_trouble (
     id INTEGER PRIMARY KEY, tower_id INTEGER NOT NULL REFERENCES tower(id),
     kind TEXT NOT NULL CHECK (kind IN ('late','silent','clock ahead','clock shifted','source failing')),
     since_t INTEGER NOT NULL, seen_at INTEGER NOT NULL, text TEXT NOT NULL, told_at INTEGER, mail_revision INTEGER, clear_since INTEGER,
     ended_at INTEGER, end_told_at INTEGER) STRICT`,
  `CREATE UNIQUE INDEX tower_trouble_open ON tower_trouble(tower_id, kind) WHERE ended_at IS NULL`,

  // --- readings that a check or a person spoke of: few of many ---------------------------------------------------
  `CREATE INDEX reading_flagged ON reading(sensor_id, t_end, quality, checks) WHERE checks <> 0`,

  // --- what was worked out anew, and what it changed ------------------------------------------------------------
  `CREATE TABLE rework (
     id INTEGER PRIMARY KEY, tower_id INTEGER NOT NULL REFERENCES tower(id), cause TEXT NOT NULL, by_user INTEGER REFERENCES user(id),
     t0 INTEGER NOT NULL, t1 INTEGER NOT NULL, begun_at INTEGER NOT NULL, blocks INTEGER NOT NULL,
     past_seq INTEGER NOT NULL, truths_before TEXT NOT NULL, ended_at INTEGER, changes TEXT) STRICT`,
  `CREATE INDEX rework_tower ON rework(tower_id, id)`,
  `CREATE INDEX rework_open ON rework(tower_id) WHERE ended_at IS NULL`,

  // --- towers whose readings speak for and against one another's ---------------------------------------------------
  `CREATE TABLE tower_neighbour (
     tower_id INTEGER NOT NULL REFERENCES tower(id), neighbour_id INTEGER NOT NULL REFERENCES tower(id),
     PRIMARY KEY (tower_id, neighbour_id), CHECK (tower_id <> neighbour_id)) STRICT, WITHOUT ROWID`,
  `CREATE INDEX tower_neighbour_of ON tower_neighbour(neighbour_id)`,

  // --- staff can be written to ----------------------------------------------------------------------------------
  `ALTER TABLE contact ADD COLUMN user_id INTEGER REFERENCES user(id)`,
  `DROP INDEX contact_address`,
  `CREATE UNIQUE INDEX contact_address ON contact(channel, address_hash) WHERE stopped_at IS NULL AND user_id IS NULL`,
  `CREATE UNIQUE INDEX contact_user ON contact(user_id, channel) WHERE user_id IS NOT NULL`,

  // --- the record of one thing ------------------------------------------------------------------------------------
  `CREATE INDEX activity_subject ON activity(subject, seq)`,
];
