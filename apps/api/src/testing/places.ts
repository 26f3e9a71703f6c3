import type { TestApp } from './test-app';

let made = 0;

/** Puts a district into the store; what is given replaces the defaults. Returns its id. */
export async function makeDistrict(
  { sql, clock }: TestApp,
  changes: Record<string, unknown> = {},
): Promise<number> {
  const n = ++made;
  const row = {
    slug: `district-${n}`,
    name: `District ${n}`,
    time_zone: 'America/Denver',
    elevation_m: 1280,
    latitude: 40.7,
    longitude: -111.9,
    created_at: clock.now(),
    ...changes,
  };
  return insert({ sql }, 'district', row);
}

/** Puts a tower with air-temperature sensors at these heights into the store. Returns its id and the sensors' ids. */
export async function makeTower(
  test: TestApp,
  { heightsM = [2, 10, 30, 60], ...changes }: { heightsM?: number[]; [column: string]: unknown } = {},
): Promise<{ towerId: number; sensorIds: number[] }> {
  const n = ++made;
  const towerId = await insert(test, 'tower', {
    slug: `tower-${n}`,
    name: `Tower ${n}`,
    elevation_m: 1280,
    latitude: 40.7,
    longitude: -111.9,
    interval_s: 600,
    block_s: 600,
    created_at: test.clock.now(),
    ...changes,
  });
  const sensorIds: number[] = [];
  for (const heightM of heightsM) sensorIds.push(await makeSensor(test, towerId, heightM));
  return { towerId, sensorIds };
}

async function makeSensor(test: TestApp, towerId: number, heightM: number): Promise<number> {
  const name = `temperature_${heightM}m`;
  const id = await insert(test, 'sensor', {
    tower_id: towerId,
    name,
    quantity: 'air temperature',
    unit: 'degC',
  });
  await test.sql.run(
    'INSERT INTO sensor_version (sensor_id, from_t, height_m, sigma) VALUES ($1, 0, $2, 0.1)',
    [id, heightM],
  );
  return id;
}

async function insert(
  { sql }: Pick<TestApp, 'sql'>,
  table: string,
  row: Record<string, unknown>,
): Promise<number> {
  const columns = Object.keys(row);
  const [made] = await sql.returning<{ id: number }>(
    `WITH made AS (SELECT 1) INSERT INTO ${table} (${columns.join(', ')})
     SELECT ${columns.map((_, i) => `$${i + 1}`).join(', ')} FROM made RETURNING id`,
    Object.values(row),
  );
  if (!made) throw new Error(`No row was made in ${table}.`);
  return made.id;
}
