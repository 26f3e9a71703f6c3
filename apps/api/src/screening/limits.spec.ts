import { DirtyStages } from '../database/dirty';
import { ReadingsService } from '../readings/readings.service';
import { makeTower } from '../testing/places';
import { signInAs, type SignedInAgent } from '../testing/people';
import { createTestApp, testNow, type TestApp } from '../testing/test-app';
import type { SensorLimitsDto } from './dto/limits.dto';

describe('limits of checks', () => {
  let test: TestApp;
  let analyst: SignedInAgent;
  let sensorId: number;
  let towerId: number;
  beforeAll(async () => {
    test = await createTestApp();
    analyst = await signInAs(test, 'analyst');
    const tower = await makeTower(test, { heightsM: [2] });
    ({ towerId } = tower);
    sensorId = tower.sensorIds[0]!;
    const rows = [-5, -5.2, 1, -5.1, -31].map((value, i) => ({
      ...{ sensorId, tEnd: testNow - (10 - i) * 600, value, rowNo: i },
    }));
    await test.app.get(ReadingsService).ingest(towerId, rows, { origin: 'push', name: 'test' });
  });
  afterAll(() => test.close());

  const qualities = async (): Promise<number[]> => {
    await test.app.get(DirtyStages, { strict: false }).drainAll();
    const rows = await test.sql.all<{ quality: number }>(
      'SELECT quality FROM reading WHERE sensor_id = $1 ORDER BY t_end',
      [sensorId],
    );
    return rows.map(({ quality }) => quality);
  };
  const levelDifference = { riseC: 5, fallC: 3, risePerMetreByDayC: 0.1, fallPerMetreAtNightC: 0.1 };
  const usual = {
    ...{ plausible: null, spike: 5, stuckHours: 3, fastChanges: true, steadiness: true },
    ...{ neighbourDifference: null, levelDifference },
  };
  const set = (changes: object, status = 200) =>
    analyst.http
      .put(`/api/sensors/${sensorId}/limits`)
      .send({ ...usual, reason: 'coldest on record −30', ...changes })
      .expect(status);

  it('are the published ones until somebody sets others, and then decide', async () => {
    const { body } = await analyst.http.get(`/api/towers/${towerId}/limits`).expect(200);
    expect((body as SensorLimitsDto[])[0]).toMatchObject({
      limits: usual,
      usual,
      physical: { lowest: -80, highest: 60 },
    });
    expect(await qualities()).toEqual([0, 0, 2, 0, 0]);
    await set({ spike: 9, plausible: { lowest: -30, highest: 35 } });
    expect(await qualities()).toEqual([0, 0, 0, 0, 1]);
    const { body: reworks } = await analyst.http.get(`/api/reworks?towerId=${towerId}`).expect(200);
    expect((reworks as { cause: string }[])[0]!.cause).toBe(
      'temperature_2m: limits of its checks changed (coldest on record −30)',
    );
    await set({});
    expect(await qualities()).toEqual([0, 0, 2, 0, 0]);
    expect(await test.sql.get('SELECT screening_limits kept FROM sensor WHERE id = $1', [sensorId])).toEqual({
      kept: null,
    });
  });

  it('of the difference to the level below and to neighbouring towers are kept and shown', async () => {
    const wanted = { neighbourDifference: 4, levelDifference: { ...levelDifference, riseC: 9 } };
    await set(wanted);
    const { body } = await analyst.http.get(`/api/towers/${towerId}/limits`).expect(200);
    expect((body as SensorLimitsDto[])[0]!.limits).toMatchObject(wanted);
    await set({ levelDifference: null });
    const kept = await test.sql.get('SELECT screening_limits kept FROM sensor WHERE id = $1', [sensorId]);
    expect(kept).toEqual({ kept: '{"levelDifference":null}' });
    await set({});
  });

  it.each([
    [{ levelDifference: { ...levelDifference, fallC: 0 } }, 'fallC'],
    [{ levelDifference: { riseC: 4 } }, 'fallC'],
    [{ neighbourDifference: 0 }, 'null switches the check off'],
    [{ plausible: { lowest: 5, highest: -5 } }, 'exchange the two'],
    [{ plausible: { lowest: -100, highest: 5 } }, 'within what is possible'],
    [{ stuckHours: 24 }, '1 to 12'],
    [{ spike: 0 }, 'above 0'],
    [{ reason: '' }, 'must say why'],
  ])('refuse %j', async (changes, says) => {
    const { body } = await set(changes, 422);
    expect(JSON.stringify(body)).toContain(says);
  });
});
