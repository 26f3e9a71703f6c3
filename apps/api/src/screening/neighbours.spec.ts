import { checkBits } from '@lidwatch/contracts';
import { SetClock } from '../common/clock';
import { DirtyStages } from '../database/dirty';
import { DEFAULT_MAPPING } from '../readings/parse/mapping';
import { ImportRunner } from '../readings/importing/import-runner';
import { ReadingContexts } from '../readings/reading-contexts';
import { ReadingsService } from '../readings/readings.service';
import { signInAs, type SignedInAgent } from '../testing/people';
import { makeTower } from '../testing/places';
import { createTestApp, type TestApp } from '../testing/test-app';
import { sunElevationDeg } from './sun-elevation';

const INTERVAL_S = 600;
const DAY_S = 86_400;
const BEGIN = Date.UTC(2026, 0, 15, 7) / 1000;
/** The reading at which the air warms by 8 °C, beyond the 5 °C an hour of the published step check. */
const WARMED = 59;
const iso = (t: number): string => new Date(t * 1000).toISOString();
const endOf = (i: number): number => BEGIN + (i + 1) * INTERVAL_S;
const wobble = (i: number): number => ((i * 7) % 10) * 0.06;

describe('the sun', () => {
  it.each([
    // The sun stands in the zenith of the equator at noon of an equinox, to the half degree of the equation of time.
    ['2026-03-20T12:00:00Z', 0, 0, 88, 90],
    // On the tropic at the solstice.
    ['2026-06-21T12:00:00Z', 23.44, 0, 89, 90],
    // 90° − 51.5° − 23.44° in London's latitude on the shortest day.
    ['2026-12-21T12:00:00Z', 51.5, 0, 15, 15.1],
    ['2026-12-21T00:00:00Z', 51.5, 0, -63, -61],
  ])('at %s on %d° N %d° E stands between %d° and %d°', (instant, latitude, longitude, low, high) => {
    const elevation = sunElevationDeg(Date.parse(instant) / 1000, latitude, longitude);
    expect(elevation).toBeGreaterThanOrEqual(low);
    expect(elevation).toBeLessThanOrEqual(high);
  });
});

