import { createRequire } from 'node:module';
import { FORTNIGHT_S } from './fortnight.mjs';

const sqlite3 = createRequire(new URL('../../../apps/api/package.json', import.meta.url))('sqlite3');

const promised = (database, method, ...given) =>
  new Promise((resolve, reject) => {
    database[method](...given, (error, answer) => (error ? reject(error) : resolve(answer)));
  });

/** The tables that grow with time: the column of their owner, and which id of a tower's it is. */
const TABLES = [
  { table: 'reading', owner: 'sensor_id', ids: ({ sensorIds }) => sensorIds },
  { table: 'block_mean', owner: 'sensor_id', ids: ({ sensorIds }) => sensorIds },
  { table: 'profile', owner: 'tower_id', ids: ({ towerId }) => [towerId] },
  { table: 'hour', owner: 'tower_id', ids: ({ towerId }) => [towerId] },
  { table: 'district_block', owner: 'district_id', ids: ({ districtId }) => [districtId] },
  { table: 'evaluation', owner: 'district_id', ids: ({ districtId }) => [districtId] },
];

/** What of a row is not taken over as it is, besides its owner and its time. */
const own = (name, place) => {
  const ids = { speaker_id: place.towerId, spoke: `'${place.towerId}'`, rule_id: place.ruleId };
  return ids[name] ?? name;
};

/** Copies the first place's fortnight, oldest first, into the fortnights before, and for other places into its own. */
async function copy(database, { table, owner, ids }, [first, ...others], { fortnights, newest }) {
  const columns = (await promised(database, 'all', `PRAGMA table_info(${table})`)).map(({ name }) => name);
  const template = ids(first);
  for (const place of [first, ...others]) {
    const least = place === first ? 1 : 0;
    const shifts = Array.from({ length: fortnights - least }, (_, k) => (fortnights - 1 - k) * FORTNIGHT_S);
    const values = columns.map((name) => {
      if (name === owner) return '$to';
      if (name === 't_end') return 't.t_end - k.value';
      const given = own(name, place);
      return given === name ? `t.${name}` : `CASE WHEN t.${name} IS NULL THEN NULL ELSE ${given} END`;
    });
    await promised(database, 'exec', 'BEGIN');
    for (const [i, to] of ids(place).entries()) {
      await promised(
        database,
        'run',
        `INSERT INTO ${table} (${columns.join(', ')}) SELECT ${values.join(', ')}
         FROM json_each($shifts) k CROSS JOIN ${table} t ON t.${owner} = $from AND t.t_end > $after AND t.t_end <= $until`,
        {
          $to: to,
          $from: template[i],
          $shifts: JSON.stringify(shifts),
          $after: newest - FORTNIGHT_S,
          $until: newest,
        },
      );
    }
    await promised(database, 'exec', 'COMMIT');
  }
}

/**
 * Fills a store that the service has shaped and one place's fortnight has gone through: each earlier fortnight, and
 * those of the other places, are that one again. Gives the number of readings.
 */
export async function fillStore(file, places, fortnights) {
  const database = new sqlite3.Database(file);
  await promised(
    database,
    'exec',
    'PRAGMA journal_mode = OFF; PRAGMA synchronous = OFF; PRAGMA cache_size = -400000; PRAGMA locking_mode = EXCLUSIVE',
  );
  const [{ newest }] = await promised(database, 'all', 'SELECT max(t_end) newest FROM district_block');
  for (const each of TABLES) await copy(database, each, places, { fortnights, newest });
  await promised(database, 'exec', 'PRAGMA optimize');
  const [{ n }] = await promised(database, 'all', 'SELECT count(*) n FROM reading');
  await promised(database, 'close');
  return n;
}
