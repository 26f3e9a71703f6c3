import { openPipeline, type Pipeline, type TestTower } from '../testing/pipeline';
import type { ParsedReading } from '../readings/parse/parsed-readings';

const INTERVAL_S = 300;
const BEGIN = Date.UTC(2025, 11, 1) / 1000;
const END = BEGIN + 2.5 * 86_400;
const ORDERS = 20;

const mast: TestTower = {
  intervalS: INTERVAL_S,
  blockS: 900,
  sensors: [
    ...[2, 10, 30, 60].map((heightM) => ({ name: `t${heightM}`, quantity: 'air temperature', heightM })),
    { name: 'rh', quantity: 'relative humidity', heightM: 2 },
    { name: 'pm25', quantity: 'pm2.5', heightM: 3 },
  ],
};

/** Numbers from 0 to 1 that are the same in every run (mulberry32). */
const numbersFrom = (seed: number) => () => {
  seed = (seed + 0x6d2b79f5) | 0;
  let t = Math.imul(seed ^ (seed >>> 15), 1 | seed);
  t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
  return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
};

const shuffled = <T>(list: readonly T[], next: () => number): T[] => {
  const all = [...list];
  for (let i = all.length - 1; i > 0; i -= 1) {
    const j = Math.floor(next() * (i + 1));
    [all[i], all[j]] = [all[j]!, all[i]!];
  }
  return all;
};

/** Nights with an inversion, gaps, single spikes, a stuck sensor, values beyond what is possible. */
function record(sensorIds: readonly number[]): ParsedReading[] {
  const next = numbersFrom(7);
  const rows: ParsedReading[] = [];
  for (let t = BEGIN + INTERVAL_S; t <= END; t += INTERVAL_S) {
    const night = Math.cos(((t - BEGIN) / 86_400) * 2 * Math.PI);
    sensorIds.forEach((sensorId, level) => {
      const noise = Math.round((next() - 0.5) * 10) / 10;
      const stuck = level === 1 && t > BEGIN + 30_000 && t < BEGIN + 55_000;
      const temperature = stuck ? -7.25 : -6 + night * (level * 1.2 - 2) + noise;
      const usual = level === 4 ? 80 + 10 * noise : level === 5 ? 20 + 15 * night + noise : temperature;
      const chance = next();
      if (chance < 0.03) return;
      const value = chance > 0.997 ? 999 : chance > 0.992 ? usual + 12 : usual;
      rows.push({ sensorId, tEnd: t, value, rowNo: 1 });
    });
  }
  return rows;
}

const TABLES: Record<string, string> = {
  reading: 'SELECT sensor_id, t_end, value, quality, checks FROM reading ORDER BY 1, 2',
  block_mean: 'SELECT * FROM block_mean ORDER BY 1, 2',
  profile: 'SELECT *, 0 AS rev FROM profile ORDER BY tower_id, t_end',
  hour: 'SELECT * FROM hour ORDER BY 1, 2',
};

async function tablesOf({ sql }: Pipeline): Promise<Record<string, object[]>> {
  const tables: Record<string, object[]> = {};
  for (const [name, query] of Object.entries(TABLES)) tables[name] = await sql.all(query);
  return tables;
}

/** First wrong values, later the right ones; with late readings, in batches of any size. */
async function load(order: number): Promise<Record<string, object[]>> {
  const pipeline = await openPipeline(END + 7200);
  const { towerId, sensorIds } = await pipeline.makeTower(mast);
  const right = record(sensorIds);
  const next = numbersFrom(order + 100);
  const wrong = right.filter(() => next() < 0.05).map((row) => ({ ...row, value: row.value + 3 }));
  const later = new Set(wrong.map((row) => `${row.sensorId} ${row.tEnd}`));
  const [late, first] = [
    right.filter((row) => later.has(`${row.sensorId} ${row.tEnd}`)),
    right.filter((row) => !later.has(`${row.sensorId} ${row.tEnd}`)),
  ];
  const inOrder = order === 0 ? [...first, ...wrong] : shuffled([...first, ...wrong], next);
  const rows = [...inOrder, ...(order === 0 ? late : shuffled(late, next))];
  for (let at = 0; at < rows.length;) {
    const size = 1 + Math.floor(next() * rows.length * 0.4);
    await pipeline.readings.ingest(towerId, rows.slice(at, at + size), {
      origin: 'folder',
      name: 'mast.csv',
    });
    if (next() < 0.6) await pipeline.dirty.drainAll();
    at += size;
  }
  await pipeline.dirty.drainAll();
  const tables = await tablesOf(pipeline);
  await pipeline.close();
  return tables;
}

describe('the same readings in any order, in batches of any size, late and corrected', () => {
  it(`give the same tables in ${ORDERS} orders`, async () => {
    const expected = await load(0);
    const readings = expected.reading as { quality: number; checks: number }[];
    expect(readings.filter(({ quality }) => quality === 2).length).toBeGreaterThan(10);
    expect(expected.profile!.length).toBe((END - BEGIN) / mast.blockS);
    for (let order = 1; order < ORDERS; order += 1) {
      const found = await load(order);
      for (const table of Object.keys(TABLES)) {
        const differ = found[table]!.filter(
          (row, i) => JSON.stringify(row) !== JSON.stringify(expected[table]![i]),
        );
        expect({ order, table, differ: differ.slice(0, 3) }).toEqual({ order, table, differ: [] });
        expect(found[table]!.length).toBe(expected[table]!.length);
      }
    }
  }, 120_000);
});
