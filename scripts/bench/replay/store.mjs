import { createRequire } from 'node:module';

const sqlite3 = createRequire(new URL('../../../apps/api/package.json', import.meta.url))('sqlite3');
const BATCH = 5_000;

const INSERT = `INSERT INTO district_block SELECT $tower, value->>'tEnd', 900, $spoke, value->>'measures' FROM json_each($rows)`;

/** The range that two stored ends stand for; both null is not known. */
const quantity = ([lo, hi, reason]) => ({
  lo: lo ?? -Infinity,
  hi: hi ?? Infinity,
  ...(reason && { reason }),
});

const promised = (database, method, ...given) =>
  new Promise((resolve, reject) => {
    database[method](...given, (error, answer) => (error ? reject(error) : resolve(answer)));
  });

/** A SQLite file with blocks as the service keeps them: one row each, its measures as JSON. */
export async function openStore(file) {
  const database = new sqlite3.Database(file);
  await promised(
    database,
    'exec',
    `PRAGMA journal_mode = WAL; PRAGMA synchronous = OFF; CREATE TABLE district_block (district_id INTEGER NOT NULL,
     t_end INTEGER NOT NULL, block_s INTEGER NOT NULL, spoke TEXT, measures TEXT NOT NULL,
     PRIMARY KEY (district_id, t_end)) STRICT, WITHOUT ROWID`,
  );
  const insert = (tower, rows) =>
    promised(database, 'run', INSERT, { $tower: tower, $spoke: String(tower), $rows: JSON.stringify(rows) });
  return {
    async keep(tower, blocks) {
      let rows = [];
      for (const { tEnd, measures } of blocks) {
        rows.push({ tEnd, measures: JSON.stringify(measures) });
        if (rows.length < BATCH) continue;
        await insert(tower, rows);
        rows = [];
      }
      if (rows.length > 0) await insert(tower, rows);
    },
    async read(tower) {
      const rows = await promised(
        database,
        'all',
        'SELECT t_end, block_s, spoke, measures FROM district_block WHERE district_id = ? ORDER BY t_end',
        tower,
      );
      return rows.map(({ t_end: tEnd, block_s: blockSeconds, spoke: speaker, measures }) => {
        const values = Object.entries(JSON.parse(measures)).map(([name, kept]) => [name, quantity(kept)]);
        return { tEnd, blockSeconds, speaker, values: Object.fromEntries(values) };
      });
    },
    close: () => promised(database, 'close'),
  };
}
