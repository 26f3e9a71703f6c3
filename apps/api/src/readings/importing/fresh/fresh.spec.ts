import { SetClock } from '../../../common/clock';
import { DirtyStages } from '../../../database/dirty';
import { makeDistrict, makeTower } from '../../../testing/places';
import { createTestApp, type TestApp } from '../../../testing/test-app';
import { DEFAULT_MAPPING } from '../../parse/mapping';
import type { ParsedReading } from '../../parse/parsed-readings';
import { ReadingContexts } from '../../reading-contexts';
import { ReadingsService } from '../../readings.service';
import { ImportRunner } from '../import-runner';

const INTERVAL_S = 300;
const BEGIN = Date.UTC(2025, 10, 1) / 1000;
const DAYS = 9;
const END = BEGIN + DAYS * 86_400;
const NAMES = ['temperature_2m', 'temperature_10m', 'temperature_30m', 'temperature_60m', 'rh', 'pm25'];

/** Numbers from 0 to 1 that are the same in every run (mulberry32). */
const numbersFrom = (seed: number) => () => {
  seed = (seed + 0x6d2b79f5) | 0;
  let t = Math.imul(seed ^ (seed >>> 15), 1 | seed);
  t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
  return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
};

/** A line per instant: nights with an inversion, gaps, spikes, stuck and quiet stretches, impossible values. */
function record(): string[] {
  const next = numbersFrom(3);
  const lines: string[] = [];
  for (let t = BEGIN + INTERVAL_S; t <= END; t += INTERVAL_S) {
    const hour = (t - BEGIN) / 3600;
    const night = Math.cos((hour / 24) * 2 * Math.PI);
    const cells = NAMES.map((_, level) => {
      const noise = (next() - 0.5) * 0.8;
      const stuck = (level === 1 && hour % 90 > 70) || (level === 2 && hour > 150 && hour < 156);
      const usual = level === 4 ? 80 + 10 * noise : level === 5 ? 20 + 15 * night + noise : 0;
      const value = level > 3 ? usual : stuck ? -7.25 : -6 + night * (level * 1.2 - 2) + noise;
      const chance = next();
      if (chance < 0.02) return '';
      return String(Math.round((chance > 0.998 ? 999 : chance > 0.994 ? value + 12 : value) * 100) / 100);
    });
    if (hour < 110 || hour > 135) lines.push([new Date(t * 1000).toISOString(), ...cells].join(','));
  }
  return lines;
}

const TABLES: Record<string, string> = {
  reading: `SELECT name, t_end, value, r.quality, checks FROM reading r JOIN sensor s ON s.id = r.sensor_id
    WHERE tower_id = $1 ORDER BY s.id, t_end`,
  reading_past: `SELECT name, t_end, value FROM reading_past r JOIN sensor s ON s.id = r.sensor_id
    WHERE tower_id = $1 ORDER BY s.id, t_end`,
  block_mean: `SELECT name, t_end, mean, n, b.quality FROM block_mean b JOIN sensor s ON s.id = b.sensor_id
    WHERE tower_id = $1 ORDER BY s.id, t_end`,
  profile: 'SELECT *, 0 AS rev, 0 AS tower_id FROM profile WHERE tower_id = $1 ORDER BY t_end',
  hour: 'SELECT *, 0 AS tower_id FROM hour WHERE tower_id = $1 ORDER BY t_end',
  district_block: `SELECT b.t_end, block_s, measures, end_measures, strength_lo, strength_hi, within_c, sure, reason
    FROM district_block b JOIN district_tower d USING (district_id) WHERE d.tower_id = $1 ORDER BY b.t_end`,
};

type Mast = { towerId: number; sensorIds: number[] };

jest.setTimeout(30_000);

