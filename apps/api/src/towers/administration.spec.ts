import { PipelineService } from '../profiles/pipeline.service';
import { ReadingsService } from '../readings/readings.service';
import { signInAs, type SignedInAgent } from '../testing/people';
import { makeDistrict, makeTower } from '../testing/places';
import { createTestApp, testNow, type TestApp } from '../testing/test-app';
import type { TowerChangePage } from './dto/tower-change.dto';
import type { SensorDto } from './dto/tower.dto';

const STEP_S = 600;
/** Half the readings lie before it, half after. */
const TUESDAY = testNow - 6 * STEP_S;
const iso = (t: number): string => new Date(t * 1000).toISOString();

describe('the administration of towers and sensors', () => {
  let test: TestApp;
  let analyst: SignedInAgent;
  let mast: { towerId: number; sensorIds: number[] };
  let upper: number;

  beforeAll(async () => {
    test = await createTestApp();
    analyst = await signInAs(test, 'analyst');
  });
  afterAll(() => test.close());
  beforeEach(async () => {
    mast = await makeTower(test, { heightsM: [2, 30] });
    upper = mast.sensorIds[1]!;
    const rows = Array.from({ length: 12 }, (_, i) => testNow - (11 - i) * STEP_S).flatMap((tEnd, i) =>
      mast.sensorIds.map((sensorId, level) => ({
        sensorId,
        tEnd,
        value: -8 + 2 * level + 0.01 * i,
        rowNo: i,
      })),
    );
    await test.app.get(ReadingsService).ingest(mast.towerId, rows, { origin: 'push', name: 'test' });
    await test.app.get(PipelineService).drainAll();
  });

  const strengths = async (): Promise<{ tEnd: number; rev: number; within: number }[]> => {
    await test.app.get(PipelineService).drainAll();
    return test.sql.all(
      'SELECT t_end tEnd, rev, round(within_c, 6) within FROM profile WHERE tower_id = $1 ORDER BY t_end',
      [mast.towerId],
    );
  };
  const patch = (body: object, status = 200) =>
    analyst.http.patch(`/api/sensors/${upper}`).send(body).expect(status);
  const changes = async (): Promise<TowerChangePage> =>
    (await analyst.http.get(`/api/towers/${mast.towerId}/changes`).expect(200)).body as TowerChangePage;

  it('let a sensor replaced last Tuesday leave Monday as it was', async () => {
    const before = await strengths();
    await patch({ from: iso(TUESDAY), offset: 0.5, note: 'replaced' });
    const after = await strengths();
    const monday = <T extends { tEnd: number }>(rows: T[]): T[] => rows.filter(({ tEnd }) => tEnd <= TUESDAY);
    expect(monday(after)).toEqual(monday(before));
    const added = after.map(({ within }, i) => Number((within - before[i]!.within).toFixed(6)));
    expect(added).toEqual([...Array<number>(6).fill(0), ...Array<number>(6).fill(0.5)]);
  });

  it('work nothing out anew for a name, and only what a version concerns', async () => {
    const marked = async (): Promise<number> =>
      (await test.sql.get<{ n: number }>(
        'SELECT count(DISTINCT t) n FROM dirty WHERE subject = $1 AND stage = 1',
        [mast.towerId],
      ))!.n;
    await patch({ name: 'upper' });
    expect(await marked()).toBe(0);
    await patch({ from: iso(TUESDAY), offset: 0.5 });
    expect(await marked()).toBe(6);
  });

  it('take a version back, and correct its date', async () => {
    const before = await strengths();
    await patch({ from: iso(TUESDAY), offset: 0.5 });
    const at = (t: number): string =>
      `/api/sensors/${upper}/versions/${encodeURIComponent(iso(t).replace('.000Z', 'Z'))}`;
    const later = TUESDAY + 3 * STEP_S;
    const moved = await analyst.http
      .patch(at(TUESDAY))
      .send({ from: iso(later) })
      .expect(200);
    expect((moved.body as SensorDto).versions.map(({ offset }) => offset)).toEqual([0, 0.5]);
    const changed = (await strengths()).filter(({ within }, i) => within !== before[i]!.within);
    expect(changed.map(({ tEnd }) => tEnd)).toEqual([1, 2, 3].map((i) => later + i * STEP_S));
    await analyst.http.delete(at(later)).expect(200);
    expect((await strengths()).map(({ within }) => within)).toEqual(before.map(({ within }) => within));
    await analyst.http.delete(at(later)).expect(404);
    const only = await analyst.http.delete(`/api/sensors/${upper}/versions/beginning`).expect(409);
    expect((only.body as { detail: string }).detail).toMatch(/all that is known/);
  });

  it('keep what has readings, offering to retire it, and take away what was made by mistake', async () => {
    const kept = await analyst.http.delete(`/api/sensors/${upper}`).expect(409);
    expect((kept.body as { detail: string }).detail).toMatch(/has readings.*Retire it instead/);
    await analyst.http.delete(`/api/towers/${mast.towerId}`).expect(409);
    const { towerId, sensorIds } = await makeTower(test, { heightsM: [2] });
    await analyst.http.delete(`/api/sensors/${sensorIds[0]}`).expect(204);
    await makeDistrict(test, { name: 'Asking', floor_tower_id: towerId });
    const asked = await analyst.http.delete(`/api/towers/${towerId}`).expect(409);
    expect((asked.body as { detail: string }).detail).toMatch(/^Asking asks Tower \d+/);
    await test.sql.run('UPDATE district SET floor_tower_id = NULL WHERE floor_tower_id = $1', [towerId]);
    await analyst.http.delete(`/api/towers/${towerId}`).expect(204);
    await analyst.http.get(`/api/towers/${towerId}`).expect(404);
  });

  it('tell what was changed, from what to what, by whom', async () => {
    await patch({ from: iso(TUESDAY), heightM: 31, note: 'moved up' });
    const tower = (await analyst.http.get(`/api/towers/${mast.towerId}`).expect(200)).body as {
      version: number;
    };
    await analyst.http
      .patch(`/api/towers/${mast.towerId}`)
      .send({ version: tower.version, elevationM: 1300 })
      .expect(200);
    const { items } = await changes();
    expect(items.map(({ act, what, by }) => [act, what, by])).toEqual([
      ['tower changed', 'elevation 1280 m → 1300 m', analyst.name],
      [
        'sensor changed',
        `temperature_30m from ${iso(TUESDAY).slice(0, 16).replace('T', ' ')} UTC: height 30 m → 31 m (moved up)`,
        analyst.name,
      ],
    ]);
  });
});
