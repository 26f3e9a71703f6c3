import { openPipeline, type Pipeline } from '../testing/pipeline';

const BLOCK_S = 900;
const INTERVAL_S = 300;
/** The end of a block, and of an hour. */
const T = Date.UTC(2026, 0, 10, 6) / 1000;
const heights = [2, 10, 30];
const sensors = heights.map((heightM) => ({ name: `t${heightM}`, quantity: 'air temperature', heightM }));
const ORIGIN = { origin: 'folder', name: 'mast.csv' } as const;

interface Kept {
  levels: string;
  surface: string;
  rev: number;
}

describe('profiles of closed blocks', () => {
  let pipeline: Pipeline;
  let mast: { towerId: number; sensorIds: number[] };

  beforeEach(async () => {
    pipeline = await openPipeline(T);
    mast = await pipeline.makeTower({ intervalS: INTERVAL_S, blockS: BLOCK_S, sensors });
  });
  afterEach(() => pipeline.close());

  /** Takes readings of the block that ends at `tEnd` in, level by level, and works everything out. */
  async function take(tEnd: number, levels: readonly (readonly (number | undefined)[])[]): Promise<void> {
    const rows = levels.flatMap((values, level) =>
      values.flatMap((value, i) => {
        const at = tEnd - (values.length - 1 - i) * INTERVAL_S;
        return value === undefined ? [] : [{ sensorId: mast.sensorIds[level]!, tEnd: at, value, rowNo: 1 }];
      }),
    );
    await pipeline.readings.ingest(mast.towerId, rows, ORIGIN);
    await pipeline.dirty.drainAll();
  }
  const kept = (tEnd: number): Promise<Kept | undefined> =>
    pipeline.sql.get<Kept>('SELECT levels, surface, rev FROM profile WHERE t_end = $1', [tEnd]);
  const night = [
    [-9.5, -9.6, -9.7],
    [-7.5, -7.6, -7.7],
    [-5.5, -5.6, -5.7],
  ];

  it('are made at once where every expected reading is in', async () => {
    await take(T, night);
    const { levels, surface } = (await kept(T))!;
    const means = JSON.parse(levels) as number[][];
    expect(
      means.map(([heightM, mean, sigma, n, quality]) => [heightM, mean!.toFixed(6), sigma, n, quality]),
    ).toEqual([
      [2, '-9.600000', 0.1, 3, 0],
      [10, '-7.600000', 0.1, 3, 0],
      [30, '-5.600000', 0.1, 3, 0],
    ]);
    expect(surface).toBe('present');
  });

  it('wait for late readings until the grace is over', async () => {
    await take(T, [night[0]!, night[1]!, [undefined, -5.5, -5.75]]);
    expect(await kept(T)).toBeUndefined();
    pipeline.clock.advance(149);
    await pipeline.dirty.drainAll();
    expect(await kept(T)).toBeUndefined();
    pipeline.clock.advance(1);
    await pipeline.dirty.drainAll();
    expect(JSON.parse((await kept(T))!.levels)[2]).toEqual([30, -5.625, 0.1, 2, 0]);
  });

  it('of fewer than 2 of 3 readings have no value at that level, which is never "absent"', async () => {
    pipeline.clock.advance(600);
    await take(T, [[undefined, undefined, -9.7], night[1]!, [-7.8, -7.9, -8]]);
    expect(JSON.parse((await kept(T))!.levels)[0]).toEqual([2, null, 0.1, 1, 3]);
    expect((await kept(T))!.surface).toBe('not known');
  });

  it('leave out what cannot be, unless the tower only reports', async () => {
    pipeline.clock.advance(600);
    await take(T, [[-9.5, 999, -9.7], night[1]!, night[2]!]);
    expect(JSON.parse((await kept(T))!.levels)[0]).toEqual([2, -9.6, 0.1, 2, 0]);
    const flags = await pipeline.sql.all('SELECT value, quality, checks FROM reading WHERE quality > 0');
    expect(flags).toEqual([{ value: 999, quality: 2, checks: 1 }]);

    mast = await pipeline.makeTower({
      intervalS: INTERVAL_S,
      blockS: BLOCK_S,
      sensors,
      screening: 'report-only',
    });
    await take(T, [[-9.5, 999, -9.7], night[1]!, night[2]!]);
    const shown = await pipeline.sql.get<Kept>('SELECT levels FROM profile WHERE tower_id = $1', [
      mast.towerId,
    ]);
    expect((JSON.parse(shown!.levels) as number[][])[0]![1]).toBeCloseTo(326.6, 6);
  });

  it('keep what they were when a late reading changes them', async () => {
    await take(T, night);
    pipeline.clock.advance(3600);
    await take(T, [[-8.5, -8.6, -8.7]]);
    expect((await kept(T))!.rev).toBe(2);
    const past = await pipeline.sql.all<{ rev: number; until_at: number; body: string }>(
      'SELECT * FROM profile_past',
    );
    expect(past).toMatchObject([{ rev: 1, until_at: T + 3600 }]);
    expect((JSON.parse(JSON.parse(past[0]!.body).levels) as number[][])[0]![1]).toBeCloseTo(-9.6, 9);
    await take(T, [[-8.5, -8.6, -8.7]]);
    expect((await kept(T))!.rev).toBe(2);
  });

  it('are corrected by the version of the sensor that measured', async () => {
    await pipeline.sql.run(
      `INSERT INTO sensor_version (sensor_id, from_t, height_m, sigma, "offset", gain) VALUES ($1, $2, 3, 0.2, 0.5, 2)`,
      [mast.sensorIds[0], T - BLOCK_S],
    );
    await take(T - BLOCK_S, night);
    await take(T, night);
    expect((JSON.parse((await kept(T - BLOCK_S))!.levels) as number[][])[0]).toMatchObject([
      2, -9.6, 0.1, 3, 0,
    ]);
    const [heightM, mean, sigma] = (JSON.parse((await kept(T))!.levels) as number[][])[0]!;
    expect([heightM, mean!.toFixed(6), sigma]).toEqual([3, '-18.700000', 0.2]);
  });

  it('roll up into hours, what never came being not known', async () => {
    await take(T - 2 * BLOCK_S, night);
    await take(T - BLOCK_S, night);
    await take(T, [night[2]!, night[1]!, night[0]!]);
    expect(await pipeline.sql.all('SELECT * FROM hour')).toEqual([
      {
        ...{ tower_id: mast.towerId, t_end: T, inversion_min: 30, none_min: 15, not_known_min: 15 },
        mean_strength_c: expect.closeTo((4 + 4 + 0) / 3, 6),
        max_strength_c: expect.closeTo(4, 6),
      },
    ]);
  });
});