describe('readings that an import writes worked out', () => {
  let test: TestApp;
  beforeAll(async () => {
    test = await createTestApp({ clock: new SetClock(END + 7200) });
  });
  afterAll(() => test.close());

  async function makeMast(): Promise<Mast> {
    const mast = await makeTower(test, { interval_s: INTERVAL_S, block_s: 900 });
    for (const [name, quantity] of [
      ['rh', 'relative humidity'],
      ['pm25', 'pm2.5'],
    ] as const) {
      const [made] = await test.sql.returning<{ id: number }>(
        `WITH one AS (SELECT 1) INSERT INTO sensor (tower_id, name, quantity, unit)
         SELECT $1, $2, $3, '' FROM one RETURNING id`,
        [mast.towerId, name, quantity],
      );
      const version = 'INSERT INTO sensor_version (sensor_id, from_t, height_m, sigma) VALUES ($1, 0, 2, 1)';
      await test.sql.run(version, [made!.id]);
      mast.sensorIds.push(made!.id);
    }
    const districtId = await makeDistrict(test, { pm25_tower_id: mast.towerId });
    const part = 'INSERT INTO district_tower (district_id, tower_id, position) VALUES ($1, $2, 0)';
    await test.sql.run(part, [districtId, mast.towerId]);
    return mast;
  }

  const bytesOf = async function* (lines: readonly string[]): AsyncGenerator<Buffer> {
    yield Buffer.from(`${['time', ...NAMES].join(',')}\n${lines.join('\n')}\n`);
  };
  const importLines = async (towerId: number, lines: readonly string[]): Promise<void> => {
    const context = await test.app.get(ReadingContexts, { strict: false }).of(towerId, DEFAULT_MAPPING);
    const origin = { origin: 'upload', name: 'mast.csv' } as const;
    await test.app
      .get(ImportRunner, { strict: false })
      .run({ towerId, origin, context, bytes: bytesOf(lines), pieceBytes: 30_000 });
  };
  const ingest = async ({ towerId }: Mast, rows: ParsedReading[]): Promise<void> => {
    await test.app
      .get(ReadingsService, { strict: false })
      .ingest(towerId, rows, { origin: 'push', name: 'live' });
  };
  const rowsOf = ({ sensorIds }: Mast, lines: readonly string[]): ParsedReading[] =>
    lines.flatMap((line) => {
      const [time, ...cells] = line.split(',');
      return cells.flatMap((cell, i) =>
        cell === ''
          ? []
          : [{ sensorId: sensorIds[i]!, tEnd: Date.parse(time!) / 1000, value: Number(cell), rowNo: 1 }],
      );
    });
  const tablesOf = async ({ towerId }: Mast): Promise<Record<string, object[]>> => {
    await test.app.get(DirtyStages).drainAll();
    const tables: Record<string, object[]> = {};
    for (const [name, query] of Object.entries(TABLES)) tables[name] = await test.sql.all(query, [towerId]);
    return tables;
  };
  /** The same lines by the usual way only. */
  const expectedOf = async (...parts: readonly (readonly string[])[]): Promise<Record<string, object[]>> => {
    const mast = await makeMast();
    for (const lines of parts) await ingest(mast, rowsOf(mast, lines));
    return tablesOf(mast);
  };
  const expectSame = (found: Record<string, object[]>, expected: Record<string, object[]>): void => {
    for (const table of Object.keys(TABLES)) {
      const rows = new Set(expected[table]!.map((row) => JSON.stringify(row)));
      const differ = found[table]!.filter((row) => !rows.has(JSON.stringify(row)));
      expect({ table, differ: differ.slice(0, 2) }).toEqual({ table, differ: [] });
      expect({ table, rows: found[table]!.length }).toEqual({ table, rows: expected[table]!.length });
    }
  };
  const profiles = async ({ towerId }: Mast): Promise<number> =>
    (await test.sql.get<{ n: number }>('SELECT count(*) n FROM profile WHERE tower_id = $1', [towerId]))!.n;

  const lines = record();
  let usual: Record<string, object[]>;
  beforeAll(async () => {
    usual = await expectedOf(lines);
  }, 30_000);

  it('are those of the usual way, in every table, and most are there before a stage has run', async () => {
    const flagged = (usual.reading as { quality: number }[]).filter(({ quality }) => quality > 0);
    expect(flagged.length).toBeGreaterThan(100);
    const mast = await makeMast();
    const sometimesTwice = lines.flatMap((line, i) => (i % 40 === 7 ? [line, line] : [line]));
    await importLines(mast.towerId, sometimesTwice);
    expect(await profiles(mast)).toBeGreaterThan(0.7 * usual.profile!.length);
    expectSame(await tablesOf(mast), usual);
  });

  it('are those of the usual way where other readings lie in their midst already', async () => {
    const mast = await makeMast();
    const other = lines.slice(1_300, 1_320);
    await ingest(mast, rowsOf(mast, other));
    await importLines(mast.towerId, lines);
    expectSame(await tablesOf(mast), usual);
    const states = await test.sql.all('SELECT origin, state FROM import WHERE tower_id = $1 ORDER BY id', [
      mast.towerId,
    ]);
    expect(states).toEqual([
      { origin: 'push', state: 'done' },
      { origin: 'upload', state: 'done' },
    ]);
  });

  it('are those of the usual way where others come while they are written, and the stages run', async () => {
    const mast = await makeMast();
    const importing = importLines(mast.towerId, lines);
    const live = lines.map((_, i) => lines.slice(i, i + 3)).filter((_, i) => i % 400 === 200);
    for (const each of live) {
      await ingest(mast, rowsOf(mast, each));
      await test.app.get(DirtyStages).drainAll();
    }
    await importing;
    expectSame(await tablesOf(mast), usual);
  });

  it('are those of the usual way where a part is out of order, repeated or corrected', async () => {
    const wrong = lines.slice(800, 810).map((line) => line.replace(/,-?\d+(\.\d+)?/, ',-3.5'));
    const mixed = [
      ...lines.slice(0, 700),
      ...wrong,
      ...lines.slice(1_500),
      ...lines.slice(700, 1_600),
      ...lines.slice(100, 200),
    ];
    const mast = await makeMast();
    await importLines(mast.towerId, mixed);
    const { reading_past: past, ...found } = await tablesOf(mast);
    expectSame({ ...found, reading_past: [] }, { ...usual, reading_past: [] });
    expect(past!.length).toBeGreaterThan(5);
  });

  it('go on where an earlier file ended, and change nothing when they come again', async () => {
    const mast = await makeMast();
    await importLines(mast.towerId, lines.slice(0, 1_200));
    await test.app.get(DirtyStages).drainAll();
    await importLines(mast.towerId, lines.slice(1_190));
    await importLines(mast.towerId, lines);
    expectSame(await tablesOf(mast), usual);
  });
});
