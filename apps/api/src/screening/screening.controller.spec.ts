import { DirtyStages } from '../database/dirty';
import { ReadingsService } from '../readings/readings.service';
import { makeDistrict, makeTower } from '../testing/places';
import { signInAs, type SignedInAgent } from '../testing/people';
import { createTestApp, type TestApp } from '../testing/test-app';
import { SetClock } from '../common/clock';
import type { TowerCalendarDto } from './dto/calendar.dto';
import type { FlaggedSpanPage } from './dto/flags.dto';
import type { RawReadingsDto } from './dto/raw.dto';
import type { ReadingDetailDto } from './dto/reading-detail.dto';

const INTERVAL_S = 600;
const DAY_S = 86_400;
/** Midnight in Denver, the day 2026-01-15. */
const MIDNIGHT = Date.UTC(2026, 0, 15, 7) / 1000;
const iso = (t: number): string => new Date(t * 1000).toISOString();

/** Temperatures at 2, 10, 30 and 60 m at the i-th reading of a day; null where a sensor is silent. */
type Air = (i: number) => readonly (number | null)[];
const wobble = (i: number, k: number): number => (((i * 7 + k * 3) % 10) - 5) * 0.06;

describe('what screening saw', () => {
  let test: TestApp;
  let analyst: SignedInAgent;
  beforeAll(async () => {
    test = await createTestApp({ clock: new SetClock(MIDNIGHT + 2 * DAY_S) });
    analyst = await signInAs(test, 'analyst');
  });
  afterAll(() => test.close());

  /** A tower in Denver's zone that measured this air on one day, screened. */
  async function measured(air: Air, readings = 144) {
    const tower = await makeTower(test, { interval_s: INTERVAL_S, block_s: INTERVAL_S });
    const districtId = await makeDistrict(test);
    await test.sql.run('INSERT INTO district_tower (district_id, tower_id, position) VALUES ($1, $2, 0)', [
      ...[districtId, tower.towerId],
    ]);
    const rows = Array.from({ length: readings }, (_, i) =>
      air(i).flatMap((value, k) =>
        value === null
          ? []
          : [{ sensorId: tower.sensorIds[k]!, tEnd: MIDNIGHT + (i + 1) * INTERVAL_S, value, rowNo: i }],
      ),
    ).flat();
    await test.app
      .get(ReadingsService, { strict: false })
      .ingest(tower.towerId, rows, { origin: 'push', name: 'test' });
    await test.app.get(DirtyStages, { strict: false }).drainAll();
    return tower;
  }
  const get = async <T>(path: string, query: Record<string, string | number>): Promise<T> =>
    (await analyst.http.get(path).query(query).expect(200)).body as T;
  const day = { from: iso(MIDNIGHT), to: iso(MIDNIGHT + DAY_S) };

  /** Hours of a real winter that textbook limits take for faults. */
  const REAL: readonly (readonly [string, Air])[] = [
    [
      'an inversion of 12 °C, 7 °C of it between two levels',
      (i) => [-20, -13, -10, -8].map((t, k) => t + wobble(i, k)),
    ],
    [
      'a morning whose lowest layer cools upward nine times beyond the autoconvective rate, under a lid',
      (i) => [-4, -6.5, -6, -3].map((t, k) => t + wobble(i, k)),
    ],
    [
      'a warm wind: 11 °C in less than an hour, the top first',
      (i) => [-9, -7, -5, -3].map((t, k) => t + wobble(i, k) + Math.min(11, Math.max(0, (i - 80 + k) * 2.8))),
    ],
    [
      'a break-up that only the lowest level feels at first',
      (i) =>
        [-12, -6, -5, -4].map(
          (t, k) => t + wobble(i, k) + (k === 0 && i > 60 ? Math.min(7, (i - 60) * 1.8) : 0),
        ),
    ],
    ['fog and melting snow: steady for a day', (i) => [0.2, 0.1, 0, -0.1].map((t) => t + (i % 2) * 0.1)],
  ];
  it.each(REAL)('never fails %s', async (_, air) => {
    const { towerId } = await measured(air);
    const { days } = await get<TowerCalendarDto>(`/api/towers/${towerId}/calendar`, {
      ...{ from: '2026-01-15', to: '2026-01-15' },
    });
    expect(days[0]!.sensors.map(({ failed, completenessPercent }) => [failed, completenessPercent])).toEqual(
      Array(4).fill([0, 100]),
    );
    const page = await get<FlaggedSpanPage>(`/api/towers/${towerId}/flags`, day);
    expect(page.items.filter(({ quality }) => quality === 'failed')).toEqual([]);
    const levels = await test.sql.get<{ n: number }>(
      'SELECT count(*) n FROM block_mean WHERE sensor_id IN (SELECT id FROM sensor WHERE tower_id = $1) AND mean IS NULL',
      [towerId],
    );
    expect(levels!.n).toBe(0);
  });

  describe('of a tower with a stuck sensor, a spike and a gap', () => {
    let tower: { towerId: number; sensorIds: number[] };
    beforeAll(async () => {
      tower = await measured((i) => [
        i === 100 ? 12 : -8 + wobble(i, 0) + 2 * Math.sin(i / 20),
        -6 + wobble(i, 1) + 2 * Math.sin(i / 20),
        i >= 30 && i < 60 ? -4.2 : -4 + wobble(i, 2) + 2 * Math.sin(i / 20),
        i < 12 ? null : -3 + wobble(i, 3) + 2 * Math.sin(i / 20),
      ]);
    });
    const flags = (query = {}) =>
      get<FlaggedSpanPage>(`/api/towers/${tower.towerId}/flags`, { ...day, ...query });

    it('counts each local day by sensor', async () => {
      const calendar = await get<TowerCalendarDto>(`/api/towers/${tower.towerId}/calendar`, {
        ...{ from: '2026-01-14', to: '2026-01-16' },
      });
      expect(calendar).toMatchObject({
        timeZone: 'America/Denver',
        days: [{}, { from: iso(MIDNIGHT).replace('.000', '') }, {}],
      });
      const [before, own, after] = calendar.days;
      expect(before!.sensors[0]).toMatchObject({ expected: 0, taken: 0, completenessPercent: null });
      expect(own!.sensors).toMatchObject([
        { expected: 144, taken: 144, failed: 1, completenessPercent: 99.3 },
        { expected: 144, taken: 144, failed: 0, completenessPercent: 100 },
        { expected: 144, taken: 144, failed: 30, completenessPercent: 79.2 },
        { expected: 144, taken: 132, failed: 0, completenessPercent: 91.7 },
      ]);
      expect(after!.sensors[0]).toMatchObject({ expected: 144, taken: 0, completenessPercent: 0 });
    });

    it('merges consecutive readings into spans with the check in plain words', async () => {
      const stuck = await flags({ check: 'stuck' });
      expect(stuck).toMatchObject({
        total: 1,
        items: [
          {
            ...{ sensorName: 'temperature_30m', quality: 'failed', readings: 30, setBy: null },
            from: iso(MIDNIGHT + 31 * INTERVAL_S).replace('.000', ''),
            to: iso(MIDNIGHT + 60 * INTERVAL_S).replace('.000', ''),
            says: 'The very same value for 3 h or more while another level moved',
          },
        ],
      });
      expect((await flags({ check: 'spike', sensorId: tower.sensorIds[0] })).items).toMatchObject([
        { readings: 1, says: 'A single reading more than 5 °C from those before and after it' },
      ]);
      expect((await flags({ quality: 'failed' })).items.map(({ check }) => check)).toEqual([
        'spike',
        'stuck',
      ]);
      const all = await flags({ pageSize: 1 });
      expect(all.items).toHaveLength(1);
      expect(all.total).toBeGreaterThan(1);
      await analyst.http
        .get(`/api/towers/${tower.towerId}/flags`)
        .query({ ...day, sensorId: 999 })
        .expect(404);
      await analyst.http
        .get(`/api/towers/${tower.towerId}/flags`)
        .query({ ...day, check: 'mood' })
        .expect(422);
    });

    it('says whose word holds, and gives the readings with it', async () => {
      const sensorId = tower.sensorIds[2]!;
      const span = { from: iso(MIDNIGHT + 31 * INTERVAL_S), to: iso(MIDNIGHT + 60 * INTERVAL_S) };
      const wanted = { sensorId, ...span, quality: 'valid', reason: 'freezing fog, seen by camera' };
      await analyst.http.post('/api/overrides').send(wanted).expect(201);
      await test.app.get(DirtyStages, { strict: false }).drainAll();
      expect((await flags({ check: 'stuck' })).items).toMatchObject([
        { quality: 'valid', setBy: analyst.name },
      ]);
      const raw = await get<RawReadingsDto>(`/api/towers/${tower.towerId}/raw`, { ...day, sensorId });
      expect(raw.sensors).toMatchObject([
        { name: 'temperature_30m', unit: '°C', readings: 144, thinned: false },
      ]);
      expect(raw.sensors[0]!.points[30]).toMatchObject({
        value: -4.2,
        quality: 'valid',
        checks: ['override', 'stuck'],
      });
      const one = await get<ReadingDetailDto>(`/api/towers/${tower.towerId}/reading`, {
        ...{ sensorId, t: raw.sensors[0]!.points[30]!.t },
      });
      expect(one).toMatchObject({
        ...{ sensorName: 'temperature_30m', value: -4.2, corrected: -4.2, quality: 'valid', earlier: [] },
        checks: [{ check: 'stuck', says: 'The very same value for 3 h or more while another level moved' }],
        word: { quality: 'valid', by: analyst.name, reason: 'freezing fog, seen by camera' },
        from: { name: 'test', origin: 'push', rowNo: 30 },
      });
      expect(raw.sensors[0]!.points[0]).toEqual({
        t: expect.any(String),
        value: expect.any(Number),
        quality: 'valid',
      });
    });
  });

  it('thins a long stretch and keeps extremes and everything flagged', async () => {
    const { towerId, sensorIds } = await makeTower(test, { heightsM: [2] });
    const t0 = MIDNIGHT - 40 * DAY_S;
    const values = Array.from({ length: 5_000 }, (_, i) => [
      i + 1,
      ((i * 37) % 101) + (i === 2500 ? 500 : 0),
      i % 20 === 0 ? 1 : 0,
    ]);
    await test.sql.run(
      `INSERT INTO reading (sensor_id, t_end, value, quality, checks, import_id, row_no)
       SELECT $1, $2 + (value->>0) * 600, CAST(value->>1 AS REAL), value->>2, (value->>2) * 4, 1, 1 FROM json_each($3)`,
      [sensorIds[0], t0, JSON.stringify(values)],
    );
    const raw = await get<RawReadingsDto>(`/api/towers/${towerId}/raw`, {
      from: iso(t0),
      to: iso(t0 + 5_001 * 600),
    });
    const [series] = raw.sensors;
    expect(series).toMatchObject({ readings: 5_000, suspect: 250, failed: 0, thinned: true });
    expect(series!.points.length).toBeLessThanOrEqual(2_000);
    expect(series!.points.filter(({ checks }) => checks)).toHaveLength(250);
    expect(Math.max(...series!.points.map(({ value }) => value))).toBeGreaterThanOrEqual(500);
    expect(series!.points.map(({ t }) => t)).toEqual(series!.points.map(({ t }) => t).sort());
  });

  it('keeps what a reading was before', async () => {
    const { towerId, sensorIds } = await makeTower(test, { heightsM: [2] });
    const [sensorId] = sensorIds as [number];
    const readings = test.app.get(ReadingsService, { strict: false });
    for (const [rowNo, value] of [-4, -5].entries())
      await readings.ingest(towerId, [{ sensorId, tEnd: MIDNIGHT, value, rowNo }], {
        ...{ origin: 'push', name: `file ${rowNo}` },
      });
    const query = { sensorId, t: iso(MIDNIGHT) };
    expect(await get<ReadingDetailDto>(`/api/towers/${towerId}/reading`, query)).toMatchObject({
      ...{ value: -5, from: { name: 'file 1' }, earlier: [{ value: -4, from: { name: 'file 0' } }] },
    });
    await analyst.http
      .get(`/api/towers/${towerId}/reading`)
      .query({ sensorId, t: iso(MIDNIGHT + 1) })
      .expect(404);
  });

  it.each([
    ['calendar', { from: '2026-01-02', to: '2026-01-01' }, 'before the first'],
    ['calendar', { from: '2024-01-01', to: '2026-01-01' }, 'at most 400 days'],
    ['calendar', { from: '2026-02-30', to: '2026-03-01' }, 'days of the calendar'],
    ['flags', { from: '2026-01-02T00:00:00', to: '2026-01-03T00:00:00Z' }, 'with its offset'],
    ['raw', { from: '2026-01-01T00:00:00Z', to: '2026-06-01T00:00:00Z' }, 'at most 62 days'],
  ])('refuses a %s of %j with the cure', async (what, query, says) => {
    const { towerId } = await makeTower(test);
    const { body } = await analyst.http.get(`/api/towers/${towerId}/${what}`).query(query).expect(422);
    expect(JSON.stringify(body)).toContain(says);
  });
});
