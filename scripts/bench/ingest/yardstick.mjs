import { spawnSync } from 'node:child_process';
import { createWriteStream } from 'node:fs';
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import { winterRows } from './winter.mjs';

/** The table the service keeps readings in. */
const TABLE = `CREATE TABLE reading (
  sensor_id INTEGER NOT NULL, t_end INTEGER NOT NULL, value REAL NOT NULL, quality INTEGER NOT NULL DEFAULT 0,
  checks INTEGER NOT NULL DEFAULT 0, import_id INTEGER NOT NULL, row_no INTEGER NOT NULL,
  PRIMARY KEY (sensor_id, t_end)) STRICT, WITHOUT ROWID;`;

/**
 * Seconds that the sqlite3 command line needs to `.import` the same rows into the same table; undefined where that
 * command is not installed.
 */
export async function importSeconds(readings) {
  if (spawnSync('sqlite3', ['-version']).status !== 0) return undefined;
  const folder = await mkdtemp(path.join(tmpdir(), 'lidwatch-yardstick-'));
  try {
    const rows = path.join(folder, 'rows.csv');
    await pipeline(Readable.from(winterRows(readings)), createWriteStream(rows));
    const script = `PRAGMA journal_mode=WAL; PRAGMA synchronous=NORMAL;\n${TABLE}\n.mode csv\n.import ${rows} reading\n`;
    const begun = performance.now();
    const { status, stderr } = spawnSync('sqlite3', [path.join(folder, 'store.sqlite')], { input: script });
    if (status !== 0) throw new Error(`sqlite3 could not import: ${stderr}`);
    return (performance.now() - begun) / 1000;
  } finally {
    await rm(folder, { recursive: true });
  }
}
