import { ReadingsService } from '../readings/readings.service';
import { signInAs, type SignedInAgent } from '../testing/people';
import { createTestApp, testNow, type TestApp } from '../testing/test-app';
import { eveningRule, goBy, putRuleInForce } from '../testing/evening';
import { makeValley, type Valley } from '../testing/valley';
import type { ReworkDto } from './dto/rework.dto';
import { ReworkService } from './rework.service';
import { ReworkWatch } from './rework-watch';

const HOUR_S = 3600;
const iso = (t: number): string => new Date(t * 1000).toISOString();

describe('what is worked out anew', () => {
  let test: TestApp;
  let valley: Valley;
  let analyst: SignedInAgent;
  beforeAll(async () => {
    test = await createTestApp();
    valley = await makeValley(test);
    await putRuleInForce(test, valley.districtId, eveningRule);
    await goBy(test, valley, Array<number>(18).fill(3));
    analyst = await signInAs(test, 'analyst');
  }, 30_000);
  afterAll(() => test.close());

  const reworks = async (): Promise<ReworkDto[]> =>
    (await analyst.http.get(`/api/reworks?towerId=${valley.towerIds[0]}`).expect(200)).body as ReworkDto[];
  const finish = async (): Promise<void> => {
    test.clock.advance(10);
    await valley.settle();
    await test.app.get(ReworkWatch, { strict: false }).endFinished();
  };
  const lowest = async (): Promise<number> =>
    (await test.sql.get<{ id: number }>('SELECT min(id) id FROM sensor WHERE tower_id = $1', [
      valley.towerIds[0],
    ]))!.id;

  it('says what a set span changed in the findings and in what the rule says, and what undoing it gave back', async () => {
    const span = { from: iso(testNow + 1.5 * HOUR_S), to: iso(testNow + 2.5 * HOUR_S) };
    const wanted = { sensorId: await lowest(), ...span, quality: 'failed', reason: 'snow on the shield' };
    const { body: set } = await analyst.http.post('/api/overrides').send(wanted).expect(201);
    expect((await reworks())[0]).toMatchObject({
      ...{
        cause: 'temperature_2m set aside: snow on the shield',
        by: analyst.name,
        endedAt: null,
        changes: null,
      },
      ...{ blocks: 7, pending: 7 },
    });
    await finish();
    const [done] = await reworks();
    // Without the lowest level the inversion is still seen from above, but nobody knows how strong it is at the ground.
    expect(done).toMatchObject({
      pending: 0,
      changes: {
        ...{ blocksChanged: 7, presentToAbsent: 0, absentToPresent: 0, toNotKnown: 0, fromNotKnown: 0 },
        ...{ inversionHoursBefore: 7 / 6, inversionHoursAfter: 7 / 6 },
        districts: [{ districtId: valley.districtId, name: 'Mill Flats' }],
      },
    });
    expect(done!.endedAt).not.toBeNull();
    expect(done!.changes!.strongestBeforeC).toBeCloseTo(3, 6);
    expect(done!.changes!.strongestAfterC).toBeCloseTo(1.8, 6);
    expect(done!.changes!.districts[0]!.truthsChanged).toBeGreaterThan(0);

    await analyst.http.delete(`/api/overrides/${(set as { id: number }).id}`).expect(200);
    await finish();
    const [undone] = await reworks();
    expect(undone).toMatchObject({
      cause: 'temperature_2m: setting aside undone',
      changes: { blocksChanged: 7 },
    });
    expect(undone!.changes!.strongestAfterC).toBeCloseTo(3, 6);
    expect(undone!.changes!.districts[0]!.truthsChanged).toBe(done!.changes!.districts[0]!.truthsChanged);
  });

  it('tells of a finding that is not known any more', async () => {
    const ids = await test.sql.all<{ id: number }>('SELECT id FROM sensor WHERE tower_id = $1 ORDER BY id', [
      valley.towerIds[0],
    ]);
    const span = { from: iso(testNow + HOUR_S), to: iso(testNow + HOUR_S) };
    for (const { id } of ids.slice(0, 3)) {
      const wanted = { sensorId: id, ...span, quality: 'failed', reason: 'mast struck by lightning' };
      await analyst.http.post('/api/overrides').send(wanted).expect(201);
    }
    await finish();
    const [last] = await reworks();
    expect(last!.changes).toMatchObject({ blocksChanged: 1, toNotKnown: 1, strongestAfterC: null });
  });

  it('says that an inversion is not sure any more', async () => {
    const { body: limits } = await analyst.http.get(`/api/towers/${valley.towerIds[0]}/limits`).expect(200);
    const [own] = limits as { sensorId: number; limits: object }[];
    const input = { ...own!.limits, plausible: { lowest: 0, highest: 40 }, reason: 'summer station' };
    await analyst.http.put(`/api/sensors/${own!.sensorId}/limits`).send(input).expect(200);
    await finish();
    expect((await reworks())[0]!.changes).toMatchObject({ toSure: 0, presentToAbsent: 0 });
    expect((await reworks())[0]!.changes!.toNotSure).toBeGreaterThan(10);
    await analyst.http
      .put(`/api/sensors/${own!.sensorId}/limits`)
      .send({ ...own!.limits, reason: 'no, a winter one' })
      .expect(200);
    await finish();
    expect((await reworks())[0]!.changes!.toSure).toBeGreaterThan(10);
  });

  it('follows a correction from an instant on', async () => {
    const from = iso(testNow + 2.5 * HOUR_S);
    const patch = { offset: 1.5, gain: 1, from, note: 'compared with the reference' };
    await analyst.http
      .patch(`/api/sensors/${await lowest()}`)
      .send(patch)
      .expect(200);
    await finish();
    expect((await reworks())[0]).toMatchObject({
      cause: 'temperature_2m: offset 1.5 degC, gain 1 (compared with the reference)',
      from: from.replace('.000', ''),
      // 2 m is then warmer than 10 m: the inversion begins above.
      changes: { blocksChanged: 3, presentToAbsent: 3, inversionHoursBefore: 0.5, inversionHoursAfter: 0 },
    });
  });

  it('tells of an import that was taken back, from before its first step to after its last', async () => {
    const [towerId] = valley.towerIds;
    const sensorId = await lowest();
    const rows = [0, 1, 2].map((i) => ({
      sensorId,
      tEnd: testNow + HOUR_S + i * 600,
      value: -30,
      rowNo: i + 2,
    }));
    const origin = { origin: 'upload' as const, name: 'wrong.csv' };
    const readings = test.app.get(ReadingsService, { strict: false });
    const { importId } = await readings.ingest(towerId!, rows, origin);
    await finish();
    await analyst.http.post(`/api/imports/${importId}/withdraw`).send({ reason: 'wrong logger' }).expect(200);
    await finish();
    const [last] = await reworks();
    expect(last).toMatchObject({
      cause: 'Import of "wrong.csv" undone',
      by: analyst.name,
      blocks: 3,
      pending: 0,
    });
    expect(last!.changes!.blocksChanged).toBeGreaterThan(0);
    expect(last!.changes!.strongestBeforeC).toBeGreaterThan(last!.changes!.strongestAfterC!);
  });

  it('waits until nothing of it waits, and begins nothing where nothing is marked', async () => {
    const [towerId] = valley.towerIds;
    const begin = test.app.get(ReworkService, { strict: false });
    expect(await begin.begin({ towerId: towerId!, cause: 'nothing' })).toBeNull();
    await test.sql.run('INSERT INTO dirty (stage, subject, t) VALUES (1, $1, $2)', [towerId, testNow + 600]);
    expect(await begin.begin({ towerId: towerId!, cause: 'a mark that stays' })).not.toBeNull();
    const watch = test.app.get(ReworkWatch, { strict: false });
    expect(await watch.endFinished()).toBe('0 ended, 1 under way');
    await valley.settle();
    test.clock.advance(10);
    expect(await watch.endFinished()).toBe('1 ended, 0 under way');
    expect((await reworks())[0]!.changes!.blocksChanged).toBe(0);
  });
});
