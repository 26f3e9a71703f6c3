import { checkBits } from '@lidwatch/contracts';
import { SetClock } from '../common/clock';
import { DirtyStages } from '../database/dirty';
import { makeDistrict, makeTower } from '../testing/places';
import { createTestApp, type TestApp } from '../testing/test-app';
import { ReadingsService } from '../readings/readings.service';
import type { ParsedReading } from '../readings/parse/parsed-readings';

const INTERVAL_S = 300;
const BEGIN = Date.UTC(2025, 11, 1) / 1000;
const END = BEGIN + 1.75 * 86_400;
/** Corrections come to the first hours only: later ones must be right without being touched again. */
const CORRECTED_S = 12 * 3600;
const ORDERS = 20;

const BLOCK_S = 900;

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

/** The order of one loading: as recorded, in time, backwards in time (both in small batches), then at random. */
function arranged(rows: readonly ParsedReading[], order: number, next: () => number): ParsedReading[] {
  if (order > 2) return shuffled(rows, next);
  const inTime = [...rows].sort((a, b) => a.tEnd - b.tEnd);
  return [[...rows], inTime, inTime.toReversed()][order]!;
}

/** Nights with an inversion, gaps, single spikes, a stuck sensor, values beyond what is possible. */
function record(sensorIds: readonly number[]): ParsedReading[] {
  const next = numbersFrom(7);
  const rows: ParsedReading[] = [];
  for (let t = BEGIN + INTERVAL_S; t <= END; t += INTERVAL_S) {
    const night = Math.cos(((t - BEGIN) / 86_400) * 2 * Math.PI);
    sensorIds.forEach((sensorId, level) => {
      const noise = Math.round((next() - 0.5) * 10) / 10;
      const stuck = level === 1 && t > BEGIN + 108_000 && t < BEGIN + 129_600;
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

/** A bench tower of another interval, which warms with the mast at times and at times is far from it. */
function neighbourRecord(sensorId: number): ParsedReading[] {
  const next = numbersFrom(11);
  const rows: ParsedReading[] = [];
  for (let t = BEGIN + 2 * INTERVAL_S; t <= END; t += 2 * INTERVAL_S) {
    const chance = next();
    if (chance < 0.05) continue;
    const value = -6 + Math.round((next() - 0.5) * 160) / 10;
    rows.push({ sensorId, tEnd: t, value, rowNo: 1 });
  }
  return rows;
}

const TABLES: Record<string, string> = {
  reading: `SELECT name, t_end, value, r.quality, checks FROM reading r JOIN sensor s ON s.id = r.sensor_id
    WHERE tower_id = $1 ORDER BY s.id, t_end`,
  block_mean: `SELECT name, t_end, mean, n, b.quality FROM block_mean b JOIN sensor s ON s.id = b.sensor_id
    WHERE tower_id = $1 ORDER BY s.id, t_end`,
  profile: 'SELECT *, 0 AS rev, 0 AS tower_id FROM profile WHERE tower_id = $1 ORDER BY t_end',
  hour: 'SELECT *, 0 AS tower_id FROM hour WHERE tower_id = $1 ORDER BY t_end',
  district_block: `SELECT b.t_end, block_s, measures, end_measures, strength_lo, strength_hi, within_c, sure, reason
    FROM district_block b JOIN district_tower d USING (district_id) WHERE d.tower_id = $1 ORDER BY b.t_end`,
};

describe('the same readings in any order, in batches of any size, late and corrected', () => {
  let test: TestApp;
  beforeAll(async () => {
    test = await createTestApp({ clock: new SetClock(END + 7200) });
  });
  afterAll(() => test.close());

  /** A mast of its own for each order, with a PM2.5 monitor, that speaks for a district of its own. */
  async function makeMast(): Promise<{ towerId: number; sensorIds: number[] }> {
    const mast = await makeTower(test, { interval_s: INTERVAL_S, block_s: BLOCK_S });
    for (const [name, quantity] of [
      ['rh', 'relative humidity'],
      ['pm25', 'pm2.5'],
    ] as const) {
      const [made] = await test.sql.returning<{ id: number }>(
        `WITH one AS (SELECT 1) INSERT INTO sensor (tower_id, name, quantity, unit)
         SELECT $1, $2, $3, '' FROM one RETURNING id`,
        [mast.towerId, name, quantity],
      );
      await test.sql.run(
        'INSERT INTO sensor_version (sensor_id, from_t, height_m, sigma) VALUES ($1, 0, 2, 1)',
        [made!.id],
      );
      mast.sensorIds.push(made!.id);
    }
    const districtId = await makeDistrict(test, { pm25_tower_id: mast.towerId });
    await test.sql.run('INSERT INTO district_tower (district_id, tower_id, position) VALUES ($1, $2, 0)', [
      districtId,
      mast.towerId,
    ]);
    return mast;
  }

  /** A bench tower that the mast's readings are held against. */
  async function makeNeighbour(mast: { towerId: number; sensorIds: number[] }) {
    const bench = await makeTower(test, { interval_s: 600, block_s: 600, heightsM: [2] });
    await test.sql.run('INSERT INTO tower_neighbour VALUES ($1, $2)', [mast.towerId, bench.towerId]);
    await test.sql.run(`UPDATE sensor SET screening_limits = '{"neighbourDifference":7.5}' WHERE id = $1`, [
      mast.sensorIds[0],
    ]);
    return { towerId: bench.towerId, sensorId: bench.sensorIds[0]! };
  }

  /** First wrong values, later the right ones; with late readings, in batches of any size. */
  async function load(order: number): Promise<Record<string, object[]>> {
    const mast = await makeMast();
    const { towerId, sensorIds } = mast;
    const bench = await makeNeighbour(mast);
    const [readings, dirty] = [test.app.get(ReadingsService, { strict: false }), test.app.get(DirtyStages)];
    const right = [...record(sensorIds), ...neighbourRecord(bench.sensorId)];
    const next = numbersFrom(order + 100);
    const isWrong = right.map(({ tEnd }) => next() < 0.1 && tEnd < BEGIN + CORRECTED_S);
    const wrong = right.filter((_, i) => isWrong[i]).map((row) => ({ ...row, value: row.value + 3 }));
    const first = right.filter((_, i) => !isWrong[i]);
    const late = right.filter((_, i) => isWrong[i]);
    const rows = [...arranged([...first, ...wrong], order, next), ...arranged(late, order, next)];
    const largest = rows.length * (order === 1 || order === 2 ? 0.05 : 0.4);
    for (let at = 0; at < rows.length;) {
      const batch = rows.slice(at, at + 1 + Math.floor(next() * largest));
      const isBench = ({ sensorId }: ParsedReading): boolean => sensorId === bench.sensorId;
      const parts = [
        { towerId, rows: batch.filter((row) => !isBench(row)) },
        { towerId: bench.towerId, rows: batch.filter(isBench) },
      ];
      for (const part of next() < 0.5 ? parts : parts.toReversed()) {
        if (part.rows.length === 0) continue;
        await readings.ingest(part.towerId, part.rows, { origin: 'folder', name: 'mast.csv' });
        if (next() < 0.3) await dirty.drainAll();
      }
      if (next() < 0.6) await dirty.drainAll();
      at += batch.length;
    }
    await dirty.drainAll();
    const tables: Record<string, object[]> = {};
    for (const [name, query] of Object.entries(TABLES)) tables[name] = await test.sql.all(query, [towerId]);
    return tables;
  }

  it(`give the same tables in ${ORDERS} orders, from readings to district blocks`, async () => {
    const expected = await load(0);
    const readings = expected.reading as { quality: number; checks: number }[];
    expect(readings.filter(({ quality }) => quality === 2).length).toBeGreaterThan(10);
    expect(readings.filter(({ checks }) => checks & checkBits.neighbours).length).toBeGreaterThan(10);
    expect(expected.profile!.length).toBe((END - BEGIN) / BLOCK_S);
    expect(expected.district_block!.length).toBe((END - BEGIN) / BLOCK_S);
    for (let order = 1; order < ORDERS; order += 1) {
      const found = await load(order);
      for (const table of Object.keys(TABLES)) {
        const differ = found[table]!.filter(
          (row, i) => JSON.stringify(row) !== JSON.stringify(expected[table]![i]),
        );
        expect({ order, table, differ: differ.slice(0, 2) }).toEqual({ order, table, differ: [] });
        expect(found[table]!.length).toBe(expected[table]!.length);
      }
    }
  }, 180_000);
});
