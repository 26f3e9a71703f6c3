import type { Server } from 'node:http';
import request from 'supertest';
import { DistrictFindingsService } from '../rules/findings/district-findings.service';
import { signInAs, type SignedInAgent } from '../testing/people';
import { makeDistrict } from '../testing/places';
import { createTestApp, testNow, type TestApp } from '../testing/test-app';
import { PipelineService } from './pipeline.service';

const iso = (t: number): string => new Date(t * 1000).toISOString();
const STEP_S = 600;

/** A tower made and filled as its people would: through the API, with a site's key. */
describe('what a tower measures besides temperature', () => {
  let test: TestApp;
  let admin: SignedInAgent;
  beforeAll(async () => {
    test = await createTestApp();
    admin = await signInAs(test, 'administrator');
  });
  afterAll(() => test.close());

  async function makeTower(name: string, settings: object, sensors: readonly object[]) {
    const place = { elevationM: 1280, latitude: 44, longitude: -113, intervalMinutes: 10, ...settings };
    const { body: tower } = await admin.http
      .post('/api/towers')
      .send({ name, ...place })
      .expect(201);
    const { id } = tower as { id: number };
    for (const sensor of sensors) await admin.http.post(`/api/towers/${id}/sensors`).send(sensor).expect(201);
    const { body: made } = await admin.http
      .post(`/api/towers/${id}/keys`)
      .send({ name: 'logger' })
      .expect(201);
    return { id, key: (made as { key: string }).key };
  }
  async function push(key: string, text: string): Promise<void> {
    await request(test.app.getHttpServer() as Server)
      .post('/api/ingest/readings')
      .set({ authorization: `Bearer ${key}`, 'content-type': 'text/csv' })
      .send(text)
      .expect(200);
    await test.app.get(PipelineService).drainAll();
  }
  const other = async (towerId: number): Promise<Record<string, unknown>> =>
    JSON.parse(
      (await test.sql.get<{ other: string }>(
        'SELECT other FROM profile WHERE tower_id = $1 ORDER BY t_end DESC',
        [towerId],
      ))!.other,
    ) as Record<string, unknown>;
  const sensor = (name: string, quantity: string, heightM: number) => ({
    name,
    quantity,
    heightM,
    sigma: 0.1,
  });
  const rows = (count: number, cells: (i: number) => string): string[] =>
    Array.from({ length: count }, (_, i) => `${iso(testNow - (count - 1 - i) * STEP_S)},${cells(i)}`);

  it('comes the same way and reaches the rules: humidity, wind, pressure', async () => {
    const { id, key } = await makeTower('All of it', { blockMinutes: 10 }, [
      ...[sensor('t2', 'air temperature', 2), sensor('t30', 'air temperature', 30)],
      ...[
        sensor('rh', 'relative humidity', 2),
        sensor('ws', 'wind speed', 10),
        sensor('wd', 'wind direction', 10),
      ],
      sensor('p', 'station pressure', 2),
    ]);
    const districtId = await makeDistrict(test, { name: 'All' });
    await test.sql.run('INSERT INTO district_tower (district_id, tower_id, position) VALUES ($1, $2, 0)', [
      districtId,
      id,
    ]);
    await push(
      key,
      [
        'time,t2,t30,rh,ws,wd,p',
        ...rows(3, (i) => `-8.${i},-5.${i},7${i},1.${i},${i * 10 || 355},871.${i}`),
      ].join('\n'),
    );
    expect(await other(id)).toMatchObject({
      relativeHumidityPct: 72,
      windSpeedMPerS: 1.2,
      windDirectionDeg: 20,
    });
    const { values } = (await test.app.get(DistrictFindingsService).latest(districtId))!;
    expect(values).toMatchObject({
      relativeHumidityPct: { lo: 72, hi: 72 },
      windSpeedMPerS: { lo: 1.2, hi: 1.2 },
    });
    const profile = await test.sql.get(
      'SELECT pressure_hpa p, pressure_assumed assumed FROM profile WHERE tower_id = $1 ORDER BY t_end DESC',
      [id],
    );
    expect(profile).toEqual({ p: 871.2, assumed: 0 });
  });

  it('gives humidity from a dew point, or from a wet bulb, where none is measured', async () => {
    const { id, key } = await makeTower('Mirror', { blockMinutes: 10 }, [
      ...[sensor('t2', 'air temperature', 2), sensor('t30', 'air temperature', 30)],
      ...[sensor('td', 'dew point', 2), sensor('tw', 'wet bulb', 30), sensor('p', 'station pressure', 2)],
    ]);
    await push(key, ['time,t2,t30,td,tw,p', ...rows(3, () => '20,20,10,15,1013.25')].join('\n'));
    const { humidity, relativeHumidityPct } = (await other(id)) as {
      humidity: number[][];
      relativeHumidityPct: number;
    };
    // 12.27 hPa over 23.37 hPa: 52.5 % (Smithsonian tables by WMO-No. 8's formula); "12.3 mb is 53 % at 20 °C" (common practice).
    expect(relativeHumidityPct).toBeCloseTo(52.5, 0);
    // Dry 20 °C, wet 15 °C, aspirated: 59 % (psychrometer tables, from memory).
    expect(Math.abs(humidity.find(([heightM]) => heightM === 30)![1]! - 59)).toBeLessThan(1.5);
    expect(humidity.every(([, , sigma]) => sigma! > 0.3 && sigma! < 2)).toBe(true);
  });

  it("takes a monitor's hours that are labelled by their beginning, and its small negative values", async () => {
    const { id, key } = await makeTower(
      'Monitor',
      { intervalMinutes: 60, blockMinutes: 60, stamp: 'start' },
      [sensor('pm25', 'pm2.5', 3)],
    );
    const districtId = await makeDistrict(test, { name: 'Smoke', pm25_tower_id: id });
    await test.sql.run('INSERT INTO district_tower (district_id, tower_id, position) VALUES ($1, $2, 0)', [
      districtId,
      id,
    ]);
    const begins = Array.from({ length: 12 }, (_, i) => testNow - (12 - i) * 3600);
    await push(key, ['time,pm25', ...begins.map((t, i) => `${iso(t)},${i === 3 ? -1.5 : 20}`)].join('\n'));
    const newest = await test.sql.get(
      'SELECT max(t_end) tEnd FROM reading r JOIN sensor s ON s.id = r.sensor_id WHERE s.tower_id = $1',
      [id],
    );
    expect(newest).toEqual({ tEnd: testNow });
    expect(await other(id)).toMatchObject({ pm25: 20, pm25Hour: 20 });
    const { values } = (await test.app.get(DistrictFindingsService).latest(districtId))!;
    expect(values.pm25Hour).toEqual({ lo: 20, hi: 20 });
    // NowCast of eleven hours at 20 and one at 0 (EPA: a negative hour enters as 0), weight 1/2: 19.9.
    expect(values.pm25NowCast!.lo).toBeCloseTo(19.9, 1);
  });
});
