/**
 * The whole store as it begins. STRICT tables; every instant is UTC epoch seconds (INTEGER); a measure's two columns
 * `_lo` and `_hi` hold its bounds, NULL is an open end and both NULL is *not known* (never 0, never false).
 * yes/no measures are 0 or 1 in both columns.
 */
export const name = '0001-store';

/** Statements in order; each runs once, in one transaction. */
export const up: readonly string[] = [
  // --- people who sign in -------------------------------------------------------------------------------------
  `CREATE TABLE user (
     id INTEGER PRIMARY KEY, email TEXT NOT NULL COLLATE NOCASE UNIQUE, name TEXT NOT NULL,
     role TEXT NOT NULL CHECK (role IN ('administrator','analyst','officer')),
     password_hash TEXT, created_at INTEGER NOT NULL, retired_at INTEGER, session_epoch INTEGER NOT NULL DEFAULT 0) STRICT`,
  `CREATE TABLE link_token (
     token_hash TEXT PRIMARY KEY, purpose TEXT NOT NULL CHECK (purpose IN ('first-administrator','invitation','password')),
     user_id INTEGER REFERENCES user(id), created_at INTEGER NOT NULL, expires_at INTEGER NOT NULL, used_at INTEGER) STRICT`,
  `CREATE TABLE sign_in_failure (key TEXT NOT NULL, at INTEGER NOT NULL) STRICT`,
  `CREATE INDEX sign_in_failure_key ON sign_in_failure(key, at)`,

  // --- districts and towers ------------------------------------------------------------------------------------
  `CREATE TABLE district (
     id INTEGER PRIMARY KEY, slug TEXT NOT NULL UNIQUE, name TEXT NOT NULL, time_zone TEXT NOT NULL,
     elevation_m REAL, latitude REAL NOT NULL, longitude REAL NOT NULL, population INTEGER,
     area_text TEXT NOT NULL DEFAULT '', ordinance_ref TEXT NOT NULL DEFAULT '', contact_phone TEXT NOT NULL DEFAULT '',
     combine TEXT NOT NULL DEFAULT 'first-fresh' CHECK (combine IN ('first-fresh','any','all','median')),
     floor_tower_id INTEGER REFERENCES tower(id), bench_tower_id INTEGER REFERENCES tower(id), pm25_tower_id INTEGER REFERENCES tower(id),
     created_at INTEGER NOT NULL, version INTEGER NOT NULL DEFAULT 1) STRICT`,
  `CREATE TABLE user_district (
     user_id INTEGER NOT NULL REFERENCES user(id), district_id INTEGER NOT NULL REFERENCES district(id),
     PRIMARY KEY (user_id, district_id)) STRICT, WITHOUT ROWID`,
  `CREATE TABLE tower (
     id INTEGER PRIMARY KEY, slug TEXT NOT NULL UNIQUE, name TEXT NOT NULL, elevation_m REAL NOT NULL,
     latitude REAL NOT NULL, longitude REAL NOT NULL,
     interval_s INTEGER NOT NULL CHECK (interval_s > 0), block_s INTEGER NOT NULL CHECK (block_s % interval_s = 0),
     stale_limit_s INTEGER, clock TEXT NOT NULL DEFAULT 'UTC',
     stamp TEXT NOT NULL DEFAULT 'end' CHECK (stamp IN ('instant','start','middle','end')),
     screening TEXT NOT NULL DEFAULT 'full' CHECK (screening IN ('full','report-only')),
     inversion_form TEXT NOT NULL DEFAULT 'sensor-aware' CHECK (inversion_form IN ('plain','sensor-aware')),
     embed_depth_m REAL NOT NULL DEFAULT 0, created_at INTEGER NOT NULL, retired_at INTEGER, version INTEGER NOT NULL DEFAULT 1) STRICT`,
  `CREATE TABLE district_tower (
     district_id INTEGER NOT NULL REFERENCES district(id), tower_id INTEGER NOT NULL REFERENCES tower(id),
     position INTEGER NOT NULL, may_begin INTEGER NOT NULL DEFAULT 1, may_end INTEGER NOT NULL DEFAULT 1,
     PRIMARY KEY (district_id, tower_id)) STRICT, WITHOUT ROWID`,
  `CREATE TABLE sensor (
     id INTEGER PRIMARY KEY, tower_id INTEGER NOT NULL REFERENCES tower(id), name TEXT NOT NULL,
     quantity TEXT NOT NULL CHECK (quantity IN ('air temperature','relative humidity','dew point','wet bulb',
       'wind speed','wind direction','station pressure','pm2.5')),
     unit TEXT NOT NULL, screening_limits TEXT, retired_at INTEGER, UNIQUE (tower_id, name)) STRICT`,
  `CREATE TABLE sensor_version (
     sensor_id INTEGER NOT NULL REFERENCES sensor(id), from_t INTEGER NOT NULL, height_m REAL NOT NULL,
     "offset" REAL NOT NULL DEFAULT 0, gain REAL NOT NULL DEFAULT 1, sigma REAL NOT NULL, pair_sigma REAL, note TEXT NOT NULL DEFAULT '',
     PRIMARY KEY (sensor_id, from_t)) STRICT, WITHOUT ROWID`,
  `CREATE TABLE ingest_key (
     id INTEGER PRIMARY KEY, tower_id INTEGER NOT NULL REFERENCES tower(id), name TEXT NOT NULL, hash TEXT NOT NULL UNIQUE,
     created_at INTEGER NOT NULL, created_by INTEGER NOT NULL REFERENCES user(id), last_used_at INTEGER, revoked_at INTEGER) STRICT`,
  `CREATE TABLE source (
     id INTEGER PRIMARY KEY, tower_id INTEGER NOT NULL REFERENCES tower(id), kind TEXT NOT NULL CHECK (kind IN ('folder','push')),
     path TEXT, mapping TEXT NOT NULL, interval_s INTEGER NOT NULL DEFAULT 60, last_at INTEGER, last_result TEXT, failures INTEGER NOT NULL DEFAULT 0,
     next_at INTEGER, retired_at INTEGER) STRICT`,
  `CREATE TABLE source_file (
     source_id INTEGER NOT NULL REFERENCES source(id), path TEXT NOT NULL, inode INTEGER NOT NULL, header TEXT NOT NULL DEFAULT '',
     position INTEGER NOT NULL DEFAULT 0, row_no INTEGER NOT NULL DEFAULT 0, seen_at INTEGER NOT NULL, head_sha256 TEXT NOT NULL DEFAULT '', PRIMARY KEY (source_id, path)) STRICT`,

  // --- readings -------------------------------------------------------------------------------------------------
  `CREATE TABLE import (
     id INTEGER PRIMARY KEY, tower_id INTEGER NOT NULL REFERENCES tower(id), origin TEXT NOT NULL, name TEXT NOT NULL,
     received_at INTEGER NOT NULL, new_count INTEGER NOT NULL DEFAULT 0, repeated_count INTEGER NOT NULL DEFAULT 0,
     corrected_count INTEGER NOT NULL DEFAULT 0, refused_count INTEGER NOT NULL DEFAULT 0, withdrawn_at INTEGER) STRICT`,
  `CREATE TABLE refused_row (
     id INTEGER PRIMARY KEY, import_id INTEGER NOT NULL REFERENCES import(id), row_no INTEGER NOT NULL, col TEXT, code TEXT NOT NULL,
     text TEXT NOT NULL, raw TEXT NOT NULL) STRICT`,
  `CREATE INDEX refused_row_import ON refused_row(import_id, row_no)`,
  `CREATE TABLE reading (
     sensor_id INTEGER NOT NULL, t_end INTEGER NOT NULL, value REAL NOT NULL, quality INTEGER NOT NULL DEFAULT 0,
     checks INTEGER NOT NULL DEFAULT 0, import_id INTEGER NOT NULL, row_no INTEGER NOT NULL,
     PRIMARY KEY (sensor_id, t_end)) STRICT, WITHOUT ROWID`,
  `CREATE TABLE reading_past (
     sensor_id INTEGER NOT NULL, t_end INTEGER NOT NULL, until_at INTEGER NOT NULL, value REAL NOT NULL, import_id INTEGER NOT NULL,
     row_no INTEGER NOT NULL, seq INTEGER PRIMARY KEY) STRICT`,
  `CREATE INDEX reading_past_sensor ON reading_past(sensor_id, t_end)`,
  `CREATE TABLE override (
     id INTEGER PRIMARY KEY, sensor_id INTEGER NOT NULL REFERENCES sensor(id), t0 INTEGER NOT NULL, t1 INTEGER NOT NULL,
     quality TEXT NOT NULL CHECK (quality IN ('valid','failed')), reason TEXT NOT NULL,
     by_user INTEGER NOT NULL REFERENCES user(id), at INTEGER NOT NULL, undone_by INTEGER, undone_at INTEGER) STRICT`,
  `CREATE TABLE dirty (
     stage INTEGER NOT NULL, subject INTEGER NOT NULL, t INTEGER NOT NULL, gen INTEGER NOT NULL DEFAULT 1,
     PRIMARY KEY (stage, subject, t)) STRICT, WITHOUT ROWID`,
  `CREATE INDEX dirty_newest ON dirty(stage, t)`,

  // --- findings -------------------------------------------------------------------------------------------------
  `CREATE TABLE block_mean (
     sensor_id INTEGER NOT NULL, t_end INTEGER NOT NULL, mean REAL, n INTEGER NOT NULL, quality INTEGER NOT NULL,
     PRIMARY KEY (sensor_id, t_end)) STRICT, WITHOUT ROWID`,
  `CREATE TABLE profile (
     tower_id INTEGER NOT NULL, t_end INTEGER NOT NULL, rev INTEGER NOT NULL, levels TEXT NOT NULL,
     surface TEXT NOT NULL CHECK (surface IN ('present','absent','not known')), reason TEXT,
     base_m REAL, top_m REAL, depth_lo REAL, depth_hi REAL, strength_lo REAL, strength_hi REAL, within_c REAL, sigma_c REAL, prob REAL,
     gradient REAL, open TEXT NOT NULL DEFAULT 'no', sure INTEGER, stable_lo REAL, stable_hi REAL,
     elevated_base_m REAL, elevated_strength_lo REAL, elevated_strength_hi REAL, heat_lo REAL, heat_hi REAL, breakup_lo REAL, breakup_hi REAL,
     pressure_hpa REAL, pressure_assumed INTEGER NOT NULL DEFAULT 0, other TEXT NOT NULL DEFAULT '{}',
     PRIMARY KEY (tower_id, t_end)) STRICT, WITHOUT ROWID`,
  `CREATE TABLE profile_past (
     seq INTEGER PRIMARY KEY, tower_id INTEGER NOT NULL, t_end INTEGER NOT NULL, rev INTEGER NOT NULL, until_at INTEGER NOT NULL,
     body TEXT NOT NULL) STRICT`,
  `CREATE TABLE hour (
     tower_id INTEGER NOT NULL, t_end INTEGER NOT NULL, inversion_min INTEGER NOT NULL, none_min INTEGER NOT NULL, not_known_min INTEGER NOT NULL,
     mean_strength_c REAL, max_strength_c REAL, PRIMARY KEY (tower_id, t_end)) STRICT, WITHOUT ROWID`,
  `CREATE TABLE district_block (
     district_id INTEGER NOT NULL, t_end INTEGER NOT NULL, rev INTEGER NOT NULL, block_s INTEGER NOT NULL, speaker_id INTEGER, spoke TEXT, silent TEXT NOT NULL DEFAULT '[]',
     measures TEXT NOT NULL, end_spoke TEXT, end_measures TEXT, strength_lo REAL, strength_hi REAL, within_c REAL, sure INTEGER, reason TEXT,
     PRIMARY KEY (district_id, t_end)) STRICT`,

  // --- rules and proposals --------------------------------------------------------------------------------------
  `CREATE TABLE rule (
     id INTEGER PRIMARY KEY, district_id INTEGER NOT NULL REFERENCES district(id), version INTEGER NOT NULL, body TEXT NOT NULL, sha256 TEXT NOT NULL,
     note TEXT NOT NULL DEFAULT '', state TEXT NOT NULL CHECK (state IN ('draft','in force','past')), created_at INTEGER NOT NULL,
     created_by INTEGER NOT NULL REFERENCES user(id), from_at INTEGER, to_at INTEGER, UNIQUE (district_id, version)) STRICT`,
  `CREATE UNIQUE INDEX rule_in_force ON rule(district_id) WHERE state = 'in force'`,
  `CREATE TABLE evaluation (
     district_id INTEGER NOT NULL, t_end INTEGER NOT NULL, rule_id INTEGER NOT NULL, input_rev INTEGER NOT NULL, truths TEXT NOT NULL, at INTEGER NOT NULL,
     PRIMARY KEY (district_id, t_end)) STRICT, WITHOUT ROWID`,
  `CREATE TABLE evidence (id INTEGER PRIMARY KEY, sha256 TEXT NOT NULL UNIQUE, body TEXT NOT NULL) STRICT`,
  `CREATE TABLE proposal (
     id INTEGER PRIMARY KEY, district_id INTEGER NOT NULL REFERENCES district(id), kind TEXT NOT NULL CHECK (kind IN ('advisory','burnBan')),
     act TEXT NOT NULL CHECK (act IN ('begin','end')), state TEXT NOT NULL CHECK (state IN ('open','confirmed','declined','returned','issued','lapsed')),
     rule_id INTEGER NOT NULL REFERENCES rule(id), evidence_id INTEGER NOT NULL REFERENCES evidence(id), t_end INTEGER NOT NULL,
     opened_at INTEGER NOT NULL, confirmed_at INTEGER, confirmed_by INTEGER REFERENCES user(id), note TEXT,
     closed_at INTEGER, closed_by INTEGER REFERENCES user(id), reason TEXT, notice_id INTEGER REFERENCES notice(id), version INTEGER NOT NULL DEFAULT 1) STRICT`,
  `CREATE UNIQUE INDEX proposal_open ON proposal(district_id, kind, act) WHERE state IN ('open','confirmed','returned')`,
  `CREATE INDEX proposal_district ON proposal(district_id, opened_at)`,

  // --- notices --------------------------------------------------------------------------------------------------
  `CREATE TABLE notice (
     id INTEGER PRIMARY KEY, ref TEXT NOT NULL UNIQUE, district_id INTEGER NOT NULL REFERENCES district(id),
     kind TEXT NOT NULL CHECK (kind IN ('advisory','burnBan')), state TEXT NOT NULL CHECK (state IN ('in force','ended','replaced')),
     origin TEXT NOT NULL CHECK (origin IN ('proposal','by hand')), reason TEXT NOT NULL, issued_at INTEGER NOT NULL, issued_by INTEGER NOT NULL REFERENCES user(id),
     effective_at INTEGER NOT NULL, expires_at INTEGER NOT NULL, ended_at INTEGER, ended_by INTEGER REFERENCES user(id), end_reason TEXT,
     texts TEXT NOT NULL, evidence_id INTEGER REFERENCES evidence(id), version INTEGER NOT NULL DEFAULT 1) STRICT`,
  `CREATE UNIQUE INDEX notice_in_force ON notice(district_id, kind) WHERE state = 'in force'`,
  `CREATE INDEX notice_issued ON notice(issued_at)`,
  `CREATE TABLE notice_event (
     notice_id INTEGER NOT NULL REFERENCES notice(id), seq INTEGER NOT NULL, kind TEXT NOT NULL CHECK (kind IN ('issued','ended','expired','replaced')), at INTEGER NOT NULL,
     by_user INTEGER, body TEXT NOT NULL, request_key TEXT UNIQUE, PRIMARY KEY (notice_id, seq)) STRICT`,
  `CREATE TRIGGER notice_event_no_update BEFORE UPDATE ON notice_event BEGIN SELECT RAISE(ABORT, 'notice events are append-only'); END`,
  `CREATE TRIGGER notice_event_no_delete BEFORE DELETE ON notice_event BEGIN SELECT RAISE(ABORT, 'notice events are append-only'); END`,

  // --- residents ------------------------------------------------------------------------------------------------
  `CREATE TABLE person (
     id INTEGER PRIMARY KEY, lang TEXT NOT NULL DEFAULT 'en' CHECK (lang IN ('en','es')), created_at INTEGER NOT NULL, left_at INTEGER) STRICT`,
  `CREATE TABLE contact (
     id INTEGER PRIMARY KEY, person_id INTEGER NOT NULL REFERENCES person(id), channel TEXT NOT NULL CHECK (channel IN ('email','sms')),
     address TEXT, address_hash TEXT NOT NULL, confirm_token_hash TEXT UNIQUE, confirm_until INTEGER, confirmed_at INTEGER, stopped_at INTEGER, stop_reason TEXT, created_at INTEGER NOT NULL) STRICT`,
  `CREATE UNIQUE INDEX contact_address ON contact(channel, address_hash) WHERE stopped_at IS NULL`,
  `CREATE INDEX contact_person ON contact(person_id)`,
  `CREATE TABLE subscription (
     person_id INTEGER NOT NULL REFERENCES person(id), district_id INTEGER NOT NULL REFERENCES district(id), kind TEXT NOT NULL CHECK (kind IN ('advisory','burnBan')), created_at INTEGER NOT NULL,
     PRIMARY KEY (person_id, district_id, kind)) STRICT, WITHOUT ROWID`,
  `CREATE INDEX subscription_district ON subscription(district_id, kind)`,
  `CREATE TABLE consent (
     id INTEGER PRIMARY KEY, person_id INTEGER NOT NULL REFERENCES person(id), act TEXT NOT NULL, text TEXT NOT NULL, origin TEXT NOT NULL, at INTEGER NOT NULL) STRICT`,

  // --- sending --------------------------------------------------------------------------------------------------
  `CREATE TABLE payload (
     id INTEGER PRIMARY KEY, topic TEXT NOT NULL, revision INTEGER NOT NULL, channel TEXT NOT NULL, lang TEXT NOT NULL, subject TEXT, text TEXT NOT NULL, html TEXT,
     UNIQUE (topic, revision, channel, lang)) STRICT`,
  `CREATE TABLE outbox (
     id INTEGER PRIMARY KEY, topic TEXT NOT NULL, revision INTEGER NOT NULL, contact_id INTEGER NOT NULL REFERENCES contact(id), payload_id INTEGER NOT NULL REFERENCES payload(id),
     channel TEXT NOT NULL CHECK (channel IN ('email','sms')), priority INTEGER NOT NULL DEFAULT 0,
     state TEXT NOT NULL CHECK (state IN ('queued','sending','accepted','delivered','failed','suppressed','expired')), attempts INTEGER NOT NULL DEFAULT 0, created_at INTEGER NOT NULL,
     next_at INTEGER NOT NULL, not_after INTEGER NOT NULL, message_id TEXT NOT NULL UNIQUE, provider_id TEXT UNIQUE, settled_at INTEGER, detail TEXT,
     UNIQUE (topic, revision, contact_id)) STRICT`,
  `CREATE INDEX outbox_due ON outbox(channel, priority DESC, next_at, id) WHERE state = 'queued'`,
  `CREATE INDEX outbox_sending ON outbox(channel) WHERE state = 'sending'`,
  `CREATE TABLE outbox_topic (topic TEXT PRIMARY KEY, silent_before INTEGER NOT NULL) STRICT, WITHOUT ROWID`,
  `CREATE INDEX outbox_topic_rows ON outbox(topic, state)`,
  `CREATE TABLE attempt (
     outbox_id INTEGER NOT NULL REFERENCES outbox(id), n INTEGER NOT NULL, at INTEGER NOT NULL, outcome TEXT NOT NULL, code TEXT, detail TEXT, PRIMARY KEY (outbox_id, n)) STRICT, WITHOUT ROWID`,

  // --- the record -----------------------------------------------------------------------------------------------
  `CREATE TABLE activity (
     seq INTEGER PRIMARY KEY, at INTEGER NOT NULL, actor TEXT NOT NULL, actor_id INTEGER, act TEXT NOT NULL, subject TEXT NOT NULL, district_id INTEGER,
     digest TEXT NOT NULL, prev TEXT NOT NULL, hash TEXT NOT NULL UNIQUE) STRICT`,
  `CREATE TABLE activity_body (seq INTEGER PRIMARY KEY REFERENCES activity(seq), body TEXT NOT NULL) STRICT`,
  `CREATE TRIGGER activity_no_update BEFORE UPDATE ON activity BEGIN SELECT RAISE(ABORT, 'the activity record is append-only'); END`,
  `CREATE TRIGGER activity_no_delete BEFORE DELETE ON activity BEGIN SELECT RAISE(ABORT, 'the activity record is append-only'); END`,
  `CREATE TABLE job (name TEXT PRIMARY KEY, last_started_at INTEGER, last_ended_at INTEGER, last_result TEXT, next_at INTEGER, runs INTEGER NOT NULL DEFAULT 0, failures INTEGER NOT NULL DEFAULT 0) STRICT`,
  `CREATE TABLE setting (key TEXT PRIMARY KEY, value TEXT NOT NULL) STRICT`,
  `CREATE TABLE session (sid TEXT PRIMARY KEY, expires INTEGER NOT NULL, absolute_end INTEGER, user_id INTEGER, data TEXT NOT NULL) STRICT`,
  `CREATE INDEX session_expires ON session(expires)`,
];