describe('neighbouring towers', () => {
  let test: TestApp;
  let analyst: SignedInAgent;
  beforeAll(async () => {
    test = await createTestApp({ clock: new SetClock(BEGIN + 4 * DAY_S) });
    analyst = await signInAs(test, 'analyst');
  });
  afterAll(() => test.close());

  const drain = (): Promise<void> => test.app.get(DirtyStages).drainAll();
  const warming = (i: number): number => -9 + wobble(i) + (i >= WARMED ? 8 : 0);
  const calm = (i: number): number => -9 + wobble(i);
  const push = async (
    { towerId, sensorIds }: { towerId: number; sensorIds: number[] },
    air: (i: number) => number,
    every = 1,
  ): Promise<void> => {
    const rows = Array.from({ length: 144 / every }, (_, k) => k * every + every - 1).map((i) => ({
      ...{ sensorId: sensorIds[0]!, tEnd: endOf(i), value: air(i), rowNo: i },
    }));
    await test.app
      .get(ReadingsService, { strict: false })
      .ingest(towerId, rows, { origin: 'push', name: 'test' });
  };
  const seen = async ({ sensorIds }: { sensorIds: number[] }, i = WARMED): Promise<object | undefined> =>
    test.sql.get('SELECT quality, checks FROM reading WHERE sensor_id = $1 AND t_end = $2', [
      sensorIds[0],
      endOf(i),
    ]);
  const setNeighbours = (towerId: number, towerIds: unknown, status = 200) =>
    analyst.http.put(`/api/towers/${towerId}/neighbours`).send({ towerIds }).expect(status);
  const pair = async (): Promise<{ here: Made; there: Made }> => {
    const here = await makeTower(test, { heightsM: [2] });
    const there = await makeTower(test, { heightsM: [2], interval_s: 1800, block_s: 1800 });
    await setNeighbours(here.towerId, [there.towerId]);
    return { here, there };
  };
  type Made = Awaited<ReturnType<typeof makeTower>>;
  const SUSPECT = { quality: 1, checks: checkBits.step };
  const VALID = { quality: 0, checks: 0 };

  it('speak for a change that both see, whichever readings come first', async () => {
    const { here, there } = await pair();
    await push(here, warming);
    await drain();
    expect(await seen(here)).toEqual(SUSPECT);
    await push(there, warming, 3);
    await drain();
    expect(await seen(here)).toEqual(VALID);

    const other = await pair();
    await push(other.there, warming, 3);
    await drain();
    await push(other.here, warming);
    await drain();
    expect(await seen(other.here)).toEqual(VALID);
  });

  it('say nothing for a change that they do not see', async () => {
    const { here, there } = await pair();
    await push(there, calm, 3);
    await push(here, warming);
    await drain();
    expect(await seen(here)).toEqual(SUSPECT);
  });

  it('speak against a reading that is too far from theirs, where the site sets how far', async () => {
    const { here, there } = await pair();
    await test.sql.run(`UPDATE sensor SET screening_limits = '{"neighbourDifference":4}' WHERE id = $1`, [
      here.sensorIds[0],
    ]);
    await push(here, (i) => calm(i) + 5);
    await push(there, calm, 3);
    await drain();
    expect(await seen(here, 65)).toEqual({ quality: 1, checks: checkBits.neighbours });
  });

  const importFile = async ({ towerId }: Made, air: (i: number) => number, every = 1): Promise<void> => {
    const lines = Array.from({ length: 144 / every }, (_, k) => k * every + every - 1);
    const text = ['time,temperature_2m', ...lines.map((i) => `${iso(endOf(i))},${air(i).toFixed(2)}`)].join(
      '\n',
    );
    async function* bytes(): AsyncGenerator<Buffer> {
      yield Buffer.from(text);
    }
    const context = await test.app.get(ReadingContexts, { strict: false }).of(towerId, DEFAULT_MAPPING);
    const imported = await test.app.get(ImportRunner, { strict: false }).run({
      ...{ towerId, context, bytes: bytes(), pieceBytes: 1_000 },
      origin: { origin: 'upload', name: 'mast.csv' },
    });
    expect(imported).toMatchObject({ new: 144 / every, refused: 0 });
  };

  it('are heard when either tower comes as a file', async () => {
    const { here, there } = await pair();
    await importFile(here, warming);
    await drain();
    expect(await seen(here)).toEqual(SUSPECT);
    await importFile(there, warming, 3);
    await drain();
    expect(await seen(here)).toEqual(VALID);

    const other = await pair();
    await importFile(other.there, warming, 3);
    await importFile(other.here, warming);
    await drain();
    expect(await seen(other.here)).toEqual(VALID);
  });

  it('are heard again when their sensor is corrected', async () => {
    const { here, there } = await pair();
    await push(here, warming);
    await push(there, warming, 3);
    await drain();
    expect(await seen(here)).toEqual(VALID);
    await analyst.http
      .patch(`/api/sensors/${there.sensorIds[0]}`)
      .send({ gain: 0.1, note: 'wrong amplifier' })
      .expect(200);
    await drain();
    expect(await seen(here)).toEqual(SUSPECT);
    const { body } = await analyst.http.get(`/api/reworks?towerId=${here.towerId}`).expect(200);
    expect((body as { cause: string }[])[0]!.cause).toMatch(
      /^Neighbouring Tower \d+: temperature_2m: gain 0\.1 \(wrong amplifier\)$/,
    );
  });

  it('are declared and taken back by staff, and the record says who', async () => {
    const { here, there } = await pair();
    await push(here, warming);
    await push(there, warming, 3);
    await drain();
    await setNeighbours(here.towerId, []);
    await drain();
    expect(await seen(here)).toEqual(SUSPECT);
    await setNeighbours(here.towerId, [there.towerId]);
    await drain();
    expect(await seen(here)).toEqual(VALID);
    const { body } = await analyst.http.get(`/api/towers/${here.towerId}/neighbours`).expect(200);
    expect(body).toEqual({ towerIds: [there.towerId] });
    const changes = await analyst.http.get(`/api/towers/${here.towerId}/changes`).expect(200);
    expect(JSON.stringify(changes.body)).toMatch(/neighbours none → Tower \d+/);
  });

  it.each([
    ['itself', (here: number) => [here], 'no neighbour of itself'],
    ['a tower there is not', () => [987_654], 'There is no tower 987654'],
    ['words', () => ['near'], 'ids of towers'],
    ['nine of them', () => [1, 2, 3, 4, 5, 6, 7, 8, 9], 'at most 8'],
  ])('are not %s', async (_, idsOf, cure) => {
    const { towerId } = await makeTower(test, { heightsM: [2] });
    const refused = await setNeighbours(towerId, idsOf(towerId), 422);
    expect(JSON.stringify(refused.body)).toContain(cure);
  });

  it('go with a tower that is deleted', async () => {
    const { here, there } = await pair();
    await analyst.http.delete(`/api/towers/${there.towerId}`).expect(204);
    const { body } = await analyst.http.get(`/api/towers/${here.towerId}/neighbours`).expect(200);
    expect(body).toEqual({ towerIds: [] });
  });
});
